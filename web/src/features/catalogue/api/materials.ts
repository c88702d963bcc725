import { listMaterials, type materialSchema } from '@embertally/shared/contracts/materials';
import { queryOptions } from '@tanstack/react-query';
import type { z } from 'zod/mini';
import { call } from '../../../lib/api-client.ts';

export type CatalogueMaterial = z.infer<typeof materialSchema>;

/** The built-in materials with their heats and sources. They change only with the program. */
export function materialsQuery() {
  return queryOptions({
    queryKey: ['materials'],
    queryFn: ({ signal }) => call(listMaterials, { signal }),
    staleTime: Infinity,
  });
}
