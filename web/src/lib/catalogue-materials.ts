import { listMaterials, type materialSchema } from '@embertally/shared/contracts/materials';
import { queryOptions } from '@tanstack/react-query';
import type { z } from 'zod/mini';
import { call } from './api-client.ts';

/** A material that may be placed: built in, or an approved one of the organisation's own. */
export type CatalogueMaterial = z.infer<typeof materialSchema>;

/** Every material that may be placed. */
export function materialsQuery() {
  return queryOptions({
    queryKey: ['materials'],
    queryFn: ({ signal }) => call(listMaterials, { signal }),
    staleTime: 60_000,
  });
}
