import { defineMethod } from '../define-method.ts';
import { dbSi, en1991, recalled } from '../sources.ts';

const TABLE = { EN: [0.07, 0.055, 0.04], UK: [0.09, 0.07, 0.05] } as const;

/** Conversion factor k_b from the thermal inertia, min·m²/MJ. The inertia is used as it is, not clipped. */
export const conversionFactor = defineMethod({
  id: 'burnout.conversion-factor-2002',
  version: 1,
  title: 'Conversion factor of the linings',
  symbol: 'k_b',
  unit: 'min m2/MJ',
  inputs: {
    b: { symbol: 'b', unit: 'J/m2s1/2K', quantity: 'Thermal inertia', valid: [0, Infinity] },
    table: { symbol: '', quantity: 'Table', choices: ['EN', 'UK'] },
  },
  equation: 'b > 2500: 0.04; 720 to 2500: 0.055; b < 720: 0.07 (EN); 0.05, 0.07, 0.09 (UK)',
  sources: [
    en1991('Annex F, Table F.2'),
    dbSi('0.07 without closer knowledge'),
    recalled('UK national annex', 'k_b 0.09/0.07/0.05'),
  ],
  assumptions: [],
  why: 'The table goes with equation (F.1); national annexes raise it.',
  outOfRange: 'refuse',
  run({ b, table }) {
    const [light, middle, heavy] = TABLE[table];
    if (b < 720) return light;
    return b <= 2500 ? middle : heavy;
  },
});
