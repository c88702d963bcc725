import { z } from 'zod/mini';
import { someText } from './draft-numbers.ts';

/** A pure substance by its formula and enthalpy of formation at 25 °C, in the phase that enthalpy is for. */
export const formulaDraft = {
  way: z.literal('formula'),
  formula: someText(200),
  formation_kJ_mol: z.number().check(z.minimum(-1_000_000), z.maximum(1_000_000)),
  phase: z.enum(['gas', 'liquid', 'solid']),
};
