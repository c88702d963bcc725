import type { Request } from 'express';

/** Aborts when the client goes away before it has its answer. */
export function leftSignal(request: Request): AbortSignal {
  const left = new AbortController();
  const response = request.res;
  response?.once('close', () => {
    if (!response.writableFinished) left.abort();
  });
  return left.signal;
}
