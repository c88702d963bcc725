import { z } from 'zod/mini';
import { percent, positive, someText } from './draft-numbers.ts';
import { elementsDraft } from './elements-draft.ts';
import { moistureDraft } from './moisture-draft.ts';

/** A heat from a supplier's sheet, on the basis the sheet states. */
export const supplierDraft = {
  way: z.literal('supplier'),
  /** MJ per kg, litre or m³ of the material. */
  heat_MJ: positive(1_000_000),
  /** Per litre and per m³ the density of the material is needed too. */
  per: z.enum(['kg', 'L', 'm3']),
  heat: z.enum(['net', 'gross']),
  state: z.enum(['dry', 'as-received']),
  /** Of the dry material; takes gross to net. A formula or elements say it as well. */
  hydrogen_pct: z.optional(percent),
  formula: z.optional(someText(200)),
  /** Of the dry material. */
  elements: z.optional(elementsDraft),
  moisture: z.optional(moistureDraft),
  range: z.discriminatedUnion('by', [
    /** On the same basis as the value. */
    z.strictObject({ by: z.literal('sheet'), low_MJ: positive(1_000_000), high_MJ: positive(1_000_000) }),
    z.strictObject({ by: z.literal('class'), evidence: z.enum(['exact', 'laboratory', 'class', 'mixed']) }),
  ]),
  /** Key of a built-in material of the same sort, to hold the value against. */
  counterpart: z.optional(someText(80)),
};
