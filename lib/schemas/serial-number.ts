const lookAlikes: Record<string, string> = { O: '0', I: '1', L: '1', B: '8', S: '5', Z: '2' };

/**
 * A serial number as it is compared: upper case, letters and digits only, and each sign that is read or heard as another one folded
 * onto it (O→0, I and L→1, B→8, S→5, Z→2). `LK32-0O81-B` and `lk32 oo8i 8` are the same. Used for storing and for searching alike.
 */
export function foldSerial(text: string): string {
  const plain = text
    .normalize('NFKD')
    .toUpperCase()
    .replace(/[^\p{L}\p{N}]/gu, '');
  return [...plain].map((sign) => lookAlikes[sign] ?? sign).join('');
}
