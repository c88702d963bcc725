import { z } from 'zod/mini';
import { defineContract } from './contract.ts';

/** What a limit can bound: a path of the tally. */
export const limitQuantitySchema = z.enum([
  'load_per_floor_MJ_m2',
  'load_total_MJ',
  'load_design_MJ_m2',
  'peak_kW',
  'equivalent_time_min',
]);
export type LimitQuantity = z.infer<typeof limitQuantitySchema>;

const limitFields = {
  quantity: limitQuantitySchema,
  bound: z.number().check(z.minimum(1e-6), z.maximum(1e9)),
  /** A house rule may be set by a manager; a permit or policy clause only by an inspector or reviewer. */
  source: z.enum(['permit', 'policy', 'house-rule']),
  /** Who set it and where it stands: "permit 12/7, clause 4". */
  set_by: z.string().check(z.trim(), z.minLength(1), z.maxLength(200)),
  since: z.iso.date(),
};
export const limitSchema = z.strictObject({
  id: z.uuid(),
  building_id: z.uuid(),
  room_id: z.uuid(),
  ...limitFields,
  entered_by: z.string(),
  entered_at: z.iso.datetime(),
  version: z.int(),
});
export type Limit = z.infer<typeof limitSchema>;

export const listLimits = defineContract({
  id: 'limits.list',
  method: 'GET',
  path: '/api/buildings/:buildingId/limits',
  summary: 'Limits on the rooms of a building',
  policy: { kind: 'site', action: 'limit.read', of: 'building', param: 'buildingId' },
  params: z.strictObject({ buildingId: z.uuid() }),
  response: z.strictObject({ items: z.array(limitSchema) }),
  status: 200,
});

export const createLimit = defineContract({
  id: 'limits.create',
  method: 'POST',
  path: '/api/buildings/:buildingId/limits',
  summary: 'Set a limit on a room',
  policy: { kind: 'site', action: 'house-rule.set', of: 'building', param: 'buildingId' },
  params: z.strictObject({ buildingId: z.uuid() }),
  body: z.strictObject({ id: z.uuid(), room_id: z.uuid(), ...limitFields }),
  response: limitSchema,
  status: 201,
});

export const editLimit = defineContract({
  id: 'limits.edit',
  method: 'PATCH',
  path: '/api/limits/:limitId',
  summary: 'Change a limit',
  policy: { kind: 'site', action: 'house-rule.set', of: 'limit', param: 'limitId' },
  params: z.strictObject({ limitId: z.uuid() }),
  body: z.strictObject({
    bound: z.optional(limitFields.bound),
    set_by: z.optional(limitFields.set_by),
    since: z.optional(limitFields.since),
  }),
  response: limitSchema,
  status: 200,
  ifMatch: true,
});

export const deleteLimit = defineContract({
  id: 'limits.delete',
  method: 'DELETE',
  path: '/api/limits/:limitId',
  summary: 'Take a limit away',
  policy: { kind: 'site', action: 'house-rule.set', of: 'limit', param: 'limitId' },
  params: z.strictObject({ limitId: z.uuid() }),
  status: 204,
  ifMatch: true,
});
