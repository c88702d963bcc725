import { z } from 'zod/mini';
import { ignitionField, rangeField, sourceField, wordsField } from './catalogue-fields.ts';
import { defineContract } from './contract.ts';

/** Heat release rate measured on a test piece: `[s, kW]` of one piece, or `[s, kW/m²]` of exposed surface. */
export const materialCurveSchema = z.strictObject({
  per: z.enum(['piece', 'm2']),
  points: z.array(z.tuple([z.number(), z.number()])),
});
export type MaterialCurve = z.infer<typeof materialCurveSchema>;

/** What only a material of the organisation's own has; its `key` is the id of the material. */
export const ownPartSchema = z.strictObject({
  /** The version in force: the approved one that was made last. */
  version: z.int(),
  way: z.string(),
  /** What the heat rests on, in words; copied into a part when it is placed. */
  heat_source: z.string(),
  /** Water the heats include, percent of wet mass; null where nothing is said. */
  moisture_pct_wet: z.nullable(z.number()),
  curve: z.nullable(materialCurveSchema),
  approved_by: z.string(),
  approved_at: z.iso.datetime(),
});

export const materialSchema = z.strictObject({
  /** Key of a built-in material, or the id of one of the organisation's own. */
  key: z.string(),
  label: z.string(),
  synonyms: wordsField,
  group: z.string(),
  net_heat_MJ_kg: z.number(),
  low_MJ_kg: z.number(),
  high_MJ_kg: z.number(),
  gross_heat_MJ_kg: z.nullable(z.number()),
  formula: z.nullable(z.string()),
  cellulosic: z.boolean(),
  combustion_factor: z.number(),
  ignition_class: ignitionField,
  radiative_fraction: z.number(),
  soot_yield: z.nullable(z.number()),
  co_yield: z.nullable(z.number()),
  bulk_density_kg_m3: z.nullable(rangeField),
  moisture_pct_dry: z.nullable(z.number()),
  hazards: wordsField,
  source: sourceField,
  /** Null: built in. */
  own: z.nullable(ownPartSchema),
});

/** Everything that may be placed. Own materials come with the version in force: whoever holds an older one sees it is newer. */
export const listMaterials = defineContract({
  id: 'materials.list',
  method: 'GET',
  path: '/api/materials',
  summary: 'Materials that may be placed: built in, and approved ones of one’s own organisation',
  policy: { kind: 'signed-in' },
  query: z.strictObject({ of: z.optional(z.enum(['built-in', 'own'])) }),
  response: z.strictObject({ items: z.array(materialSchema) }),
  status: 200,
});
