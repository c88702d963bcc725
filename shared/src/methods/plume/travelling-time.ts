import { defineMethod } from '../define-method.ts';
import { recalled } from '../sources.ts';

const S_PER_MIN = 60;
const KJ_PER_MJ = 1000;

/** How long one place burns, and how long a fire takes to travel along a hall, min. */
export const travellingTime = defineMethod({
  id: 'plume.travelling-time',
  version: 1,
  title: 'Travelling fire, times',
  symbol: 't_total',
  unit: 'min',
  inputs: {
    q_f: { symbol: 'q_f', unit: 'MJ/m2', quantity: 'Fire load per floor area', valid: [1, 1e5] },
    rate: { symbol: 'Q″', unit: 'kW/m2', quantity: 'Heat release rate per area', valid: [10, 20_000] },
    L: { symbol: 'L', unit: 'm', quantity: 'Length of the path through the hall', valid: [1, 1000] },
    L_f: { symbol: 'L_f', unit: 'm', quantity: 'Length of the fire', valid: [0.1, 1000] },
  },
  equation: 't_b = q_f/Q″;  t_total = t_b (1 + L/L_f)',
  sources: [
    recalled(
      'Stern-Gottfried & Rein, Travelling fires for structural design',
      'fire of 2.5 to 100 % of the floor',
      '2012',
    ),
    recalled(
      'Rackauskaite et al., Improved formulation of travelling fires',
      'total duration, near field 800 to 1200 °C',
      '2015',
    ),
  ],
  assumptions: ['The size of the fire is chosen; several are looked at. Near field 800 to 1200 °C.'],
  why: 'A floor of more than 500 m² does not burn all at once.',
  outOfRange: 'refuse',
  outputs: {
    burning: { symbol: 't_b', unit: 'min', quantity: 'Time one place burns' },
    total: { symbol: 't_total', unit: 'min', quantity: 'Time of the whole fire' },
  },
  run({ q_f, rate, L, L_f }) {
    const burning = (q_f * KJ_PER_MJ) / rate / S_PER_MIN;
    return { burning, total: burning * (1 + L / L_f) };
  },
});
