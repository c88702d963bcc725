import { discardVersion, moveVersion as contract } from '@embertally/shared/contracts/own-materials';
import type { QueryClient } from '@tanstack/react-query';
import { call } from '../../../lib/api-client.ts';
import type { OwnMaterialVersion } from './material-version.ts';
import { rememberVersion } from './remember-version.ts';

interface At {
  readonly material_id: string;
  readonly version: number;
  readonly tag: number;
}

export type Move =
  | { readonly state: 'put-forward' | 'approved' }
  | { readonly state: 'returned' | 'withdrawn'; readonly reason: string };

/** Puts a draft forward, approves or returns it, or withdraws what is in force. */
export async function moveVersion(client: QueryClient, at: At, move: Move): Promise<OwnMaterialVersion> {
  const moved = await call(contract, {
    params: { materialId: at.material_id, version: String(at.version) },
    body: move,
    ifMatch: at.tag,
  });
  return rememberVersion(client, moved);
}

/** Throws a draft away. */
export async function discardDraft(client: QueryClient, at: At): Promise<void> {
  await call(discardVersion, {
    params: { materialId: at.material_id, version: String(at.version) },
    ifMatch: at.tag,
  });
  await client.invalidateQueries({ queryKey: ['own-materials'] });
}
