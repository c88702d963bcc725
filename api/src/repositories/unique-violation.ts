import { QueryFailedError } from 'typeorm';

const UNIQUE = '23505';

/** The name of the unique constraint an error is about; null when it is about something else. */
export function uniqueViolation(error: unknown): string | null {
  if (!(error instanceof QueryFailedError)) return null;
  const driver = error.driverError as { readonly code?: unknown; readonly constraint?: unknown };
  return driver.code === UNIQUE && typeof driver.constraint === 'string' ? driver.constraint : null;
}
