import { signOut as contract } from '@embertally/shared/contracts/sessions';
import type { QueryClient } from '@tanstack/react-query';
import { call } from '../../../lib/api-client.ts';
import { NotSignedInError } from '../../../lib/api-errors.ts';
import { sessionEnded } from '../../../lib/session-ended.ts';
import { sessionHint } from '../../../lib/session-hint.ts';
import { currentSessionQuery } from './current-session.ts';

/** Ends the session on the server, then forgets everything that was read in it. Already ended counts as done. */
export async function signOut(client: QueryClient): Promise<void> {
  try {
    await call(contract, {});
  } catch (error) {
    if (!(error instanceof NotSignedInError)) throw error;
  }
  sessionHint.set(false);
  client.clear();
  client.setQueryData(currentSessionQuery().queryKey, null);
  sessionEnded.set(false);
}
