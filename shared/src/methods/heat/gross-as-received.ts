import { defineMethod } from '../define-method.ts';
import { definition } from '../sources.ts';

/** Gross heat of a moist substance from its dry gross heat; moisture on the wet basis. */
export const grossAsReceived = defineMethod({
  id: 'heat.gross-as-received',
  version: 1,
  title: 'Gross heat as received',
  symbol: 'H_gross,ar',
  unit: 'MJ/kg',
  inputs: {
    H_gross: { symbol: 'H_gross', unit: 'MJ/kg', quantity: 'Gross heat, dry', valid: [0, 150] },
    w: { symbol: 'w', unit: 'kg/kg', quantity: 'Moisture, wet basis', valid: [0, 0.95] },
  },
  equation: 'H_gross,ar = H_gross (1 − w)',
  sources: [definition('mass balance')],
  assumptions: ['Water brings no heat and, as liquid, costs none.'],
  why: 'Laboratory sheets state gross heat dry or as received; this is the step between.',
  outOfRange: 'refuse',
  run: ({ H_gross, w }) => H_gross * (1 - w),
});
