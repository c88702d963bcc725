import { readCurrentSession, type Me } from '@embertally/shared/contracts/sessions';
import { queryOptions } from '@tanstack/react-query';
import { call } from '../../../lib/api-client.ts';
import { NotSignedInError } from '../../../lib/api-errors.ts';
import { sessionHint } from '../../../lib/session-hint.ts';

async function readMe(signal: AbortSignal): Promise<Me | null> {
  if (!sessionHint.mayBeSignedIn()) return null;
  try {
    return await call(readCurrentSession, { signal });
  } catch (error) {
    if (!(error instanceof NotSignedInError)) throw error;
    sessionHint.set(false);
    return null;
  }
}

/** Who is signed in on this device; null: nobody. */
export function currentSessionQuery() {
  return queryOptions({
    queryKey: ['session'],
    queryFn: ({ signal }) => readMe(signal),
    staleTime: 60_000,
  });
}
