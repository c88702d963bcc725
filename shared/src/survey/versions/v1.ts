import { z } from 'zod/mini';

/**
 * The survey document, version 1. FROZEN once released: a changed shape is a new file `v2.ts` with a step from this one.
 * Every length is in metres, every mass in kilograms, every heat in MJ/kg; the unit is part of the field's name.
 * Fields are strict: an unknown key is refused.
 */
export const SCHEMA_VERSION = 1;

const id = z.uuid();
const text = (max: number) => z.string().check(z.maxLength(max));
const coordinate = z.number().check(z.minimum(-10_000), z.maximum(10_000));
const nullable = z.nullable;

export const liningLayer = z.strictObject({
  thickness_m: z.number().check(z.minimum(1e-5), z.maximum(10)),
  conductivity_W_mK: z.number().check(z.minimum(1e-4), z.maximum(1000)),
  density_kg_m3: z.number().check(z.minimum(1), z.maximum(25_000)),
  specific_heat_J_kgK: z.number().check(z.minimum(10), z.maximum(20_000)),
  label: z.optional(text(120)),
});
/** A surface is a key of `shared/src/catalogue/linings` or its own layers, exposed side first. */
export const liningSurface = z.union([
  z.strictObject({ key: text(60) }),
  z.strictObject({ layers: z.array(liningLayer).check(z.minLength(1), z.maxLength(8)) }),
]);
export const lining = z.strictObject({
  walls: nullable(liningSurface),
  ceiling: nullable(liningSurface),
  floor: nullable(liningSurface),
});

const yesNo = z.enum(['yes', 'no', 'unknown', 'not-applicable']);
export const protection = z.strictObject({
  sprinklers: nullable(
    z.strictObject({
      rti: z.number().check(z.positive(), z.maximum(1000)),
      activation_C: z.number().check(z.minimum(30), z.maximum(400)),
      distance_m: z.number().check(z.positive(), z.maximum(50)),
    }),
  ),
  independent_water_supplies: nullable(z.int().check(z.minimum(0), z.maximum(2))),
  detection: z.enum(['none', 'heat', 'smoke', 'both', 'unknown']),
  alarm_to_brigade: nullable(z.boolean()),
  brigade: z.enum(['none', 'works', 'off-site', 'both', 'unknown']),
  access_routes: z.enum(['pressurised', 'normal', 'missing', 'unknown']),
  firefighting_devices: yesNo,
  stair_smoke_exhaust: yesNo,
});

export const planPicture = z.strictObject({
  file_id: id,
  width_px: z.int().check(z.positive(), z.maximum(20_000)),
  height_px: z.int().check(z.positive(), z.maximum(20_000)),
  metres_per_px: z.number().check(z.positive(), z.maximum(10)),
  x_m: coordinate,
  y_m: coordinate,
  rotation_deg: z.number().check(z.minimum(-360), z.maximum(360)),
  opacity: z.number().check(z.minimum(0), z.maximum(1)),
  locked: z.boolean(),
});

export const storey = z.strictObject({
  id,
  name: text(200).check(z.minLength(1)),
  level_m: coordinate,
  height_m: z.number().check(z.minimum(0.5), z.maximum(100)),
  wall_thickness_m: z.number().check(z.minimum(0), z.maximum(2)),
  plan_picture: nullable(planPicture),
  /** Degrees clockwise from the plan's y axis to north; null: not known, no north arrow. */
  north_deg: nullable(z.number().check(z.minimum(-360), z.maximum(360))),
});

export const corner = z.strictObject({ id, storey_id: id, x_m: coordinate, y_m: coordinate });

const ring = z.array(id).check(z.minLength(3), z.maxLength(500));
export const room = z.strictObject({
  id,
  storey_id: id,
  name: text(200).check(z.minLength(1)),
  /** Corner ids on wall centre lines, either way round, not closed by a repeated corner. */
  ring,
  holes: z.array(ring).check(z.maxLength(50)),
  /** Clear height; null: the storey's. */
  height_m: nullable(z.number().check(z.minimum(0.5), z.maximum(100))),
  /** A key of `shared/src/catalogue/uses`, or a person's own word for it, or null. */
  use: nullable(text(80)),
  lining,
  protection,
  rating_min: nullable(z.number().check(z.minimum(0), z.maximum(480))),
  danger_of_activation: nullable(z.number().check(z.minimum(0.5), z.maximum(3))),
  measured_floor_area_m2: nullable(z.number().check(z.positive(), z.maximum(1_000_000))),
  compartment_floor_m2: nullable(z.number().check(z.positive(), z.maximum(1_000_000))),
  bounded_by_rated_construction: nullable(z.boolean()),
  roof_vents_m2: z.number().check(z.minimum(0), z.maximum(100_000)),
  roof_vents_state: z.enum(['open', 'closed', 'fails']),
  notes: text(10_000),
});

export const openingState = z.enum(['open', 'closed', 'fails']);
export const opening = z.strictObject({
  id,
  storey_id: id,
  /** The two corners of the wall it stands in; `offset_m` counts from the first to the opening's near edge. */
  wall: z.tuple([id, id]),
  offset_m: z.number().check(z.minimum(0), z.maximum(10_000)),
  width_m: z.number().check(z.minimum(0.05), z.maximum(1000)),
  height_m: z.number().check(z.minimum(0.05), z.maximum(100)),
  sill_m: z.number().check(z.minimum(0), z.maximum(100)),
  kind: z.enum(['door', 'window', 'vent', 'shutter', 'gap']),
  state: openingState,
  label: text(200),
});

export const keeping = z.enum(['fixed', 'stored', 'passing']);
export const enclosure = z.enum(['open', 'cabinet', 'sealed']);
export const evidence = z.enum(['weighed', 'counted', 'measured', 'estimated', 'hearsay']);
export const growthClass = z.enum(['slow', 'medium', 'fast', 'ultra-fast']);
export const ignitionClass = z.enum(['easy', 'normal', 'hard', 'resistant']);

export const entryPart = z.strictObject({
  /** Key of a built-in material or id of an organisation's own; null: a heat of the person's own. */
  material: nullable(text(80)),
  material_version: nullable(z.int().check(z.minimum(1))),
  label: text(200),
  /** Copied when the entry is placed, so a tally never changes silently with the catalogue. */
  net_heat_MJ_kg: z.number().check(z.minimum(0), z.maximum(150)),
  low_MJ_kg: z.number().check(z.minimum(0), z.maximum(150)),
  high_MJ_kg: z.number().check(z.minimum(0), z.maximum(150)),
  heat_source: text(500),
  mass_kg: z.number().check(z.minimum(0), z.maximum(1_000_000)),
  /** Percent of wet mass; null: the heat is as received. */
  moisture_pct: nullable(z.number().check(z.minimum(0), z.maximum(95))),
});

export const entry = z.strictObject({
  id,
  room_id: id,
  /** Key of `shared/src/catalogue/kinds`, or null for something of the person's own. */
  kind: nullable(text(80)),
  label: text(500).check(z.minLength(1)),
  count: z.number().check(z.minimum(0), z.maximum(1_000_000)),
  parts: z.array(entryPart).check(z.minLength(1), z.maxLength(20)),
  x_m: coordinate,
  y_m: coordinate,
  rotation_deg: z.number().check(z.minimum(-360), z.maximum(360)),
  base_height_m: z.number().check(z.minimum(0), z.maximum(100)),
  width_m: z.number().check(z.minimum(0.01), z.maximum(1000)),
  depth_m: z.number().check(z.minimum(0.01), z.maximum(1000)),
  height_m: z.number().check(z.minimum(0.01), z.maximum(100)),
  keeping,
  enclosure,
  sealed_rating_min: nullable(z.number().check(z.positive(), z.maximum(480))),
  evidence,
  growth: nullable(growthClass),
  /** Peak heat release of the whole entry (all pieces). */
  peak_kW: nullable(z.number().check(z.positive(), z.maximum(1_000_000))),
  /** A measured curve `[[s, kW], …]` of the whole entry; replaces growth and peak. */
  curve: nullable(z.array(z.tuple([z.number(), z.number()])).check(z.minLength(2), z.maxLength(2000))),
  radiative_fraction: nullable(z.number().check(z.minimum(0), z.maximum(1))),
  ignition_class: nullable(ignitionClass),
  ignites_at_kW_m2: nullable(z.number().check(z.positive(), z.maximum(200))),
  note: text(10_000),
  /** Client-made ids of photos; the files arrive on their own. */
  photos: z.array(id).check(z.maxLength(50)),
  recorded_by: nullable(text(200)),
  recorded_at: nullable(z.iso.datetime()),
  confirmed_by: nullable(text(200)),
  confirmed_at: nullable(z.iso.datetime()),
});

export const surveyDocumentV1 = z.strictObject({
  schema_version: z.literal(SCHEMA_VERSION),
  survey_id: id,
  sequence: z.int().check(z.minimum(0)),
  storeys: z.array(storey),
  corners: z.array(corner),
  rooms: z.array(room),
  openings: z.array(opening),
  entries: z.array(entry),
});

export type LiningLayer = z.infer<typeof liningLayer>;
export type LiningSurface = z.infer<typeof liningSurface>;
export type Lining = z.infer<typeof lining>;
export type Protection = z.infer<typeof protection>;
export type PlanPicture = z.infer<typeof planPicture>;
export type Storey = z.infer<typeof storey>;
export type Corner = z.infer<typeof corner>;
export type Room = z.infer<typeof room>;
export type OpeningState = z.infer<typeof openingState>;
export type Opening = z.infer<typeof opening>;
export type Keeping = z.infer<typeof keeping>;
export type Enclosure = z.infer<typeof enclosure>;
export type Evidence = z.infer<typeof evidence>;
export type EntryPart = z.infer<typeof entryPart>;
export type Entry = z.infer<typeof entry>;
export type SurveyDocumentV1 = z.infer<typeof surveyDocumentV1>;
