import { randomBytes } from 'node:crypto';
import {
  closeSync,
  existsSync,
  fsyncSync,
  mkdirSync,
  openSync,
  readFileSync,
  realpathSync,
  renameSync,
  writeSync,
} from 'node:fs';
import path from 'node:path';

/** Writes the file whole and on the disk, or leaves the old one. */
export function writeWhole(file, text, mode = 0o600) {
  const draft = `${file}.new`;
  const descriptor = openSync(draft, 'w', mode);
  writeSync(descriptor, text);
  fsyncSync(descriptor);
  closeSync(descriptor);
  renameSync(draft, file);
}

/** The folder that keeps everything of one installation: `.data`, or where `WITNESSMARK_DATA` points. */
export function openDataFolder(root) {
  const folder = path.resolve(root, process.env.WITNESSMARK_DATA || '.data');
  mkdirSync(folder, { recursive: true, mode: 0o755 });
  const real = realpathSync(folder);
  const inside = (name) => path.join(real, name);
  for (const name of ['mail', 'files', 'log']) mkdirSync(inside(name), { recursive: true, mode: 0o700 });
  return { folder: real, inside };
}

const secretNames = [
  'superuserPassword',
  'ownerPassword',
  'appPassword',
  'nextAuthSecret',
  'filesAccessKey',
  'filesSecretKey',
];

/** Passwords and keys of this installation, made once; a name added by a later version is added to the file. */
export function openSecrets(file) {
  const known = existsSync(file) ? JSON.parse(readFileSync(file, 'utf8')) : {};
  const missing = secretNames.filter((name) => !known[name]);
  if (missing.length === 0) return known;
  const made = Object.fromEntries(missing.map((name) => [name, randomBytes(32).toString('base64url')]));
  const secrets = { ...known, ...made };
  writeWhole(file, `${JSON.stringify(secrets, null, 2)}\n`);
  return secrets;
}
