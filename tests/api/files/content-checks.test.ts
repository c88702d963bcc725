import { describe, expect, it } from 'vitest';
import { FILE_TYPES, type FileType } from '@embertally/shared/contracts/files';
import { CONTENT_CHECKS } from '../../../api/src/files/content-checks.ts';
import { sampleCsv, sampleJpeg, samplePdf, samplePng } from '../../support/sample-files.ts';

const SAMPLES: Readonly<Record<FileType, Buffer>> = {
  'application/pdf': samplePdf(),
  'image/png': samplePng(),
  'image/jpeg': sampleJpeg(),
  'text/csv': sampleCsv(),
};
const TYPES = Object.keys(FILE_TYPES) as FileType[];

/** Whether a content passes for a type when it comes in pieces of so many bytes. */
function passes(type: FileType, content: Buffer, piece = content.length): boolean {
  const check = CONTENT_CHECKS[type]();
  for (let at = 0; at < content.length; at += Math.max(1, piece)) {
    if (!check.push(content.subarray(at, at + Math.max(1, piece)))) return false;
  }
  return check.end();
}
const text = (content: string): Buffer => Buffer.from(content, 'utf8');
const HTML = '<!doctype html><script>alert(1)</script>';

describe.each(TYPES)('%s', (type) => {
  it('is known however it is cut into pieces', () => {
    for (const piece of [1, 2, 3, 7, 8, 9, 1000]) expect(passes(type, SAMPLES[type], piece), String(piece)).toBe(true);
  });

  it('is no other type', () => {
    for (const other of TYPES) if (other !== type) expect(passes(other, SAMPLES[type]), other).toBe(false);
  });

  it('is not a page of tags, a program, an archive, a drawing or nothing', () => {
    const others = [
      text(HTML),
      text(`\n \t${HTML}`),
      text(`\ufeff${HTML}`),
      text('<?xml version="1.0"?><svg/>'),
      Buffer.from('MZ\x90\0\x03', 'latin1'),
      Buffer.from('PK\x03\x04\0\0', 'latin1'),
      Buffer.from('GIF89a/*\0\0', 'latin1'),
      Buffer.alloc(0),
      Buffer.alloc(64),
      text('   \n\n  '),
    ];
    for (const content of others) expect(passes(type, content), content.toString('latin1').slice(0, 20)).toBe(false);
  });
});

describe('a file that only begins like what it says', () => {
  it.each([
    [
      'a JPEG head with a page behind it',
      'image/jpeg',
      Buffer.concat([Buffer.from([0xff, 0xd8, 0xff, 0xe0]), text(HTML)]),
    ],
    ['a JPEG that ends before its picture', 'image/jpeg', sampleJpeg().subarray(0, 30)],
    ['a JPEG with a scan before its size', 'image/jpeg', Buffer.from([0xff, 0xd8, 0xff, 0xda, 0, 2, 1])],
    ['a PNG signature with a page behind it', 'image/png', Buffer.concat([samplePng().subarray(0, 8), text(HTML)])],
    ['a PNG without an end', 'image/png', samplePng().subarray(0, 50)],
    ['a PNG with something behind its end', 'image/png', Buffer.concat([samplePng(), text(HTML)])],
    ['a PDF without an end', 'application/pdf', text('%PDF-1.7 and so on')],
    ['a PDF whose head is further in', 'application/pdf', text(`${HTML}\n%PDF-1.7\n%%EOF`)],
    ['a table with a NUL in it', 'text/csv', text('a;b\n1;\0')],
    ['a table in UTF-16', 'text/csv', Buffer.from('a;b\n1;2', 'utf16le')],
  ] as const)('%s', (_name, type, content) => {
    for (const piece of [1, 1000]) expect(passes(type, content, piece)).toBe(false);
  });

  it.each([
    ['image/png', samplePng],
    ['image/jpeg', sampleJpeg],
  ] as const)('or is larger than any tablet can show: %s', (type, make) => {
    expect(passes(type, make(10_000, 5000))).toBe(true);
    expect(passes(type, make(14_000, 14_000))).toBe(false);
    expect(passes(type, make(0, 10))).toBe(false);
  });

  it('a phone picture with a second picture behind it is a picture', () => {
    expect(passes('image/jpeg', Buffer.concat([sampleJpeg(), sampleJpeg()]))).toBe(true);
  });

  it('a table in an old one-byte spelling is a table', () => {
    expect(passes('text/csv', Buffer.from('Zeit;Wärme\n0;1,5\n', 'latin1'))).toBe(true);
  });
});
