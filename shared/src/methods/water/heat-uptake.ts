import { defineMethod } from '../define-method.ts';
import { definition } from '../sources.ts';

const WATER_KJ_KGK = 4.186;
const BOILING_KJ_KG = 2257;
const STEAM_KJ_KGK = 2;
const BOILING_C = 100;
const KJ_PER_MJ = 1000;

/** Heat that one kilogram of water takes up when it becomes steam, MJ/kg. */
export const heatUptake = defineMethod({
  id: 'water.heat-uptake',
  version: 1,
  title: 'Heat that water takes up',
  symbol: 'h_w',
  unit: 'MJ/kg',
  inputs: {
    T_0: { symbol: 'T_0', unit: '°C', quantity: 'Temperature of the water', valid: [0, 100] },
    T_s: { symbol: 'T_s', unit: '°C', quantity: 'Temperature of the steam', valid: [100, 600] },
  },
  equation: 'h_w = 4.186 (100 − T_0) + 2257 + 2.0 (T_s − 100) kJ/kg',
  sources: [definition('heat capacities and heat of vaporisation at 100 °C')],
  assumptions: ['All of it boils. In a real attack a third to a half does.'],
  why: 'It bounds what water could do; it is no supply that anyone would need.',
  outOfRange: 'refuse',
  run: ({ T_0, T_s }) =>
    (WATER_KJ_KGK * (BOILING_C - T_0) + BOILING_KJ_KG + STEAM_KJ_KGK * (T_s - BOILING_C)) / KJ_PER_MJ,
});
