import { defineMethod } from '../define-method.ts';
import { definition, recalled } from '../sources.ts';
import { HEAT_OF_VAPORISATION_MJ_KG } from '../heat/water.ts';

/** Net heat from gross heat and the water that was formed, MJ/kg. */
export const netFromCondensate = defineMethod({
  id: 'calorimetry.net-from-condensate',
  version: 1,
  title: 'Net heat from gross heat and condensate',
  symbol: 'PCI',
  unit: 'MJ/kg',
  inputs: {
    PCS: { symbol: 'PCS', unit: 'MJ/kg', quantity: 'Gross heat', valid: [0, 150] },
    w: { symbol: 'w', unit: 'kg/kg', quantity: 'Water formed per sample', valid: [0, 9] },
  },
  equation: 'PCI = PCS − 2.442 w',
  sources: [definition('heat of vaporisation of water 2.442 MJ/kg at 25 °C'), recalled('EN ISO 1716', 'net heat')],
  assumptions: ['The condensate holds the water of the sample too; the sample was dry.'],
  why: 'Weighing the condensate stands in for a hydrogen analysis.',
  outOfRange: 'refuse',
  run: ({ PCS, w }) => PCS - HEAT_OF_VAPORISATION_MJ_KG * w,
});
