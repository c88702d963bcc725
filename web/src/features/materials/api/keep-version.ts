import { createOwnMaterial, createVersion, editVersion } from '@embertally/shared/contracts/own-materials';
import type { MaterialDraft } from '@embertally/shared/materials/material-draft';
import type { QueryClient } from '@tanstack/react-query';
import { call } from '../../../lib/api-client.ts';
import type { OwnMaterialVersion } from './material-version.ts';
import { rememberVersion } from './remember-version.ts';

interface Stated {
  readonly draft: MaterialDraft;
  /** Ids of the files that show it. */
  readonly evidence: readonly string[];
}

/** Makes a material; `id` is made by the form, so that sending twice makes one. */
export async function makeMaterial(client: QueryClient, id: string, stated: Stated): Promise<OwnMaterialVersion> {
  const { draft, evidence } = stated;
  return rememberVersion(client, await call(createOwnMaterial, { body: { id, draft, evidence: [...evidence] } }));
}

/** Makes the next version of a material. */
export async function makeVersion(
  client: QueryClient,
  materialId: string,
  id: string,
  { draft, evidence }: Stated,
): Promise<OwnMaterialVersion> {
  const made = await call(createVersion, { params: { materialId }, body: { id, draft, evidence: [...evidence] } });
  return rememberVersion(client, made);
}

/** Changes one's own draft that was read at `tag`. */
export async function changeVersion(
  client: QueryClient,
  at: { readonly material_id: string; readonly version: number; readonly tag: number },
  { draft, evidence }: Stated,
): Promise<OwnMaterialVersion> {
  const changed = await call(editVersion, {
    params: { materialId: at.material_id, version: String(at.version) },
    body: { draft, evidence: [...evidence] },
    ifMatch: at.tag,
  });
  return rememberVersion(client, changed);
}
