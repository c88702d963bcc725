import type { Contract } from '@embertally/shared/contracts/contract';
import type { Request } from 'express';
import { Fault } from '../fault.ts';

export interface UploadBody<Type extends string> {
  /** The media type the sender says; one of those the contract takes. */
  readonly type: Type;
  readonly pieces: AsyncIterable<Uint8Array>;
}

/**
 * The file in a request's body, piece by piece as it comes in, never more than the contract takes of its type.
 * @throws Fault 415 for another type; 413 at once for a length that is too large, or while reading, whatever was said;
 *   400 when the sender breaks off
 */
export function uploadBody<Types extends NonNullable<Contract['upload']>>(
  request: Request,
  types: Types,
): UploadBody<Extract<keyof Types, string>> {
  const said = (request.headers['content-type'] ?? '').split(';')[0]?.trim().toLowerCase() ?? '';
  const type = Object.keys(types).find((known): known is Extract<keyof Types, string> => known === said);
  const most = type === undefined ? undefined : types[type]?.maxBytes;
  if (type === undefined || most === undefined) {
    throw new Fault(
      'wrong-media',
      'wrong-media',
      `Only ${Object.keys(types).join(', ')} are taken here; nothing was kept.`,
    );
  }
  if (Number(request.headers['content-length'] ?? 0) > most) throw tooLarge(most);
  return { type, pieces: pieces(request, most) };
}

async function* pieces(request: Request, most: number): AsyncIterable<Uint8Array> {
  let bytes = 0;
  try {
    // The connection is left as it is when reading ends early: the refusal still goes out on it.
    for await (const piece of request.iterator({ destroyOnReturn: false })) {
      const part = piece as Buffer;
      bytes += part.byteLength;
      if (bytes > most) throw tooLarge(most);
      yield part;
    }
  } catch (error) {
    if (!request.destroyed || error instanceof Fault) throw error;
    throw new Fault('malformed', 'upload-cut', 'The file did not arrive whole, so nothing was kept; send it again.');
  }
}

function tooLarge(most: number): Fault {
  return new Fault(
    'too-large',
    'file-too-large',
    `A file of this kind may have at most ${Math.round(most / 1024 / 1024)} MB; nothing was kept. Choose a smaller one.`,
  );
}
