import type { StoredFile } from '@embertally/shared/contracts/files';
import type { Request } from 'express';
import type { Readable } from 'node:stream';
import { pipeline } from 'node:stream/promises';
import { attachmentHeaders } from './attachment.ts';
import type { Answer } from './define-route.ts';
import { alreadyHas } from './etags.ts';

/** A stored file to save. Its content never changes, so whoever has it is asked only whether they may still. */
export function fileAnswer(request: Request, file: StoredFile & { readonly pieces: Readable }): Answer<undefined> {
  const etag = `"${file.sha256}"`;
  const headers = { ...attachmentHeaders(file.name), 'Cache-Control': 'private, no-cache' };
  if (alreadyHas(request, etag)) {
    file.pieces.destroy();
    return { kind: 'not-modified', etag, headers };
  }
  return {
    kind: 'stream',
    etag,
    headers,
    write: async (_request, response) => {
      response.set('Content-Type', file.type).set('Content-Length', String(file.bytes));
      try {
        await pipeline(file.pieces, response);
      } catch (error) {
        // A reader who goes away in the middle is nobody's fault and hears no answer.
        if (!response.destroyed) throw error;
      }
    },
  };
}
