import { readCurrentSession, type Me } from '@embertally/shared/contracts/sessions';
import { queryOptions } from '@tanstack/react-query';
import { call } from '../../../lib/api-client.ts';
import { NotSignedInError } from '../../../lib/api-errors.ts';

async function readMe(signal: AbortSignal): Promise<Me | null> {
  try {
    return await call(readCurrentSession, { signal });
  } catch (error) {
    if (error instanceof NotSignedInError) return null;
    throw error;
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
