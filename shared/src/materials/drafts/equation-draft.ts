import { z } from 'zod/mini';
import { positive, someText } from './draft-numbers.ts';

/**
 * A heat from a thermochemical equation written for any number of moles, or a heat claimed for one mole.
 * `water`: the state of the water the heat is for; vapour gives net, liquid gross.
 */
export const equationDraft = {
  way: z.literal('equation'),
  formula: someText(200),
  water: z.enum(['vapour', 'liquid']),
  heat: z.discriminatedUnion('as', [
    z.strictObject({
      as: z.literal('equation'),
      /** Moles of fuel in the equation: 2 in `2 C8H18 + 25 O2 → …`. */
      moles: positive(10_000),
      /** Enthalpy of the equation as it is written; negative, because heat leaves. */
      enthalpy_kJ: z.number().check(z.minimum(-1e10), z.maximum(1e10)),
      /** The equation as text; read and balanced where it is given. */
      text: z.optional(z.string().check(z.maxLength(500))),
    }),
    z.strictObject({ as: z.literal('mole'), heat_kJ_mol: positive(1e9) }),
  ]),
};
