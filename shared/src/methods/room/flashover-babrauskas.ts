import { defineMethod } from '../define-method.ts';
import { recalled } from '../sources.ts';

/** Heat release rate for flashover after Babrauskas, kW. */
export const flashoverBabrauskas = defineMethod({
  id: 'room.flashover-babrauskas',
  version: 1,
  title: 'Flashover after Babrauskas',
  symbol: 'Q_fo',
  unit: 'kW',
  inputs: {
    F: { symbol: 'A √H', unit: 'm5/2', quantity: 'Ventilation factor', valid: [1e-9, Infinity] },
    A_T_per_F: { symbol: 'A_T/(A √H)', unit: 'm-1/2', quantity: 'Lining area over ventilation factor', valid: [9, 65] },
  },
  equation: 'Q_fo = 750 A √H',
  sources: [recalled('Babrauskas, Estimating room flashover potential', '33 tests, 11 to 3840 kW', '1980')],
  assumptions: ['Half of the ventilation limit; the tests scatter from 0.3 to 0.7 of it.'],
  why: 'The simplest criterion; outside its tests it falls with the opening and means nothing.',
  outOfRange: 'warn',
  run: ({ F }) => 750 * F,
});
