import { createBuilding, editBuilding, readBuilding } from '@embertally/shared/contracts/buildings';
import { defineRoute, type Route } from '../http/define-route.ts';
import { versionTag } from '../http/etags.ts';
import type { BuildingService } from '../services/building-service.ts';

export function buildingRoutes(buildings: BuildingService): Route[] {
  return [
    defineRoute(createBuilding, async ({ actor, access, body, trail }) => {
      const building = await buildings.create(actor, access, body, trail);
      return { kind: 'json', body: building, etag: versionTag(building.version) };
    }),
    defineRoute(readBuilding, async ({ access, params }) => {
      const building = await buildings.read(access, params.buildingId);
      return { kind: 'json', body: building, etag: versionTag(building.version) };
    }),
    defineRoute(editBuilding, async ({ actor, access, params, version, body, trail }) => {
      const building = await buildings.rename(actor, access, params.buildingId, version, body.name, trail);
      return { kind: 'json', body: building, etag: versionTag(building.version) };
    }),
  ];
}
