import { randomUUID } from 'node:crypto';
import type { RequestHandler, Response } from 'express';

/** Every request gets a number of ours; one that comes in is not believed. */
export const requestId: RequestHandler = (_request, response, next) => {
  response.locals['requestId'] = randomUUID();
  response.set('X-Request-Id', requestIdOf(response));
  next();
};

export function requestIdOf(response: Response): string {
  return String(response.locals['requestId']);
}
