import { defineMethod } from '../define-method.ts';
import { dbSi, en1991 } from '../sources.ts';

/** Time in the standard fire that does as much to a member as the burn-out of the room, min. */
export const equivalentTime = defineMethod({
  id: 'burnout.equivalent-time-2002',
  version: 1,
  title: 'Equivalent time of exposure',
  symbol: 't_e,d',
  unit: 'min',
  inputs: {
    q_fd: { symbol: 'q_f,d', unit: 'MJ/m2', quantity: 'Load per floor area', valid: [0, Infinity] },
    k_b: { symbol: 'k_b', unit: 'min m2/MJ', quantity: 'Conversion factor of the linings', valid: [0.01, 1] },
    w_f: { symbol: 'w_f', unit: '', quantity: 'Ventilation factor', valid: [0.1, 10] },
    k_c: { symbol: 'k_c', unit: '', quantity: 'Correction factor of the member', valid: [0.01, 20] },
  },
  equation: 't_e,d = q_f,d · k_b · w_f · k_c',
  sources: [en1991('Annex F, equation (F.1)'), dbSi('B.2')],
  assumptions: ['Means something only against a rating found in a furnace.', 'Not for timber or composite members.'],
  why: 'It can be set beside the rated resistance in minutes.',
  outOfRange: 'warn',
  run: ({ q_fd, k_b, w_f, k_c }) => q_fd * k_b * w_f * k_c,
});
