import { defineMethod } from '../define-method.ts';
import { definition } from '../sources.ts';

/** Moisture per wet mass from moisture per dry mass, both kg/kg. */
export const moistureWetBasis = defineMethod({
  id: 'heat.moisture-wet-basis',
  version: 1,
  title: 'Moisture on the wet basis',
  symbol: 'w',
  unit: 'kg/kg',
  inputs: { u: { symbol: 'u', unit: 'kg/kg', quantity: 'Moisture, dry basis', valid: [0, 20] } },
  equation: 'w = u / (1 + u)',
  sources: [definition('mass balance')],
  assumptions: [],
  why: 'Wood trade gives moisture per dry mass, laboratories per wet mass: 12 % dry is 10.7 % wet.',
  outOfRange: 'refuse',
  run: ({ u }) => u / (1 + u),
});
