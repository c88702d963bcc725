import { defineMethod } from '../define-method.ts';
import { OutOfRangeError } from '../estimate.ts';
import { recalled } from '../sources.ts';

/** Variant: equivalent time after Law, min; the load as kilograms of wood. */
export const equivalentTimeLaw = defineMethod({
  id: 'burnout.equivalent-time-law',
  version: 1,
  title: 'Equivalent time after Law',
  symbol: 't_e',
  unit: 'min',
  inputs: {
    A_f: { symbol: 'A_f', unit: 'm2', quantity: 'Floor area', valid: [1e-6, Infinity] },
    q_f: { symbol: 'q_f', unit: 'MJ/m2', quantity: 'Load per floor area', valid: [0, Infinity] },
    H_c: { symbol: 'ΔH_c', unit: 'MJ/kg', quantity: 'Net heat of wood', valid: [16, 18] },
    A_v: { symbol: 'A_v', unit: 'm2', quantity: 'Area of openings', valid: [1e-6, Infinity] },
    A_t: { symbol: 'A_t', unit: 'm2', quantity: 'Enclosing area', valid: [1e-6, Infinity] },
  },
  equation: 't_e = A_f q_f / (ΔH_c √(A_v (A_t − A_v)))',
  sources: [
    recalled('Law, A relationship between fire grading and building design and contents', 'equivalent time', '1971'),
  ],
  assumptions: ['A_t without the floor in the original.'],
  why: 'An older relation on the openings alone, for comparison.',
  outOfRange: 'warn',
  run({ A_f, q_f, H_c, A_v, A_t }) {
    if (!(A_t > A_v)) throw new OutOfRangeError('The openings are as large as the room: A_t must be above A_v.');
    return (A_f * q_f) / (H_c * Math.sqrt(A_v * (A_t - A_v)));
  },
});
