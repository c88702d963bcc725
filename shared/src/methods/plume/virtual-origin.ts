import { defineMethod } from '../define-method.ts';
import { recalled } from '../sources.ts';

/** Height of the plume's virtual origin above the base of the fire, m; below it where negative. */
export const virtualOrigin = defineMethod({
  id: 'plume.virtual-origin',
  version: 1,
  title: 'Virtual origin of the plume',
  symbol: 'z_0',
  unit: 'm',
  inputs: {
    Q: { symbol: 'Q', unit: 'kW', quantity: 'Heat release rate, total', valid: [0, 1e7] },
    D: { symbol: 'D', unit: 'm', quantity: 'Diameter of the fire', valid: [1e-3, 200] },
  },
  equation: 'z_0 = 0.083 Q^0.4 − 1.02 D',
  sources: [recalled('Heskestad, Engineering relations for fire plumes', 'virtual origin', '1984')],
  assumptions: ['Total heat release rate.'],
  why: 'Plume relations count heights from it.',
  outOfRange: 'refuse',
  run: ({ Q, D }) => 0.083 * Q ** 0.4 - 1.02 * D,
});
