import { defineMethod } from '../define-method.ts';
import { definition, recalled } from '../sources.ts';

/** Soot from what has burnt, kg. */
export const sootMass = defineMethod({
  id: 'smoke.soot-mass',
  version: 1,
  title: 'Soot',
  symbol: 'm_soot',
  unit: 'kg',
  inputs: {
    y_s: { symbol: 'y_s', unit: 'kg/kg', quantity: 'Soot yield', valid: [0, 0.3] },
    m: { symbol: 'm', unit: 'kg', quantity: 'Mass burnt', valid: [0, 1e7] },
  },
  equation: 'm_soot = y_s m',
  sources: [
    definition('yield'),
    recalled('Tewarson, SFPE Handbook of Fire Protection Engineering', 'yields, well ventilated'),
  ],
  assumptions: ['Well ventilated; short of air the yield rises.'],
  why: 'Smoke hides the way out long before heat matters.',
  outOfRange: 'refuse',
  run: ({ y_s, m }) => y_s * m,
});
