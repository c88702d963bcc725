import { readExport, type Export } from '@embertally/shared/contracts/exports';
import { queryOptions } from '@tanstack/react-query';
import { call } from '../../lib/api-client.ts';

const AGAIN_MS = 600;

/** Asks how far a file is until it is ready, failed or stopped. */
export function watchExport(exportId: string) {
  return queryOptions({
    queryKey: ['exports', exportId],
    queryFn: ({ signal }) => call(readExport, { params: { exportId }, signal }),
    refetchInterval: (query) => (isUnderWay(query.state.data) ? AGAIN_MS : false),
    gcTime: 0,
  });
}

export function isUnderWay(made: Export | undefined): boolean {
  return made === undefined || made.state === 'waiting' || made.state === 'running';
}
