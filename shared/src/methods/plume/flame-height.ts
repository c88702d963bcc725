import { defineMethod } from '../define-method.ts';
import { recalled } from '../sources.ts';
import { flameLength } from './flame-length.ts';

/** Mean height of the flame above its base, m; 0 for a mass fire that has no common flame. */
export const flameHeight = defineMethod({
  id: 'plume.flame-height',
  version: 1,
  title: 'Flame height',
  symbol: 'L',
  unit: 'm',
  inputs: {
    Q: { symbol: 'Q', unit: 'kW', quantity: 'Heat release rate, total', valid: [0, 1e7] },
    D: { symbol: 'D', unit: 'm', quantity: 'Diameter of the fire', valid: [1e-3, 200] },
    ratio: { symbol: 'Q^0.4/D', unit: '', quantity: 'Rate against diameter', valid: [7, 700] },
  },
  equation: 'L = 0.235 Q^0.4 − 1.02 D, at least 0',
  sources: [recalled('Heskestad, Luminous heights of turbulent diffusion flames', 'equation for L', '1983')],
  assumptions: ['Total heat release rate, open air, no wind.'],
  why: 'Radiation and plume start from it.',
  outOfRange: 'warn',
  run: ({ Q, D }) => flameLength(Q, D),
});
