import { listSites } from '@embertally/shared/contracts/sites';
import { infiniteQueryOptions } from '@tanstack/react-query';
import { call } from '../../../lib/api-client.ts';

/** The sites the person has a role on, in pages; `search` narrows by name or address. */
export function sitesQuery(search: string) {
  return infiniteQueryOptions({
    queryKey: ['sites', { search }],
    initialPageParam: null as string | null,
    queryFn: ({ pageParam, signal }) =>
      call(listSites, {
        query: {
          limit: 50,
          ...(search === '' ? {} : { search }),
          ...(pageParam === null ? {} : { cursor: pageParam }),
        },
        signal,
      }),
    getNextPageParam: (page) => page.next_cursor,
  });
}
