import { z } from 'zod/mini';
import { defineContract } from './contract.ts';
import { buildingSummarySchema } from './sites.ts';

const name = z.string().check(z.trim(), z.minLength(1), z.maxLength(200));
const buildingId = z.strictObject({ buildingId: z.uuid() });

export const createBuilding = defineContract({
  id: 'buildings.create',
  method: 'POST',
  path: '/api/sites/:siteId/buildings',
  summary: 'Make a building with its working survey and first storey',
  policy: { kind: 'site', action: 'building.create', of: 'site', param: 'siteId' },
  params: z.strictObject({ siteId: z.uuid() }),
  body: z.strictObject({ id: z.uuid(), survey_id: z.uuid(), storey_id: z.uuid(), name, storey_name: name }),
  response: buildingSummarySchema,
  status: 201,
});

export const readBuilding = defineContract({
  id: 'buildings.read',
  method: 'GET',
  path: '/api/buildings/:buildingId',
  summary: 'One building',
  policy: { kind: 'site', action: 'site.read', of: 'building', param: 'buildingId' },
  params: buildingId,
  response: buildingSummarySchema,
  status: 200,
});

export const editBuilding = defineContract({
  id: 'buildings.edit',
  method: 'PATCH',
  path: '/api/buildings/:buildingId',
  summary: 'Rename a building',
  policy: { kind: 'site', action: 'building.edit', of: 'building', param: 'buildingId' },
  params: buildingId,
  body: z.strictObject({ name }),
  response: buildingSummarySchema,
  status: 200,
  ifMatch: true,
});
