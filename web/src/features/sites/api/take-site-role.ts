import { takeSiteRole as contract } from '@embertally/shared/contracts/sites';
import type { QueryClient } from '@tanstack/react-query';
import { call } from '../../../lib/api-client.ts';
import { siteQuery } from './site.ts';

/** Takes a role away; refused for the last manager. */
export async function takeSiteRole(client: QueryClient, siteId: string, roleId: string): Promise<void> {
  await call(contract, { params: { siteId, roleId } });
  await client.invalidateQueries({ queryKey: siteQuery(siteId).queryKey });
}
