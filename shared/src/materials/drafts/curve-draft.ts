import { z } from 'zod/mini';
import { atLeastZero, positive } from './draft-numbers.ts';

/** Points a resampled curve keeps at most. */
export const MOST_POINTS = 300;

/**
 * Heat release rate measured on a test piece, as `readCalorimeterCsv` and `resampleCurve` leave it: `[s, kW]` of one piece, or
 * `[s, kW/m²]` of exposed surface. Placed, a piece's curve is multiplied by the count and a surface's by the area; time stays.
 */
export const curveDraft = z.strictObject({
  per: z.enum(['piece', 'm2']),
  points: z
    .array(z.tuple([atLeastZero(1_000_000), atLeastZero(1_000_000)]))
    .check(z.minLength(2), z.maxLength(MOST_POINTS)),
  /** Exposed area of the test piece. */
  specimen_m2: z.optional(positive(10_000)),
  /** Mass of the test piece that burnt. */
  burnt_kg: z.optional(positive(1_000_000)),
  /** Name of the file the curve was read from. */
  file_name: z.optional(z.string().check(z.maxLength(255))),
});
export type CurveDraft = z.infer<typeof curveDraft>;
