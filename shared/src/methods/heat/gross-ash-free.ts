import { defineMethod } from '../define-method.ts';
import { definition } from '../sources.ts';

/** Gross heat without ash from gross heat dry; ash per dry mass. */
export const grossAshFree = defineMethod({
  id: 'heat.gross-ash-free',
  version: 1,
  title: 'Gross heat, dry and ash free',
  symbol: 'H_gross,daf',
  unit: 'MJ/kg',
  inputs: {
    H_gross: { symbol: 'H_gross', unit: 'MJ/kg', quantity: 'Gross heat, dry', valid: [0, 150] },
    a: { symbol: 'a', unit: 'kg/kg', quantity: 'Ash, of dry mass', valid: [0, 0.95] },
  },
  equation: 'H_gross,daf = H_gross / (1 − a)',
  sources: [definition('mass balance')],
  assumptions: ['Ash brings no heat.'],
  why: 'Heats of paper and straw are often given free of ash; coated paper is a third ash.',
  outOfRange: 'refuse',
  run: ({ H_gross, a }) => H_gross / (1 - a),
});
