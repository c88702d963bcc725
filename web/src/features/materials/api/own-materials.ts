import {
  listOwnMaterials,
  type OwnMaterialSummary,
  type VersionState,
} from '@embertally/shared/contracts/own-materials';
import { infiniteQueryOptions } from '@tanstack/react-query';
import { call } from '../../../lib/api-client.ts';

export type { OwnMaterialSummary, VersionState };

/** The organisation's own materials in every state, page by page. */
export function ownMaterialsQuery(search: string, state: VersionState | null) {
  return infiniteQueryOptions({
    queryKey: ['own-materials', 'list', search, state],
    queryFn: ({ pageParam, signal }) =>
      call(listOwnMaterials, {
        signal,
        query: {
          ...(search === '' ? {} : { search: search.slice(0, 100) }),
          ...(state === null ? {} : { state }),
          ...(pageParam === null ? {} : { cursor: pageParam }),
        },
      }),
    initialPageParam: null as string | null,
    getNextPageParam: (page) => page.next_cursor,
  });
}
