import { inflateSync } from 'node:zlib';

const WOFF_HEADER = 44;
const WOFF_ENTRY = 20;
const SFNT_HEADER = 12;
const SFNT_ENTRY = 16;

/**
 * A WOFF 1.0 file as the plain TrueType file inside it (W3C, WOFF File Format 1.0, sections 3 to 5). The PDF library reads WOFF too,
 * but inflates the table of all outlines again for every single glyph: about a second a report.
 * @throws where the file is not WOFF 1.0
 */
export function unpackWoff(woff: Buffer): Buffer {
  if (woff.toString('latin1', 0, 4) !== 'wOFF') throw new Error('Not a WOFF font file');
  const count = woff.readUInt16BE(12);
  const tables = Array.from({ length: count }, (_, index) => {
    const at = WOFF_HEADER + index * WOFF_ENTRY;
    const [offset, packed, length] = [4, 8, 12].map((place) => woff.readUInt32BE(at + place)) as [
      number,
      number,
      number,
    ];
    const data = woff.subarray(offset, offset + packed);
    const plain = packed < length ? inflateSync(data) : data;
    return { tag: woff.subarray(at, at + 4), checksum: woff.readUInt32BE(at + 16), plain };
  });
  const directory = Buffer.alloc(SFNT_HEADER + count * SFNT_ENTRY);
  const power = Math.floor(Math.log2(count));
  woff.copy(directory, 0, 4, 8);
  directory.writeUInt16BE(count, 4);
  directory.writeUInt16BE(2 ** power * 16, 6);
  directory.writeUInt16BE(power, 8);
  directory.writeUInt16BE(count * 16 - 2 ** power * 16, 10);
  const parts: Uint8Array[] = [directory];
  let offset = directory.length;
  tables.forEach(({ tag, checksum, plain }, index) => {
    const at = SFNT_HEADER + index * SFNT_ENTRY;
    tag.copy(directory, at);
    directory.writeUInt32BE(checksum, at + 4);
    directory.writeUInt32BE(offset, at + 8);
    directory.writeUInt32BE(plain.length, at + 12);
    const padding = Buffer.alloc((4 - (plain.length % 4)) % 4);
    parts.push(plain, padding);
    offset += plain.length + padding.length;
  });
  return Buffer.concat(parts);
}
