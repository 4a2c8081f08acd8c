/**
 * Passwords that are tried first everywhere: keyboard runs, words with a year, and words of this program. Our own short list; it is
 * compared without case and without the digits and signs around a word, so that each line stands for many.
 */
export const commonPasswords = new Set(
  `password passwort passw0rd p@ssword p@ssw0rd motdepasse contrasena wachtwoord haslo heslo losenord salasana
qwerty qwertz azerty qwertyui qwertyuiop qwertzui qwertzuiop asdfgh asdfghjk asdfghjkl zxcvbn zxcvbnm yxcvbnm 1q2w3e4r 1q2w3e4r5t
q1w2e3r4 1qaz2wsx qazwsx qazwsxedc abcdef abcdefg abcdefgh abcd abc iloveyou letmein letmein welcome willkommen bienvenue hello
hallo sunshine princess dragon monkey football baseball basketball superman batman starwars pokemon master shadow michael jennifer
jordan hunter summer winter spring autumn sommer fruehling herbst january february monday friday sunday freedom whatever trustno
trustno1 secret secretpassword admin administrator adminadmin root rootroot toor guest test testtest testing demo changeme changeit
default service support login access company office computer internet samsung google facebook loveyou lovely flower cheese cookie
chocolate charlie ashley daniel thomas andrew matthew joshua george robert william patrick maggie ginger pepper buster killer
witnessmark witness mark inspector reviewer customer machine machines lathe turning spindle workshop indicator micron microns`
    .split(/\s+/)
    .filter(Boolean),
);
