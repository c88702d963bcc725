import { ByteWalk, type Look, type Verdict } from './byte-walk.ts';
import type { ContentCheck } from './content-check.ts';
import { pictureSizeFits } from './picture-size.ts';

const START = 0xd8;
const SCAN = 0xda;
/** Frame headers, ISO/IEC 10918-1 Table B.1: C0 to CF without DHT (C4), JPG (C8) and DAC (CC). */
const isFrame = (marker: number): boolean =>
  marker >= 0xc0 && marker <= 0xcf && marker !== 0xc4 && marker !== 0xc8 && marker !== 0xcc;

/**
 * JPEG: start of image, segments by their lengths, a frame header with the size, then the first scan. What follows is
 * picture data; phones also hang further pictures on it.
 */
export function jpegContent(): ContentCheck {
  return new ByteWalk({
    skip: 0,
    take: 2,
    then: ([first, second]) => (first === 0xff && second === START ? segmentAfter(0, false) : 'wrong'),
  });
}

function segmentAfter(skip: number, framed: boolean): Look {
  return {
    skip,
    take: 4,
    then: (bytes): Look | Verdict => {
      const [lead, marker = 0] = bytes;
      const length = ((bytes[2] ?? 0) << 8) | (bytes[3] ?? 0);
      if (lead !== 0xff || marker < 0xc0 || marker === 0xff || length < 2) return 'wrong';
      if (marker === SCAN) return framed ? { skip: length - 2, take: 1, then: () => 'rest' } : 'wrong';
      if (isFrame(marker)) return { skip: 0, take: 5, then: (frame) => frameFits(frame, length) };
      return segmentAfter(length - 2, framed);
    },
  };
}

function frameFits(frame: Uint8Array, length: number): Look | Verdict {
  const height = ((frame[1] ?? 0) << 8) | (frame[2] ?? 0);
  const width = ((frame[3] ?? 0) << 8) | (frame[4] ?? 0);
  return length >= 8 && pictureSizeFits(width, height) ? segmentAfter(length - 7, true) : 'wrong';
}
