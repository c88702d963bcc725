import { z } from 'zod/mini';
import { positive, someText } from './draft-numbers.ts';
import { curveDraft } from './curve-draft.ts';

/** Share of a mass or a heat, 0 to 1. */
const share = z.number().check(z.minimum(0), z.maximum(1));

/** What every own material may say about itself, whatever its heat comes from. */
export const commonDraft = {
  label: someText(200),
  synonyms: z.optional(z.array(someText(80)).check(z.maxLength(20))),
  /** Where the figures are from: report and its number, table and page, sheet and its date. */
  source: someText(500),
  note: z.optional(z.string().check(z.maxLength(10_000))),
  group: z.optional(
    z.enum([
      'wood and board',
      'paper',
      'textiles',
      'food',
      'carbon',
      'plastics',
      'foams',
      'rubber',
      'liquids',
      'gases',
      'chemicals',
      'products',
    ]),
  ),
  /** Mainly wood, paper, cotton and their like: combustion factor 0.8 of EN 1991-1-2 E.3 instead of 1. */
  cellulosic: z.optional(z.boolean()),
  density_kg_m3: z.optional(positive(25_000)),
  radiative_fraction: z.optional(z.number().check(z.minimum(0), z.maximum(0.8))),
  ignition_class: z.optional(z.enum(['easy', 'normal', 'hard', 'resistant'])),
  /** kg per kg burnt, well ventilated. */
  soot_yield: z.optional(share),
  co_yield: z.optional(share),
  hazards: z.optional(
    z.array(
      z.enum(['liquid', 'gas', 'aerosol', 'battery', 'dust', 'oxidiser', 'water-reactive', 'foam', 'smouldering']),
    ),
  ),
  curve: z.optional(curveDraft),
  /**
   * A proposal of the basis check that a person took over. It is applied only while the check still proposes the same factor
   * (within 0.1 %); otherwise the draft is refused, so that nothing is corrected twice.
   */
  accepted: z.optional(
    z.strictObject({
      finding: z.enum(['wrong-mole-basis', 'gross-for-net', 'dry-for-received']),
      factor: positive(100),
    }),
  ),
};
