import type { Request } from 'express';
import { Fault } from '../fault.ts';

const SAFE = new Set(['GET', 'HEAD', 'OPTIONS']);
const LOOPBACK = /^(localhost|127\.0\.0\.1|\[::1\])(:\d+)?$/;

/** On this machine the same server is reached by several names; elsewhere by BASE_URL only. */
function isOurs(origin: string, request: Request, baseUrl: URL): boolean {
  if (origin === baseUrl.origin) return true;
  const host = request.headers.host ?? '';
  return LOOPBACK.test(baseUrl.host) && LOOPBACK.test(host) && origin === `${baseUrl.protocol}//${host}`;
}

/**
 * Unsafe methods are taken from our own pages only: told by fetch metadata, by Origin, and by a header that a foreign
 * page cannot set without asking first. Each is checked on its own; the session cookie is SameSite besides.
 * @throws Fault 403
 */
export function checkOrigin(request: Request, baseUrl: URL): void {
  if (SAFE.has(request.method)) return;
  const site = request.headers['sec-fetch-site'];
  const origin = request.headers.origin;
  const refuse = (code: string): Fault =>
    new Fault(
      'forbidden',
      code,
      'This did not come from a page of ours, so nothing was changed. Reload the page and try again.',
    );
  if (site !== undefined && site !== 'same-origin') throw refuse('foreign-site');
  if (origin !== undefined && !isOurs(origin, request, baseUrl)) throw refuse('foreign-origin');
  if (site === undefined && origin === undefined) throw refuse('origin-missing');
  if (request.headers['x-embertally'] !== 'web') throw refuse('header-missing');
}
