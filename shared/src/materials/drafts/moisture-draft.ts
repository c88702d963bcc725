import { z } from 'zod/mini';

/**
 * Water in the material as it lies there. `per` says of what it is a percentage: laboratories weigh it against the `wet`
 * mass, the timber trade against the `dry` mass, where it can be above 100 %.
 */
export const moistureDraft = z.strictObject({
  pct: z.number().check(z.minimum(0), z.maximum(1000)),
  per: z.enum(['wet', 'dry']),
});
export type MoistureDraft = z.infer<typeof moistureDraft>;
