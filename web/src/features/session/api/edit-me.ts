import { editMe as contract, type Me } from '@embertally/shared/contracts/sessions';
import type { QueryClient } from '@tanstack/react-query';
import { call } from '../../../lib/api-client.ts';
import { currentSessionQuery } from './current-session.ts';

/** Changes the person's own name or units; every screen reads the answer at once. */
export async function editMe(
  client: QueryClient,
  input: { readonly name?: string; readonly units?: 'SI' | 'US' },
): Promise<Me> {
  const me = await call(contract, { body: input });
  client.setQueryData(currentSessionQuery().queryKey, me);
  return me;
}
