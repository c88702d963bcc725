import { z } from 'zod/mini';
import { ignitionField, sourceField, wordsField } from './catalogue-fields.ts';
import { defineContract } from './contract.ts';

const growth = z.enum(['slow', 'medium', 'fast', 'ultra-fast']);

export const kindSchema = z.strictObject({
  key: z.string(),
  label: z.string(),
  synonyms: wordsField,
  group: z.string(),
  parts: z.array(z.strictObject({ material: z.string(), mass_kg: z.number() })),
  mass_low_kg: z.number(),
  mass_high_kg: z.number(),
  width_m: z.number(),
  depth_m: z.number(),
  height_m: z.number(),
  growth: z.nullable(growth),
  peak_kW: z.nullable(z.number()),
  radiative_fraction: z.nullable(z.number()),
  ignition_class: ignitionField,
  enclosure: z.enum(['open', 'cabinet', 'sealed']),
  keeping: z.enum(['fixed', 'stored', 'passing']),
  measure: z.strictObject({ by: z.string(), quantity: z.number() }),
  hazards: wordsField,
  source: sourceField,
});

export const liningRowSchema = z.strictObject({
  key: z.string(),
  label: z.string(),
  synonyms: wordsField,
  layers: z.array(
    z.strictObject({
      thickness_m: z.number(),
      conductivity_W_mK: z.number(),
      density_kg_m3: z.number(),
      specific_heat_J_kgK: z.number(),
      label: z.optional(z.string()),
    }),
  ),
  source: sourceField,
});

export const useSchema = z.strictObject({
  key: z.string(),
  label: z.string(),
  synonyms: wordsField,
  growth,
  rhr_kW_m2: z.nullable(z.number()),
  distribution: z.nullable(
    z.strictObject({
      kind: z.enum(['gumbel', 'lognormal']),
      mean_MJ_m2: z.number(),
      cov: z.number(),
      source: sourceField,
    }),
  ),
  danger_of_activation: z.nullable(z.number()),
  source: sourceField,
});

export const listKinds = defineContract({
  id: 'kinds.list',
  method: 'GET',
  path: '/api/kinds',
  summary: 'Kinds: templates for entries',
  policy: { kind: 'signed-in' },
  response: z.strictObject({ items: z.array(kindSchema) }),
  status: 200,
});

export const listLinings = defineContract({
  id: 'linings.list',
  method: 'GET',
  path: '/api/linings',
  summary: 'What walls, ceilings and floors are made of',
  policy: { kind: 'signed-in' },
  response: z.strictObject({ items: z.array(liningRowSchema) }),
  status: 200,
});

export const listUses = defineContract({
  id: 'uses.list',
  method: 'GET',
  path: '/api/uses',
  summary: 'What rooms are used for, with growth and load distributions',
  policy: { kind: 'signed-in' },
  response: z.strictObject({ items: z.array(useSchema) }),
  status: 200,
});
