import type { ErrorRequestHandler, Response } from 'express';
import type { Logger } from 'pino';
import { Fault, type FaultKind } from '../fault.ts';
import { requestIdOf } from './request-id.ts';
import { serverTrouble } from './server-trouble.ts';

const STATUS: Readonly<Record<FaultKind, { status: number; title: string }>> = {
  malformed: { status: 400, title: 'The request could not be read' },
  'not-signed-in': { status: 401, title: 'Not signed in' },
  forbidden: { status: 403, title: 'Not allowed' },
  'not-found': { status: 404, title: 'Not found' },
  conflict: { status: 409, title: 'It clashes with what is there' },
  stale: { status: 412, title: 'Changed by somebody else meanwhile' },
  'too-large': { status: 413, title: 'Too large' },
  'wrong-media': { status: 415, title: 'Wrong kind of content' },
  invalid: { status: 422, title: 'Something in it does not fit' },
  'precondition-missing': { status: 428, title: 'If-Match is missing' },
  'too-many': { status: 429, title: 'Too many attempts' },
  unavailable: { status: 503, title: 'Not available at this moment' },
  full: { status: 507, title: 'No room left' },
};

/** Refusals of the body reader and of Express itself carry a status and nothing a person should see. */
function faultOfReader(error: unknown): Fault | null {
  if (typeof error !== 'object' || error === null || !('status' in error)) return null;
  switch (error.status) {
    case 400:
      return new Fault('malformed', 'malformed', 'The request could not be read; nothing was changed.');
    case 404:
      return Fault.notFound();
    case 413:
      return new Fault(
        'too-large',
        'too-large',
        'More was sent than is taken at once; nothing was changed. Send it in parts.',
      );
    case 415:
      return new Fault(
        'wrong-media',
        'wrong-media',
        'Only application/json in UTF-8 is taken here; nothing was changed.',
      );
    default:
      return null;
  }
}

/** The fault behind anything thrown; null for a defect of ours. */
export function faultOf(error: unknown): Fault | null {
  return error instanceof Fault ? error : (serverTrouble(error) ?? faultOfReader(error));
}

/** The only writer of an answer that is not 2xx. */
export function sendFault(response: Response, fault: Fault): void {
  const { status, title } = STATUS[fault.kind];
  if (fault.retryAfter_s !== undefined) response.set('Retry-After', String(fault.retryAfter_s));
  send(response, status, {
    type: `/api/docs#${fault.code}`,
    title,
    status,
    detail: fault.detail,
    instance: response.req.originalUrl.split('?')[0],
    requestId: requestIdOf(response),
    ...(fault.errors === undefined ? {} : { errors: fault.errors }),
    ...fault.extra,
  });
}

export function sendMethodNotAllowed(response: Response, allowed: readonly string[]): void {
  response.set('Allow', allowed.join(', '));
  send(response, 405, {
    type: '/api/docs#method-not-allowed',
    title: 'Not done this way',
    status: 405,
    detail: `This address takes ${allowed.join(', ')} only; nothing was changed.`,
    instance: response.req.originalUrl.split('?')[0],
    requestId: requestIdOf(response),
  });
}

function send(response: Response, status: number, body: Readonly<Record<string, unknown>>): void {
  response.status(status).set('Cache-Control', 'no-store');
  response.type('application/problem+json').send(JSON.stringify(body));
}

/** The last handler: a fault becomes its answer, anything else a 500 that tells nothing and a log line that tells all. */
export function errorResponse(log: Logger): ErrorRequestHandler {
  return (error: unknown, request, response, next) => {
    const fault = faultOf(error);
    if (fault === null || fault.kind === 'unavailable' || fault.kind === 'full') {
      log.error({ err: error, requestId: requestIdOf(response), method: request.method }, 'request failed');
    }
    if (response.headersSent) {
      next(error);
      return;
    }
    if (fault !== null) {
      sendFault(response, fault);
      return;
    }
    send(response, 500, {
      type: '/api/docs#defect',
      title: 'Something went wrong on our side',
      status: 500,
      detail:
        'This is a defect in the program. Nothing was changed unless you see it; quote the request number when you report it.',
      instance: request.originalUrl.split('?')[0],
      requestId: requestIdOf(response),
    });
  };
}
