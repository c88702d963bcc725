import { listKinds, type kindSchema } from '@embertally/shared/contracts/catalogue';
import { queryOptions } from '@tanstack/react-query';
import type { z } from 'zod/mini';
import { call } from '../../../lib/api-client.ts';

export type CatalogueKind = z.infer<typeof kindSchema>;

/** The kinds: templates for entries. They change only with the program. */
export function kindsQuery() {
  return queryOptions({
    queryKey: ['kinds'],
    queryFn: ({ signal }) => call(listKinds, { signal }),
    staleTime: Infinity,
  });
}
