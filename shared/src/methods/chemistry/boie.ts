import { defineMethod } from '../define-method.ts';
import { recalled } from '../sources.ts';
import { FRACTION_INPUTS } from './fraction-inputs.ts';

/** Gross heat from an ultimate analysis after Boie, MJ/kg. */
export const boie = defineMethod({
  id: 'chemistry.boie',
  version: 1,
  title: 'Gross heat from an ultimate analysis, Boie',
  symbol: 'H_gross',
  unit: 'MJ/kg',
  inputs: FRACTION_INPUTS,
  equation: 'H_gross = 35.16 C + 116.225 H − 11.09 O + 6.28 N + 10.465 S',
  sources: [recalled('Boie', 'relation for fuels, mass fractions')],
  assumptions: ['Typical error 1.5 to 3 %. Never below 0.'],
  why: 'A laboratory’s C, H, O, N, S gives a heat where no bomb was run.',
  outOfRange: 'refuse',
  run: ({ w_C, w_H, w_O, w_N, w_S }) =>
    Math.max(0, 35.16 * w_C + 116.225 * w_H - 11.09 * w_O + 6.28 * w_N + 10.465 * w_S),
});
