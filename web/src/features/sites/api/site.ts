import { readSite } from '@embertally/shared/contracts/sites';
import { queryOptions } from '@tanstack/react-query';
import { call } from '../../../lib/api-client.ts';

/** One site: its buildings and people. */
export function siteQuery(siteId: string) {
  return queryOptions({
    queryKey: ['site', siteId],
    queryFn: ({ signal }) => call(readSite, { params: { siteId }, signal }),
  });
}
