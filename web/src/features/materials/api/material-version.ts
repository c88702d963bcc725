import { readVersion, type OwnMaterialVersion } from '@embertally/shared/contracts/own-materials';
import { queryOptions } from '@tanstack/react-query';
import { call } from '../../../lib/api-client.ts';

export type { OwnMaterialVersion };

/** One version with what was stated, how its heat was derived, and the files that show it. */
export function materialVersionQuery(materialId: string, version: number) {
  return queryOptions({
    queryKey: ['own-materials', materialId, version],
    queryFn: ({ signal }) => call(readVersion, { params: { materialId, version: String(version) }, signal }),
  });
}
