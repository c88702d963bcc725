import { defineMethod } from '../define-method.ts';
import { recalled } from '../sources.ts';

/** Gas temperature under the ceiling far from a travelling fire, °C. */
export const farField = defineMethod({
  id: 'plume.far-field',
  version: 1,
  title: 'Travelling fire, far field',
  symbol: 'T_ff',
  unit: '°C',
  inputs: {
    Q: { symbol: 'Q', unit: 'kW', quantity: 'Heat release rate, total', valid: [0, 1e6] },
    H: { symbol: 'H', unit: 'm', quantity: 'Height of the ceiling', valid: [1, 30] },
    r: { symbol: 'r', unit: 'm', quantity: 'Distance from the fire', valid: [0.1, 500] },
    T_0: { symbol: 'T_0', unit: '°C', quantity: 'Temperature before', valid: [-40, 60] },
    ratio: { symbol: 'r/H', unit: '', quantity: 'Distance against height', valid: [0.18, 500] },
  },
  equation: 'T_ff = T_0 + 5.38 (Q/r)^(2/3)/H, not above 1200 °C',
  sources: [
    recalled('Stern-Gottfried & Rein, Travelling fires for structural design', 'far field after Alpert', '2012'),
    recalled('Alpert, Calculation of response time of ceiling-mounted fire detectors', 'ceiling jet', '1972'),
  ],
  assumptions: ['Nearer than 0.18 H the near field applies.'],
  why: 'Structure far from the flames is heated for longer than it burns anywhere.',
  outOfRange: 'warn',
  run: ({ Q, H, r, T_0 }) => Math.min(1200, T_0 + (5.38 * (Q / r) ** (2 / 3)) / H),
});
