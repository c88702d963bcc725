import { defineMethod } from '../define-method.ts';
import { definition } from '../sources.ts';

/** Gross heat of the dry substance from the gross heat of the moist one; moisture on the wet basis. */
export const grossDry = defineMethod({
  id: 'heat.gross-dry',
  version: 1,
  title: 'Gross heat, dry',
  symbol: 'H_gross',
  unit: 'MJ/kg',
  inputs: {
    H_ar: { symbol: 'H_gross,ar', unit: 'MJ/kg', quantity: 'Gross heat of the moist material', valid: [-1, 150] },
    w: { symbol: 'w', unit: 'kg/kg', quantity: 'Moisture, wet basis', valid: [0, 0.95] },
  },
  equation: 'H_gross = H_gross,ar/(1 − w)',
  sources: [definition('mass balance')],
  assumptions: ['Water brings no heat and, as liquid, costs none.'],
  why: 'A sample is burnt with the water it holds; materials are compared dry.',
  outOfRange: 'refuse',
  run: ({ H_ar, w }) => H_ar / (1 - w),
});
