import { defineMethod } from '../define-method.ts';
import { en1991 } from '../sources.ts';

/** Variant as printed: net heat of a moist material with u in percent of the dry mass. Reads 0.3 MJ/kg low at 12 %. */
export const moistureEn = defineMethod({
  id: 'heat.moisture-2002',
  version: 1,
  title: 'Net heat of a moist material, EN form',
  symbol: 'H_u',
  unit: 'MJ/kg',
  inputs: {
    H_u0: { symbol: 'H_u0', unit: 'MJ/kg', quantity: 'Net heat, dry', valid: [0, 150] },
    u: { symbol: 'u', unit: '%', quantity: 'Moisture, percent of dry mass', valid: [0, 97] },
  },
  equation: 'H_u = H_u0 (1 − 0.01 u) − 0.025 u',
  sources: [en1991('E.2.4, equation (E.4)')],
  assumptions: ['Kept as printed: a dry-basis u in a wet-basis form.'],
  why: 'For comparison with calculations that follow the printed equation; the tally uses the exact balance.',
  outOfRange: 'refuse',
  run: ({ H_u0, u }) => H_u0 * (1 - 0.01 * u) - 0.025 * u,
});
