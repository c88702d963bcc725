import { ByteWalk, type Look, type Verdict } from './byte-walk.ts';
import type { ContentCheck } from './content-check.ts';
import { pictureSizeFits } from './picture-size.ts';

const SIGNATURE = [0x89, 0x50, 0x4e, 0x47, 0x0d, 0x0a, 0x1a, 0x0a];
const CRC_BYTES = 4;

const view = (bytes: Uint8Array): DataView => new DataView(bytes.buffer, bytes.byteOffset, bytes.byteLength);
const name = (bytes: Uint8Array): string => String.fromCharCode(...bytes.subarray(4, 8));

/** PNG (ISO/IEC 15948): signature, IHDR of 13 bytes, chunks by their lengths, IEND and nothing after it. */
export function pngContent(): ContentCheck {
  return new ByteWalk({
    skip: 0,
    take: SIGNATURE.length,
    then: (bytes) =>
      SIGNATURE.every((byte, at) => bytes[at] === byte) ? { skip: 0, take: 16, then: header } : 'wrong',
  });
}

function header(bytes: Uint8Array): Look | Verdict {
  const fields = view(bytes);
  if (fields.getUint32(0) !== 13 || name(bytes) !== 'IHDR') return 'wrong';
  if (!pictureSizeFits(fields.getUint32(8), fields.getUint32(12))) return 'wrong';
  return chunkAfter(5 + CRC_BYTES);
}

/** The next chunk's length and name; its content is passed over. */
function chunkAfter(skip: number): Look {
  return {
    skip,
    take: 8,
    then: (bytes) => {
      const length = view(bytes).getUint32(0);
      if (!/^[A-Za-z]{4}$/.test(name(bytes)) || length >= 2 ** 31) return 'wrong';
      if (name(bytes) !== 'IEND') return chunkAfter(length + CRC_BYTES);
      return length === 0 ? { skip: 0, take: CRC_BYTES, then: () => 'end' } : 'wrong';
    },
  };
}
