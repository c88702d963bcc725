import { z } from 'zod/mini';
import { percent, someText } from './draft-numbers.ts';

/** A mixture of other materials by mass. */
export const compositionDraft = {
  way: z.literal('composition'),
  parts: z
    .array(
      z.strictObject({
        /** Key of a built-in material or id of an own one. */
        material: someText(80),
        /** Version of an own material; null: built in. */
        version: z.nullable(z.int().check(z.minimum(1))),
        mass_pct: percent,
      }),
    )
    .check(z.minLength(1), z.maxLength(20)),
  /** Share that does not burn (glass, filler, metal), so that the shares add up to 100. */
  inert_pct: z.optional(percent),
};
