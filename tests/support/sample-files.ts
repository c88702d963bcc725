import { crc32, deflateSync } from 'node:zlib';

function chunk(name: string, content: Buffer): Buffer {
  const named = Buffer.concat([Buffer.from(name, 'latin1'), content]);
  const length = Buffer.alloc(4);
  length.writeUInt32BE(content.length);
  const check = Buffer.alloc(4);
  check.writeUInt32BE(crc32(named) >>> 0);
  return Buffer.concat([length, named, check]);
}

/** A grey PNG of so many points; its content is that of one line, which is all that says nothing about its size. */
export function samplePng(width_px = 2, height_px = 1): Buffer {
  const header = Buffer.alloc(13);
  header.writeUInt32BE(width_px, 0);
  header.writeUInt32BE(height_px, 4);
  header[8] = 8;
  return Buffer.concat([
    Buffer.from([0x89, 0x50, 0x4e, 0x47, 0x0d, 0x0a, 0x1a, 0x0a]),
    chunk('IHDR', header),
    chunk('IDAT', deflateSync(Buffer.alloc(3))),
    chunk('IEND', Buffer.alloc(0)),
  ]);
}

/** The parts of a JPEG in their order, without a picture worth looking at. */
export function sampleJpeg(width_px = 2, height_px = 1): Buffer {
  const size = Buffer.alloc(4);
  size.writeUInt16BE(height_px, 0);
  size.writeUInt16BE(width_px, 2);
  return Buffer.concat([
    Buffer.from([0xff, 0xd8]),
    Buffer.from([0xff, 0xe0, 0x00, 0x10]),
    Buffer.from('JFIF\0\u0001\u0002\0\0\u0001\0\u0001\0\0', 'latin1'),
    Buffer.from([0xff, 0xc0, 0x00, 0x0b, 0x08]),
    size,
    Buffer.from([0x01, 0x01, 0x11, 0x00]),
    Buffer.from([0xff, 0xda, 0x00, 0x08, 0x01, 0x01, 0x00, 0x00, 0x3f, 0x00]),
    Buffer.from([0x7f, 0xff, 0xd9]),
  ]);
}

export const samplePdf = (text = 'report'): Buffer =>
  Buffer.from(`%PDF-1.7\n% ${text}\n1 0 obj<<>>endobj\ntrailer<<>>\n%%EOF\n`, 'latin1');

export const sampleCsv = (): Buffer => Buffer.from('\ufefftime;hrr\ns;kW\n0;0\n10;12,5\n', 'utf8');
