import { z } from 'zod/mini';
import { limitQuantitySchema } from '../contracts/limits.ts';

/**
 * What an estimate of one room is made from. Units are in the names; a field that is left out or null takes its default,
 * and the working says so. Rules that need more than one field (rings, openings against walls, catalogue keys) are
 * checked by `parseRoomInput`.
 */
const LARGEST_ENTRY_KG = 1_000_000;

function maybe<T extends z.core.SomeType>(schema: T) {
  return z.optional(z.nullable(schema));
}
const text = (max: number) => z.string().check(z.maxLength(max));
const amount = (max: number) => z.number().check(z.minimum(0), z.maximum(max));
const positive = (max: number) => z.number().check(z.positive(), z.maximum(max));
const between = (min: number, max: number) => z.number().check(z.minimum(min), z.maximum(max));
const coordinate = z.number().check(z.minimum(-10_000), z.maximum(10_000));
const point = z.tuple([coordinate, coordinate]);
const ring = z.array(point).check(z.minLength(3), z.maxLength(1000));

const layer = z.strictObject({
  thickness_m: between(1e-5, 10),
  conductivity_W_mK: between(1e-4, 1000),
  density_kg_m3: between(1, 25_000),
  specific_heat_J_kgK: between(10, 20_000),
  label: maybe(text(120)),
});
const surface = z.union([
  z.strictObject({ key: text(60) }),
  z.strictObject({ layers: z.array(layer).check(z.minLength(1), z.maxLength(8)) }),
]);

const opening = z.strictObject({
  id: maybe(text(100)),
  label: maybe(text(200)),
  kind: maybe(z.enum(['door', 'window', 'vent', 'shutter', 'gap'])),
  width_m: between(0.001, 1000),
  height_m: between(0.001, 100),
  sill_m: maybe(amount(100)),
  state: maybe(z.enum(['open', 'fails', 'closed'])),
  leads_to: maybe(z.enum(['outside', 'inside'])),
});

const yesNo = z.enum(['yes', 'no', 'unknown', 'not-applicable']);
const protection = z.strictObject({
  sprinklers: maybe(
    z.strictObject({
      rti: positive(1000),
      activation_C: z.number().check(z.minimum(30), z.maximum(400)),
      distance_m: maybe(positive(50)),
    }),
  ),
  independent_water_supplies: maybe(z.int().check(z.minimum(0), z.maximum(2))),
  detection: maybe(z.enum(['none', 'heat', 'smoke', 'both', 'unknown'])),
  alarm_to_brigade: maybe(z.boolean()),
  brigade: maybe(z.enum(['none', 'works', 'off-site', 'both', 'unknown'])),
  access_routes: maybe(z.enum(['pressurised', 'normal', 'missing', 'unknown'])),
  firefighting_devices: maybe(yesNo),
  stair_smoke_exhaust: maybe(yesNo),
});

const room = z.strictObject({
  name: text(200),
  use: maybe(text(80)),
  ring_m: ring,
  holes_m: maybe(z.array(ring).check(z.maxLength(50))),
  height_m: positive(100),
  measured_floor_area_m2: maybe(positive(1_000_000)),
  compartment_floor_m2: maybe(positive(1_000_000)),
  bounded_by_rated_construction: maybe(z.boolean()),
  lining: maybe(z.strictObject({ walls: maybe(surface), ceiling: maybe(surface), floor: maybe(surface) })),
  openings: maybe(z.array(opening).check(z.maxLength(500))),
  roof_vents_m2: maybe(amount(100_000)),
  roof_vents_state: maybe(z.enum(['open', 'fails', 'closed'])),
  protection: maybe(protection),
  danger_of_activation: maybe(z.number().check(z.minimum(0.5), z.maximum(3))),
  rating_min: maybe(amount(480)),
});

const part = z.strictObject({
  /** Key of the catalogue; with a heat of its own the key only says which material it is. */
  material: maybe(text(80)),
  label: maybe(text(200)),
  mass_kg: amount(LARGEST_ENTRY_KG),
  net_heat_MJ_kg: maybe(amount(150)),
  low_MJ_kg: maybe(amount(150)),
  high_MJ_kg: maybe(amount(150)),
  heat_source: maybe(text(500)),
  /** Basis of the heat given here; net and as received when nothing is said. */
  basis: maybe(z.enum(['net', 'gross'])),
  water: maybe(z.enum(['dry', 'as_received'])),
  /** Percent of the wet mass. */
  moisture_pct: maybe(amount(95)),
  /** Needed to make a net heat of a gross one. */
  hydrogen_mass_fraction: maybe(amount(1)),
  /** `effective`: measured as burnt (cone, furniture calorimeter), so the combustion factor is already in it. */
  heat_basis: maybe(z.enum(['complete', 'effective'])),
  cellulosic: maybe(z.boolean()),
  /** kg per kg burnt with enough air; those of the material when nothing is said. */
  soot_yield: maybe(amount(1)),
  co_yield: maybe(amount(1)),
});

const entry = z.strictObject({
  id: text(100).check(z.minLength(1)),
  label: maybe(text(500)),
  kind: maybe(text(80)),
  count: amount(1_000_000),
  keeping: maybe(z.enum(['fixed', 'stored', 'passing'])),
  enclosure: maybe(z.enum(['open', 'cabinet', 'sealed'])),
  sealed_rating_min: maybe(positive(480)),
  evidence: maybe(z.enum(['weighed', 'counted', 'measured', 'estimated', 'hearsay'])),
  parts: z.array(part).check(z.maxLength(20)),
  x_m: maybe(coordinate),
  y_m: maybe(coordinate),
  rotation_deg: maybe(z.number().check(z.minimum(-360), z.maximum(360))),
  base_height_m: maybe(amount(100)),
  width_m: maybe(positive(1000)),
  depth_m: maybe(positive(1000)),
  height_m: maybe(positive(100)),
  growth: maybe(z.enum(['slow', 'medium', 'fast', 'ultra-fast'])),
  peak_kW: maybe(positive(1_000_000)),
  /** Measured curve `[[s, kW], …]` of the whole entry; replaces growth and peak. */
  curve: maybe(z.array(z.tuple([amount(1_000_000), amount(1_000_000)])).check(z.minLength(2), z.maxLength(2000))),
  radiative_fraction: maybe(amount(1)),
  ignition_class: maybe(z.enum(['easy', 'normal', 'hard', 'resistant'])),
  ignites_at_kW_m2: maybe(positive(200)),
});

const limit = z.strictObject({
  quantity: limitQuantitySchema,
  bound: between(1e-6, 1e9),
  set_by: maybe(text(200)),
});

const options = z.strictObject({
  growth: maybe(z.enum(['slow', 'medium', 'fast', 'ultra-fast'])),
  growth_convention: maybe(z.enum(['EN', 'NFPA'])),
  plateau_kW_m2: maybe(positive(100_000)),
  fire_area_m2: maybe(positive(1_000_000)),
  combustion_factor: maybe(z.number().check(z.positive(), z.maximum(1))),
  load_basis: maybe(z.enum(['as_surveyed', 'mean', 'peak_stock'])),
  protected_loads: maybe(z.enum(['0.85', 'EN'])),
  protected_loads_note: maybe(text(500)),
  area_factor: maybe(z.enum(['linear', 'step-up'])),
  exposure_s: maybe(between(1, 86_400)),
  kb: maybe(z.union([z.enum(['EN', 'UK']), positive(1)])),
  kc: maybe(z.union([z.enum(['unprotected_steel', 'timber', 'composite']), positive(20)])),
  ambient_C: maybe(z.number().check(z.minimum(-50), z.maximum(60))),
  samples: maybe(z.int().check(z.minimum(0), z.maximum(100_000))),
  seed: maybe(z.int().check(z.minimum(0))),
  time_limit_min: maybe(positive(480)),
  first_entry: maybe(text(100)),
});

export const roomInputSchema = z.strictObject({
  room,
  contents: z.array(entry).check(z.maxLength(20_000)),
  limits: maybe(z.array(limit).check(z.maxLength(100))),
  options: maybe(options),
});

export type RoomInput = z.infer<typeof roomInputSchema>;
export type RoomInputRoom = RoomInput['room'];
export type RoomInputOpening = z.infer<typeof opening>;
export type RoomInputEntry = z.infer<typeof entry>;
export type RoomInputPart = z.infer<typeof part>;
export type RoomInputLayer = z.infer<typeof layer>;
export type RoomInputSurface = z.infer<typeof surface>;
export type RoomInputProtection = z.infer<typeof protection>;
export type RoomInputOptions = z.infer<typeof options>;
export type RoomInputLimit = z.infer<typeof limit>;
