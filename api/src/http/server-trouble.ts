import { Fault } from '../fault.ts';

/** SQLSTATE classes and codes that mean: not now. */
const NOT_NOW = [/^08/, /^57P0/, /^53[023]/, /^55P03$/, /^57014$/, /^40001$/, /^40P01$/];
const SOCKET = new Set(['ECONNREFUSED', 'ECONNRESET', 'EPIPE', 'ETIMEDOUT', 'ENOTFOUND', 'EAI_AGAIN', 'EHOSTUNREACH']);
const DRIVER = /Connection terminated|timeout exceeded when trying to connect|not queryable|Driver not Connected/i;

function codes(error: unknown): readonly string[] {
  if (typeof error !== 'object' || error === null) return [];
  const own = 'code' in error && typeof error.code === 'string' ? [error.code] : [];
  const inner = 'driverError' in error ? codes(error.driverError) : [];
  const several = error instanceof AggregateError ? (error.errors as unknown[]).flatMap(codes) : [];
  return [...own, ...inner, ...several];
}

/** A database or disk that cannot be used at this moment, as a fault; null when the error is something else. */
export function serverTrouble(error: unknown): Fault | null {
  const found = codes(error);
  if (found.some((code) => code === '53100' || code === 'ENOSPC' || code === 'EDQUOT')) {
    return new Fault(
      'full',
      'storage-full',
      'There is no room left on the server. Nothing was changed; tell whoever runs it.',
      {
        retryAfter_s: 60,
      },
    );
  }
  const text = error instanceof Error ? error.message : '';
  if (found.some((code) => SOCKET.has(code) || NOT_NOW.some((pattern) => pattern.test(code))) || DRIVER.test(text)) {
    return new Fault(
      'unavailable',
      'unavailable',
      'The database does not answer at this moment. Nothing was changed; try again in a few seconds.',
      { retryAfter_s: 2 },
    );
  }
  return null;
}
