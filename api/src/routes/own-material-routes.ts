import {
  createOwnMaterial,
  createVersion,
  discardVersion,
  editVersion,
  listOwnMaterials,
  moveVersion,
  readOwnMaterial,
  readVersion,
  type OwnMaterialVersion,
} from '@embertally/shared/contracts/own-materials';
import { defineRoute, type Answer, type Route } from '../http/define-route.ts';
import { versionTag } from '../http/etags.ts';
import type { OwnMaterialService } from '../services/own-material-service.ts';
import type { VersionStateService } from '../services/version-state-service.ts';

const tagged = (version: OwnMaterialVersion): Answer<OwnMaterialVersion> => ({
  kind: 'json',
  body: version,
  etag: versionTag(version.tag),
});

export function ownMaterialRoutes(materials: OwnMaterialService, states: VersionStateService): Route[] {
  return [
    defineRoute(listOwnMaterials, async ({ actor, query }) => ({
      kind: 'json',
      body: await materials.list(actor, query),
    })),
    defineRoute(createOwnMaterial, async ({ actor, body, trail }) =>
      tagged(await materials.create(actor, body, trail)),
    ),
    defineRoute(readOwnMaterial, async ({ actor, params }) => {
      const material = await materials.read(actor, params.materialId);
      return { kind: 'json', body: material, etag: versionTag(material.tag) };
    }),
    defineRoute(createVersion, async ({ actor, params, body, trail }) =>
      tagged(await materials.createVersion(actor, params.materialId, body, trail)),
    ),
    defineRoute(readVersion, async ({ actor, params }) =>
      tagged(await materials.readVersion(actor, params.materialId, params.version)),
    ),
    defineRoute(editVersion, async ({ actor, params, version, body, trail }) =>
      tagged(await materials.edit(actor, params.materialId, params.version, version, body, trail)),
    ),
    defineRoute(discardVersion, async ({ actor, params, version, trail }) => {
      await materials.discard(actor, params.materialId, params.version, version, trail);
      return { kind: 'nothing' };
    }),
    defineRoute(moveVersion, async ({ actor, params, version, body, trail }) =>
      tagged(await states.move(actor, params.materialId, params.version, version, body, trail)),
    ),
  ];
}
