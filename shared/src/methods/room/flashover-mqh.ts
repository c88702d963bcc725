import { defineMethod } from '../define-method.ts';
import { recalled } from '../sources.ts';

/** Heat release rate for flashover after McCaffrey, Quintiere and Harkleroad, kW. */
export const flashoverMqh = defineMethod({
  id: 'room.flashover-mqh',
  version: 1,
  title: 'Flashover after McCaffrey, Quintiere and Harkleroad',
  symbol: 'Q_fo',
  unit: 'kW',
  inputs: {
    h_k: { symbol: 'h_k', unit: 'kW/m2K', quantity: 'Heat transfer into the linings', valid: [1e-9, 100] },
    A_T: { symbol: 'A_T', unit: 'm2', quantity: 'Lining area, openings left out', valid: [1e-6, Infinity] },
    F: { symbol: 'A √H', unit: 'm5/2', quantity: 'Ventilation factor', valid: [1e-9, Infinity] },
    A_f: { symbol: 'A_f', unit: 'm2', quantity: 'Floor area', valid: [0, 100] },
    H: { symbol: 'H', unit: 'm', quantity: 'Height', valid: [0, 4] },
  },
  equation: 'Q_fo = 610 √(h_k A_T A √H)',
  sources: [
    recalled(
      'McCaffrey, Quintiere & Harkleroad, Estimating room temperatures and the likelihood of flashover',
      'more than 100 tests',
      '1981',
    ),
  ],
  assumptions: [
    'Rise of 500 K.',
    'Tested in rooms 0.3 to 2.7 m high with 0.14 to 12 m2 of floor; larger rooms are an extrapolation that is usual.',
    'The published 610 is rounded down from 624, which the temperature relation would give.',
  ],
  why: 'It is the only one of the three that knows what the walls are made of.',
  outOfRange: 'warn',
  run: ({ h_k, A_T, F }) => 610 * Math.sqrt(h_k * A_T * F),
});
