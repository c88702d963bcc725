import { json, type Request, type Response } from 'express';
import { Fault } from '../fault.ts';

const DEFAULT_BYTES = 64 * 1024;

/**
 * Reads a JSON body of at most so many bytes.
 * @throws Fault 413, 415, or what the reader throws (400), for `error-response` to word
 */
export async function readJsonBody(request: Request, response: Response, maxBytes = DEFAULT_BYTES): Promise<unknown> {
  if (request.is('application/json') === false || request.is('application/json') === null) {
    throw new Fault('wrong-media', 'wrong-media', 'Only application/json is taken here; nothing was changed.');
  }
  const read = json({ limit: maxBytes, strict: true, type: 'application/json' });
  await new Promise<void>((done, failed) => {
    read(request, response, (error?: unknown) => {
      if (error === undefined) done();
      else failed(error instanceof Error ? error : new Error('The body could not be read.'));
    });
  });
  return request.body as unknown;
}
