import { listLimits } from '@embertally/shared/contracts/limits';
import { queryOptions } from '@tanstack/react-query';
import { call } from '../../../lib/api-client.ts';

/** The limits on the rooms of one building. */
export function limitsQuery(buildingId: string) {
  return queryOptions({
    queryKey: ['building', buildingId, 'limits'],
    queryFn: ({ signal }) => call(listLimits, { params: { buildingId }, signal }),
  });
}
