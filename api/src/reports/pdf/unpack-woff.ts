import { inflateSync } from 'node:zlib';

const WOFF = 0x774f4646;
const HEADER = { flavor: 4, tables: 12, size: 44, entry: 20 };
const SFNT = { size: 12, entry: 16 };

/**
 * The plain font (sfnt) inside a WOFF 1.0 file, as W3C "WOFF File Format 1.0", clauses 3–5 lays it out. The font library can
 * read the packed file itself, but unpacks it in script, which takes most of the time of a report.
 *
 * @throws Error when the file is not WOFF 1.0
 */
export function unpackWoff(packed: Buffer): Buffer {
  if (packed.length < HEADER.size || packed.readUInt32BE(0) !== WOFF) {
    throw new Error('A font of the report is not a WOFF 1.0 file; reinstall the packages.');
  }
  const count = packed.readUInt16BE(HEADER.tables);
  const tables = Array.from({ length: count }, (_, index) => {
    const at = HEADER.size + index * HEADER.entry;
    const offset = packed.readUInt32BE(at + 4);
    const stored = packed.subarray(offset, offset + packed.readUInt32BE(at + 8));
    const bytes = stored.length === packed.readUInt32BE(at + 12) ? stored : inflateSync(stored);
    return { tag: packed.subarray(at, at + 4), checksum: packed.readUInt32BE(at + 16), bytes };
  });
  const directory = Buffer.alloc(SFNT.size + count * SFNT.entry);
  const power = Math.floor(Math.log2(count));
  directory.writeUInt32BE(packed.readUInt32BE(HEADER.flavor), 0);
  directory.writeUInt16BE(count, 4);
  directory.writeUInt16BE(2 ** power * 16, 6);
  directory.writeUInt16BE(power, 8);
  directory.writeUInt16BE((count - 2 ** power) * 16, 10);
  const parts: Buffer[] = [directory];
  let offset = directory.length;
  for (const [index, { tag, checksum, bytes }] of tables.entries()) {
    const at = SFNT.size + index * SFNT.entry;
    tag.copy(directory, at);
    directory.writeUInt32BE(checksum, at + 4);
    directory.writeUInt32BE(offset, at + 8);
    directory.writeUInt32BE(bytes.length, at + 12);
    const padding = (4 - (bytes.length % 4)) % 4;
    parts.push(bytes, Buffer.alloc(padding));
    offset += bytes.length + padding;
  }
  return Buffer.concat(parts);
}
