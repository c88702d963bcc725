import { defineMethod } from '../define-method.ts';
import { recalled } from '../sources.ts';
import { FRACTION_INPUTS } from './fraction-inputs.ts';

/** Gross heat from an ultimate analysis after Channiwala and Parikh, MJ/kg. */
export const channiwalaParikh = defineMethod({
  id: 'chemistry.channiwala-parikh',
  version: 1,
  title: 'Gross heat from an ultimate analysis, Channiwala and Parikh',
  symbol: 'H_gross',
  unit: 'MJ/kg',
  inputs: {
    ...FRACTION_INPUTS,
    w_C: { ...FRACTION_INPUTS.w_C, valid: [0, 0.9225] },
    w_H: { ...FRACTION_INPUTS.w_H, valid: [0.0043, 0.2515] },
    w_O: { ...FRACTION_INPUTS.w_O, valid: [0, 0.5] },
    w_ash: { symbol: 'Ash', unit: 'kg/kg', quantity: 'Ash', valid: [0, 1] },
  },
  equation: 'H_gross = 34.91 C + 117.83 H + 10.05 S − 10.34 O − 1.51 N − 2.11 Ash',
  sources: [recalled('Channiwala & Parikh, Fuel 81', 'unified correlation, mass fractions', '2002')],
  assumptions: ['Typical error 1.5 to 3 %. Never below 0.'],
  why: 'Fitted over solids, liquids and gases; it knows ash.',
  outOfRange: 'warn',
  run: ({ w_C, w_H, w_O, w_N, w_S, w_ash }) =>
    Math.max(0, 34.91 * w_C + 117.83 * w_H + 10.05 * w_S - 10.34 * w_O - 1.51 * w_N - 2.11 * w_ash),
});
