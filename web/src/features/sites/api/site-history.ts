import { readHistory } from '@embertally/shared/contracts/history';
import { infiniteQueryOptions } from '@tanstack/react-query';
import { call } from '../../../lib/api-client.ts';

/** What was done on a site, newest first, in pages. */
export function siteHistoryQuery(siteId: string) {
  return infiniteQueryOptions({
    queryKey: ['site', siteId, 'history'],
    initialPageParam: null as number | null,
    queryFn: ({ pageParam, signal }) =>
      call(readHistory, {
        params: { siteId },
        query: { limit: 12, ...(pageParam === null ? {} : { before: pageParam }) },
        signal,
      }),
    getNextPageParam: (page) => page.next_before,
  });
}
