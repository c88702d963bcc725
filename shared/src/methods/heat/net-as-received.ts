import { defineMethod } from '../define-method.ts';
import { definition } from '../sources.ts';
import { HEAT_OF_VAPORISATION_MJ_KG } from './water.ts';

/** Net heat of a moist substance from its dry net heat, moisture on the wet basis (kg water per kg as it lies there). */
export const netAsReceived = defineMethod({
  id: 'heat.net-as-received',
  version: 1,
  title: 'Net heat as received',
  symbol: 'H_u',
  unit: 'MJ/kg',
  inputs: {
    H_dry: { symbol: 'H_u0', unit: 'MJ/kg', quantity: 'Net heat, dry', valid: [0, 150] },
    w: { symbol: 'w', unit: 'kg/kg', quantity: 'Moisture, wet basis', valid: [0, 0.95] },
  },
  equation: 'H_u = H_u0 (1 − w) − 2.442 w',
  sources: [definition('heat balance of the moisture; heat of vaporisation 2.442 MJ/kg at 25 °C')],
  assumptions: ['All moisture leaves as vapour.'],
  why: 'It is the exact balance; the printed form of EN 1991-1-2 (E.4) uses dry-basis moisture in a wet-basis form.',
  outOfRange: 'refuse',
  run: ({ H_dry, w }) => H_dry * (1 - w) - HEAT_OF_VAPORISATION_MJ_KG * w,
});
