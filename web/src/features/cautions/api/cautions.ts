import { listCautions } from '@embertally/shared/contracts/cautions';
import { queryOptions } from '@tanstack/react-query';
import { call } from '../../../lib/api-client.ts';

/** The cautions that stand with results. */
export function cautionsQuery() {
  return queryOptions({
    queryKey: ['cautions'],
    queryFn: ({ signal }) => call(listCautions, { signal }),
    staleTime: Infinity,
  });
}
