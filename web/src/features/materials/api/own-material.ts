import { readOwnMaterial, type OwnMaterial, type VersionSummary } from '@embertally/shared/contracts/own-materials';
import { queryOptions } from '@tanstack/react-query';
import { call } from '../../../lib/api-client.ts';

export type { OwnMaterial, VersionSummary };

/** One own material with its versions, newest first. */
export function ownMaterialQuery(materialId: string) {
  return queryOptions({
    queryKey: ['own-materials', materialId],
    queryFn: ({ signal }) => call(readOwnMaterial, { params: { materialId }, signal }),
  });
}
