import { createSite as contract, type Site } from '@embertally/shared/contracts/sites';
import type { QueryClient } from '@tanstack/react-query';
import { call } from '../../../lib/api-client.ts';
import { siteQuery } from './site.ts';

/** Makes a site; `id` is made by the form, so that sending twice makes one. */
export async function createSite(
  client: QueryClient,
  input: { readonly id: string; readonly name: string; readonly address: string; readonly time_zone: string },
): Promise<Site> {
  const site = await call(contract, { body: input });
  client.setQueryData(siteQuery(site.id).queryKey, site);
  await client.invalidateQueries({ queryKey: ['sites'] });
  return site;
}
