import { z } from 'zod/mini';
import { percent } from './draft-numbers.ts';

/** Mass shares of the elements in percent; what is not named is 0, except oxygen, which is the rest. */
export const elementsDraft = z.strictObject({
  carbon_pct: percent,
  hydrogen_pct: percent,
  /** Absent: by difference, as laboratories report it. */
  oxygen_pct: z.optional(percent),
  nitrogen_pct: z.optional(percent),
  sulfur_pct: z.optional(percent),
  chlorine_pct: z.optional(percent),
  ash_pct: z.optional(percent),
});
export type ElementsDraft = z.infer<typeof elementsDraft>;
