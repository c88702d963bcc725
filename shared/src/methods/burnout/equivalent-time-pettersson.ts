import { defineMethod } from '../define-method.ts';
import { recalled } from '../sources.ts';

/** Variant: equivalent time after Pettersson, min. */
export const equivalentTimePettersson = defineMethod({
  id: 'burnout.equivalent-time-pettersson',
  version: 1,
  title: 'Equivalent time after Pettersson',
  symbol: 't_e',
  unit: 'min',
  inputs: {
    q_t: { symbol: 'q_t', unit: 'MJ/m2', quantity: 'Load per enclosing area', valid: [0, Infinity] },
    O: { symbol: 'A_v √h/A_t', unit: 'm1/2', quantity: 'Opening factor', valid: [0.01, 0.3] },
  },
  equation: 't_e = 0.067 q_t / √(A_v √h/A_t)',
  sources: [
    recalled('Pettersson, Magnusson & Thor, Fire engineering design of steel structures', 'equivalent time', '1976'),
  ],
  assumptions: ['Walls of ordinary thermal inertia.'],
  why: 'An older relation on the load per enclosing area, for comparison.',
  outOfRange: 'warn',
  run: ({ q_t, O }) => (0.067 * q_t) / Math.sqrt(O),
});
