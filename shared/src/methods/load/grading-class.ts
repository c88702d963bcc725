import { defineMethod } from '../define-method.ts';

/** MJ/m², from 100 000, 200 000 and 400 000 Btu/ft² as usually rounded. */
const LIMITS = [
  [1135, 'low', 60],
  [2270, 'moderate', 120],
  [4540, 'high', 240],
] as const;

/** Class of the fire grading of 1946 for a mean load, and the resistance that was matched with it. */
export const gradingClass = defineMethod({
  id: 'load.grading-class-1946',
  version: 1,
  title: 'Class of load, fire grading of 1946',
  symbol: '',
  unit: 'min',
  inputs: {
    q: { symbol: 'q', unit: 'MJ/m2', quantity: 'Load per net floor area of the compartment', valid: [0, 1e6] },
  },
  equation: 'low ≤ 1135 < moderate ≤ 2270 < high ≤ 4540 MJ/m2; 1, 2, 4 h',
  sources: [
    {
      title: 'Joint Committee on Fire Grading of Buildings, Post-War Building Studies 20',
      edition: '1946',
      locator: 'classes, as several later works quote them',
    },
  ],
  assumptions: [
    'Limits in Btu/ft²; the kcal/m² limits are 1.3 % higher.',
    'Small isolated areas may hold twice the limit. Above 4540 the table is silent.',
  ],
  why: 'Older reports and leases still speak of low, moderate and high.',
  outOfRange: 'refuse',
  outputs: { minutes: { symbol: '', unit: 'min', quantity: 'Resistance matched with the class' } },
  run({ q }): { readonly grade: 'low' | 'moderate' | 'high' | 'above-table'; readonly minutes: number | null } {
    const found = LIMITS.find(([up]) => q <= up);
    return found ? { grade: found[1], minutes: found[2] } : { grade: 'above-table', minutes: null };
  },
});
