import type { QueryClient } from '@tanstack/react-query';
import { materialVersionQuery, type OwnMaterialVersion } from './material-version.ts';

/** After a change: the version as it was answered, and everything that lists it read anew. */
export async function rememberVersion(client: QueryClient, version: OwnMaterialVersion): Promise<OwnMaterialVersion> {
  await Promise.all([
    client.invalidateQueries({ queryKey: ['own-materials'] }),
    client.invalidateQueries({ queryKey: ['materials'] }),
  ]);
  client.setQueryData(materialVersionQuery(version.material_id, version.version).queryKey, version);
  return version;
}
