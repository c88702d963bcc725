import { defineMethod } from '../define-method.ts';
import { recalled } from '../sources.ts';
import { CEILING_INPUTS } from './ceiling-inputs.ts';
import { jetUnderCeiling, PLACE_FACTOR } from './jet-under-ceiling.ts';

/** Rise and velocity of the gas under a flat ceiling, K and m/s. */
export const ceilingJet = defineMethod({
  id: 'plume.ceiling-jet',
  version: 1,
  title: 'Ceiling jet, Alpert',
  symbol: 'ΔT',
  unit: 'K',
  inputs: {
    Q: { symbol: 'Q', unit: 'kW', quantity: 'Heat release rate, total', valid: [0, 1e6] },
    ...CEILING_INPUTS,
  },
  equation:
    'r/H ≤ 0.18: ΔT = 16.9 Q^(2/3)/H^(5/3), else 5.38 (Q/r)^(2/3)/H;  r/H ≤ 0.15: u = 0.96 (Q/H)^(1/3), else 0.195 Q^(1/3) H^(1/2)/r^(5/6)',
  sources: [
    recalled('Alpert, Calculation of response time of ceiling-mounted fire detectors', 'Fire Technology 8', '1972'),
  ],
  assumptions: [
    'TOTAL rate; flat, smooth, unobstructed ceiling; no hot layer yet.',
    'Against a wall twice, in a corner four times the rate.',
    'The small steps at 0.15 and 0.18 belong to the relation.',
  ],
  why: 'It is what the response of sprinklers and heat detectors was fitted with.',
  outOfRange: 'warn',
  outputs: {
    rise: { symbol: 'ΔT', unit: 'K', quantity: 'Rise of the gas' },
    velocity: { symbol: 'u', unit: 'm/s', quantity: 'Velocity of the gas' },
  },
  run: ({ Q, H, r, place }) => jetUnderCeiling(PLACE_FACTOR[place] * Q, H, r),
});
