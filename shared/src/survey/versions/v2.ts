import { z } from 'zod/mini';
import * as v1 from './v1.ts';

/**
 * The survey document, version 2: what a person assumed for a room, photos of rooms, what is still to do there, how the
 * mass of an entry was arrived at, and what an own material's key does not tell. FROZEN once released; `step-up.ts` brings older rows here.
 */
export const SCHEMA_VERSION = 2;

const nullable = z.nullable;
const text = (max: number) => z.string().check(z.maxLength(max));
const positive = (max: number) => z.number().check(z.positive(), z.maximum(max));

/** What the tally takes for this room in place of its defaults; null: the default, named in the working. */
export const assumptions = z.strictObject({
  growth: nullable(v1.growthClass),
  growth_convention: nullable(z.enum(['EN', 'NFPA'])),
  plateau_kW_m2: nullable(positive(100_000)),
  fire_area_m2: nullable(positive(1_000_000)),
  /** One factor for all goods in place of each material's own. */
  combustion_factor: nullable(z.number().check(z.positive(), z.maximum(1))),
  load_basis: nullable(z.enum(['as_surveyed', 'mean', 'peak_stock'])),
  protected_loads: nullable(z.enum(['0.85', 'EN'])),
  /** Why the rule for protected loads was chosen. */
  protected_loads_note: text(500),
  exposure_s: nullable(z.number().check(z.minimum(1), z.maximum(86_400))),
  time_limit_min: nullable(positive(480)),
  kb: nullable(z.union([z.enum(['EN', 'UK']), positive(1)])),
  kc: nullable(z.union([z.enum(['unprotected_steel', 'timber', 'composite']), positive(20)])),
  ambient_C: nullable(z.number().check(z.minimum(-50), z.maximum(60))),
  /** Where the fire begins; null: the worst is sought. */
  first_entry: nullable(z.uuid()),
});

/** How a mass was arrived at, as it was entered. */
export const measure = z.strictObject({
  by: z.enum(['shelf metres', 'running metres', 'stack height', 'litres', 'volume', 'area', 'kilowatt-hours']),
  /** In the unit of `by`: m, m, m, L, m³, m², kWh. */
  quantity: positive(1_000_000),
  /** For a volume whose density was given rather than taken from the kind. */
  density_kg_m3: nullable(positive(25_000)),
});

export const storey = v1.storey;
export const corner = v1.corner;
export const opening = v1.opening;
export const room = z.extend(v1.room, {
  assumptions: nullable(assumptions),
  /** Client-made ids of photos; the files arrive on their own. */
  photos: z.array(z.uuid()).check(z.maxLength(50)),
  /** What the walk through the building has still to settle here; empty: nothing. */
  to_do: text(1000),
});
/** Of a material that is not built in: what its key alone does not tell. Absent: as the catalogue, else not known. */
export const entryPart = z.extend(v1.entryPart, {
  cellulosic: z.optional(z.boolean()),
  /** kg per kg burnt with enough air. */
  soot_yield: z.optional(z.number().check(z.minimum(0), z.maximum(1))),
  co_yield: z.optional(z.number().check(z.minimum(0), z.maximum(1))),
});
export const entry = z.extend(v1.entry, {
  parts: z.array(entryPart).check(z.minLength(1), z.maxLength(20)),
  measure: nullable(measure),
});

export const surveyDocument = z.strictObject({
  schema_version: z.literal(SCHEMA_VERSION),
  survey_id: z.uuid(),
  sequence: z.int().check(z.minimum(0)),
  storeys: z.array(storey),
  corners: z.array(corner),
  rooms: z.array(room),
  openings: z.array(opening),
  entries: z.array(entry),
});

export type Assumptions = z.infer<typeof assumptions>;
export type Measure = z.infer<typeof measure>;
export type Room = z.infer<typeof room>;
export type EntryPart = z.infer<typeof entryPart>;
export type Entry = z.infer<typeof entry>;
export type SurveyDocumentV2 = z.infer<typeof surveyDocument>;
