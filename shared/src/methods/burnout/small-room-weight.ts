import { defineMethod } from '../define-method.ts';
import { dbSi, en1991 } from '../sources.ts';

/** Variant of w_f for rooms under 100 m² without roof openings. */
export const smallRoomWeight = defineMethod({
  id: 'burnout.small-room-weight-2002',
  version: 1,
  title: 'Ventilation factor of a small room',
  symbol: 'w_f',
  unit: '',
  inputs: {
    O: { symbol: 'O', unit: 'm1/2', quantity: 'Opening factor', valid: [0.02, 0.2] },
    A_f: { symbol: 'A_f', unit: 'm2', quantity: 'Floor area', valid: [1e-6, 100] },
    A_t: { symbol: 'A_t', unit: 'm2', quantity: 'Enclosing area', valid: [1e-6, Infinity] },
  },
  equation: 'w_f = O^(−1/2) A_f/A_t',
  sources: [en1991('Annex F(4)'), dbSi('B.6')],
  assumptions: ['No roof opening.'],
  why: 'A variant for comparison; the tally uses the general form for every room.',
  outOfRange: 'warn',
  run: ({ O, A_f, A_t }) => A_f / (Math.sqrt(O) * A_t),
});
