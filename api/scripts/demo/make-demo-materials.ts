import type { OwnMaterialVersion } from '@embertally/shared/contracts/own-materials';
import type { Actor, Trail } from '../../src/actor.ts';
import type { Services } from '../../src/services/services.ts';
import { DEMO_MATERIALS, type DemoMaterial } from './demo-materials.ts';

interface MakeParts {
  readonly services: Services;
  readonly as: (role: DemoMaterial['by']) => Actor;
  readonly idOf: (name: string) => string;
  readonly trail: Trail;
}

/** Makes the demo's own materials as two people would. What an earlier run has done is left as it is. */
export async function makeDemoMaterials(parts: MakeParts): Promise<void> {
  for (const material of DEMO_MATERIALS) await make(parts, material);
}

async function make({ services, as, idOf, trail }: MakeParts, material: DemoMaterial): Promise<void> {
  const author = as(material.by);
  const second = as(material.by === 'manager' ? 'viewer' : 'manager');
  const evidence: string[] = [];
  if (material.table !== undefined) {
    const file = { id: idOf(`file ${material.name}`), name: material.table.name, type: 'text/csv' } as const;
    evidence.push((await services.files.send(author, file, whole(material.table.text), trail)).id);
  }
  const id = idOf(`material ${material.name}`);
  let version = await services.ownMaterials.create(author, { id, draft: material.draft, evidence }, trail);
  const move = async (who: Actor, state: 'put-forward' | 'approved'): Promise<OwnMaterialVersion> =>
    services.versionStates.move(who, id, version.version, version.tag, { state }, trail);
  if (version.state === 'draft') version = await move(author, 'put-forward');
  if (material.decided && version.state === 'put-forward') await move(second, 'approved');
}

async function* whole(text: string): AsyncIterable<Uint8Array> {
  await Promise.resolve();
  yield Buffer.from(text, 'utf8');
}
