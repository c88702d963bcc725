import { defineMethod } from '../define-method.ts';
import { recalled } from '../sources.ts';

/** Heat release rate for flashover after Thomas, kW. A_T without the openings that count. */
export const flashoverThomas = defineMethod({
  id: 'room.flashover-thomas',
  version: 1,
  title: 'Flashover after Thomas',
  symbol: 'Q_fo',
  unit: 'kW',
  inputs: {
    A_T: { symbol: 'A_T', unit: 'm2', quantity: 'Lining area, openings left out', valid: [1e-6, Infinity] },
    F: { symbol: 'A √H', unit: 'm5/2', quantity: 'Ventilation factor', valid: [1e-9, Infinity] },
    A_f: { symbol: 'A_f', unit: 'm2', quantity: 'Floor area', valid: [0, 150] },
  },
  equation: 'Q_fo = 7.8 A_T + 378 A √H',
  sources: [
    recalled(
      'Thomas, Testing products and materials for their contribution to flashover in rooms',
      'heat balance at 600 K',
      '1981',
    ),
  ],
  assumptions: [
    'Rise of 600 K in a room of ordinary size.',
    'Commonly used to about 150 m2 of floor, not above 500 m2.',
  ],
  why: 'It asks for nothing but the size of the room and its openings.',
  outOfRange: 'warn',
  run: ({ A_T, F }) => 7.8 * A_T + 378 * F,
});
