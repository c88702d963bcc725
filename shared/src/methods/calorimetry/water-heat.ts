import { defineMethod } from '../define-method.ts';
import { definition } from '../sources.ts';

/** Heat taken up by an open water calorimeter, kJ. */
export const waterHeat = defineMethod({
  id: 'calorimetry.water-heat',
  version: 1,
  title: 'Heat taken up by a water calorimeter',
  symbol: 'Q',
  unit: 'kJ',
  inputs: {
    m: { symbol: 'm_w', unit: 'kg', quantity: 'Mass of water', valid: [1e-3, 1e4] },
    c: { symbol: 'c', unit: 'kJ/kgK', quantity: 'Heat capacity of water', valid: [4.17, 4.22] },
    C_cal: { symbol: 'C_cal', unit: 'kJ/K', quantity: 'Heat capacity of the vessel', valid: [0, 1e4] },
    dT: { symbol: 'ΔT', unit: 'K', quantity: 'Temperature rise', valid: [1e-3, 99] },
  },
  equation: 'Q = (m_w c + C_cal) ΔT',
  sources: [definition('heat balance; c = 4.186 kJ/kgK at 15 to 25 °C')],
  assumptions: ['No water boils off.'],
  why: 'The simplest measurement of a heat.',
  outOfRange: 'refuse',
  run: ({ m, c, C_cal, dT }) => (m * c + C_cal) * dT,
});
