import { readFileSync } from 'node:fs';
import { createRequire } from 'node:module';
import { describe, expect, it } from 'vitest';
import { unpackWoff } from '../../../../api/src/reports/pdf/unpack-woff.ts';

const api = createRequire(new URL('../../../../api/package.json', import.meta.url));
const packed = readFileSync(
  api.resolve('@fontsource/atkinson-hyperlegible/files/atkinson-hyperlegible-latin-400-normal.woff'),
);

/** Sum of a table's 32-bit words, as OpenType's table directory wants it; `head` leaves its own adjustment out. */
function checksum(tag: string, table: Buffer): number {
  const padded = Buffer.concat([table, Buffer.alloc((4 - (table.length % 4)) % 4)]);
  let sum = 0;
  for (let at = 0; at < padded.length; at += 4) {
    if (tag === 'head' && at === 8) continue;
    sum = (sum + padded.readUInt32BE(at)) >>> 0;
  }
  return sum;
}

describe('unpackWoff', () => {
  it('gives every table back whole: each sum is the one the font carries', () => {
    const font = unpackWoff(packed);
    const count = font.readUInt16BE(4);
    expect(count).toBeGreaterThan(8);
    for (let index = 0; index < count; index++) {
      const at = 12 + index * 16;
      const tag = font.toString('latin1', at, at + 4);
      const offset = font.readUInt32BE(at + 8);
      expect(offset % 4, tag).toBe(0);
      const table = font.subarray(offset, offset + font.readUInt32BE(at + 12));
      expect(checksum(tag, table), tag).toBe(font.readUInt32BE(at + 4));
    }
  });

  it('refuses a file that is not WOFF 1.0', () => {
    expect(() => unpackWoff(Buffer.from('wOF2 something else, long enough to have a header'))).toThrow(
      'not a WOFF 1.0',
    );
    expect(() => unpackWoff(Buffer.alloc(0))).toThrow('not a WOFF 1.0');
  });
});
