import type { SiteRoleName } from '@embertally/shared/policy/policy';
import { giveSiteRole as contract } from '@embertally/shared/contracts/sites';
import type { QueryClient } from '@tanstack/react-query';
import { call } from '../../../lib/api-client.ts';
import { siteQuery } from './site.ts';

/** Gives a person of any organisation a role on the site. */
export async function giveSiteRole(
  client: QueryClient,
  siteId: string,
  input: { readonly id: string; readonly email: string; readonly role: SiteRoleName },
): Promise<void> {
  await call(contract, { params: { siteId }, body: input });
  await client.invalidateQueries({ queryKey: siteQuery(siteId).queryKey });
}
