import { defineMethod } from '../define-method.ts';
import { definition } from '../sources.ts';

const BTU_IT_J = 1055.05585262;
const FOOT_M = 0.3048;
const J_PER_MJ = 1e6;
const MJ_M2 = {
  'Btu/ft2': BTU_IT_J / FOOT_M ** 2 / J_PER_MJ,
  'kcal-thermochemical/m2': 4184 / J_PER_MJ,
  'kcal-IT/m2': 4186.8 / J_PER_MJ,
} as const;

/** Fire load density of older works, MJ/m². */
export const olderUnits = defineMethod({
  id: 'load.older-units',
  version: 1,
  title: 'Load density from older units',
  symbol: 'q',
  unit: 'MJ/m2',
  inputs: {
    value: { symbol: 'q', unit: '', quantity: 'Load density as written', valid: [0, 1e9] },
    unit: { symbol: '', quantity: 'Unit', choices: ['Btu/ft2', 'kcal-thermochemical/m2', 'kcal-IT/m2'] },
  },
  equation: '1 Btu = 1055.056 J, 1 ft = 0.3048 m, 1 kcal = 4184 J (thermochemical) or 4186.8 J (IT)',
  sources: [definition('units')],
  assumptions: ['275 000 kcal/m2 and 100 000 Btu/ft2 are printed side by side but are 1.3 % apart.'],
  why: 'Which calorie and which table was meant is part of the value.',
  outOfRange: 'refuse',
  run: ({ value, unit }) => value * MJ_M2[unit],
});
