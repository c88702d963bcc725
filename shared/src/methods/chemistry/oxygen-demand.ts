import { ATOMIC_WEIGHTS, OXYGEN_G_MOL } from '../../chemistry/molar-mass.ts';
import { defineMethod } from '../define-method.ts';
import { OutOfRangeError } from '../estimate.ts';
import { definition } from '../sources.ts';
import { FRACTION_INPUTS } from './fraction-inputs.ts';

/** Oxygen that one kilogram takes up when it burns completely, kg/kg, from an ultimate analysis. */
export const oxygenDemand = defineMethod({
  id: 'chemistry.oxygen-demand',
  version: 1,
  title: 'Oxygen demand from an ultimate analysis',
  symbol: 'r_O2',
  unit: 'kg/kg',
  inputs: FRACTION_INPUTS,
  equation: 'r_O2 = 31.998 [C/12.011 + H/(4 · 1.008) + S/32.06 − O/(2 · 15.999)]',
  sources: [definition('mole balance')],
  assumptions: ['Nitrogen leaves as N2.'],
  why: 'For wood and waste there is no formula, but a laboratory gives mass fractions.',
  outOfRange: 'refuse',
  run({ w_C, w_H, w_O, w_S }) {
    const { C, H, O, S } = ATOMIC_WEIGHTS;
    const demand = OXYGEN_G_MOL * (w_C / C + w_H / (4 * H) + w_S / S - w_O / (2 * O));
    if (demand < 0)
      throw new OutOfRangeError('By this analysis it carries more oxygen than it takes up: check the mass fractions.');
    return demand;
  },
});
