import { signIn as contract, type Me } from '@embertally/shared/contracts/sessions';
import type { QueryClient } from '@tanstack/react-query';
import { call } from '../../../lib/api-client.ts';
import { sessionEnded } from '../../../lib/session-ended.ts';
import { sessionHint } from '../../../lib/session-hint.ts';
import { currentSessionQuery } from './current-session.ts';

/** Begins a session and puts the person in place for every screen. */
export async function signIn(
  client: QueryClient,
  input: { readonly email: string; readonly password: string },
): Promise<Me> {
  // Whoever signs up holds more than these two; the contract takes nothing else.
  const { email, password } = input;
  const me = await call(contract, { body: { email, password } });
  client.setQueryData(currentSessionQuery().queryKey, me);
  sessionHint.set(true);
  sessionEnded.set(false);
  return me;
}
