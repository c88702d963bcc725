import { defineMethod } from '../define-method.ts';
import { en1991, recalled } from '../sources.ts';

/** Seconds in which a fire of the class reaches the reference rate. */
export const GROWTH_TIME_S = { slow: 600, medium: 300, fast: 150, 'ultra-fast': 75 } as const;

/** Reference heat release rate of the two conventions, kW; the same names mean 5.5 % apart. */
const REFERENCE_KW = { EN: 1000, NFPA: 1055 } as const;

/** Coefficient of t-squared growth, kW/s². */
export const growthCoefficient = defineMethod({
  id: 'growth.coefficient',
  version: 1,
  title: 'Growth coefficient',
  symbol: 'α',
  unit: 'kW/s2',
  inputs: {
    growth: { symbol: '', quantity: 'Growth class', choices: ['slow', 'medium', 'fast', 'ultra-fast'] },
    convention: { symbol: '', quantity: 'Convention', choices: ['EN', 'NFPA'] },
  },
  equation: 'α = Q_ref / t_α²;  t_α 600, 300, 150, 75 s;  Q_ref 1000 kW (EN) or 1055 kW (NFPA)',
  sources: [en1991('E.4, Table E.5: Q = 10⁶ (t/t_α)² W'), recalled('NFPA 92', 'growth classes, 1055 kW at t_g')],
  assumptions: ['The fire grows with the square of time from established burning; smouldering before it is left out.'],
  why: 'Both conventions are in use under the same four names; the one used is said.',
  outOfRange: 'refuse',
  run: ({ growth, convention }) => REFERENCE_KW[convention] / GROWTH_TIME_S[growth] ** 2,
});
