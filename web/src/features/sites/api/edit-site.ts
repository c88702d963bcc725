import { editSite as contract, type Site } from '@embertally/shared/contracts/sites';
import type { QueryClient } from '@tanstack/react-query';
import { call } from '../../../lib/api-client.ts';
import { siteQuery } from './site.ts';

/** Changes a site that was read at `version`; refused when somebody changed it since. */
export async function editSite(
  client: QueryClient,
  site: { readonly id: string; readonly version: number },
  input: { readonly name: string; readonly address: string; readonly time_zone: string },
): Promise<Site> {
  const changed = await call(contract, { params: { siteId: site.id }, body: input, ifMatch: site.version });
  client.setQueryData(siteQuery(site.id).queryKey, changed);
  await client.invalidateQueries({ queryKey: ['sites'] });
  return changed;
}
