import { defineMethod } from '../define-method.ts';
import { OutOfRangeError } from '../estimate.ts';
import { definition } from '../sources.ts';
import { HEAT_OF_VAPORISATION_MJ_KG, WATER_PER_HYDROGEN } from './water.ts';

/** Samples that do not burn scatter about 0; below this the two inputs contradict each other. */
const LOWEST_MJ_KG = -1;

/** Net heat of a dry substance from its gross heat and its hydrogen content, MJ/kg. Substances with halogens: see text. */
export const netFromGross = defineMethod({
  id: 'heat.net-from-gross',
  version: 1,
  title: 'Net heat from gross heat',
  symbol: 'H_net',
  unit: 'MJ/kg',
  inputs: {
    H_gross: { symbol: 'H_gross', unit: 'MJ/kg', quantity: 'Gross heat, dry', valid: [0, 150] },
    w_H: { symbol: 'w_H', unit: 'kg/kg', quantity: 'Hydrogen that leaves as water', valid: [0, 1] },
  },
  equation: 'H_net = H_gross − 2.442 · 8.937 · w_H',
  sources: [definition('heat of vaporisation of water 2.442 MJ/kg at 25 °C; 8.937 kg of water per kg of hydrogen')],
  assumptions: ['With chlorine or bromine, hydrogen bound as acid is taken off w_H first.'],
  why: 'Bomb calorimeters give gross heat; in a fire the water leaves as vapour.',
  outOfRange: 'refuse',
  run({ H_gross, w_H }) {
    const net = H_gross - HEAT_OF_VAPORISATION_MJ_KG * WATER_PER_HYDROGEN * w_H;
    if (net < LOWEST_MJ_KG)
      throw new OutOfRangeError('The water of so much hydrogen takes more than the gross heat: check both.');
    return net;
  },
});
