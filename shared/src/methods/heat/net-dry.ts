import { defineMethod } from '../define-method.ts';
import { definition } from '../sources.ts';
import { HEAT_OF_VAPORISATION_MJ_KG } from './water.ts';

/** Net heat of the dry substance from the net heat of the moist one; moisture on the wet basis. */
export const netDry = defineMethod({
  id: 'heat.net-dry',
  version: 1,
  title: 'Net heat, dry',
  symbol: 'H_u0',
  unit: 'MJ/kg',
  inputs: {
    H_ar: { symbol: 'H_u', unit: 'MJ/kg', quantity: 'Net heat of the moist material', valid: [0, 150] },
    w: { symbol: 'w', unit: 'kg/kg', quantity: 'Moisture, wet basis', valid: [0, 0.95] },
  },
  equation: 'H_u0 = (H_u + 2.442 w)/(1 − w)',
  sources: [definition('heat balance of the moisture; heat of vaporisation 2.442 MJ/kg at 25 °C')],
  assumptions: ['All moisture left as vapour.'],
  why: 'Heats are compared and checked dry.',
  outOfRange: 'refuse',
  run: ({ H_ar, w }) => (H_ar + HEAT_OF_VAPORISATION_MJ_KG * w) / (1 - w),
});
