import { defineMethod } from '../define-method.ts';
import { recalled } from '../sources.ts';

/** Heat release rate at which all air that comes in is used up, kW. */
export const ventilationLimit = defineMethod({
  id: 'room.ventilation-limit',
  version: 1,
  title: 'Ventilation limit',
  symbol: 'Q_v',
  unit: 'kW',
  inputs: {
    F: { symbol: 'A √H', unit: 'm5/2', quantity: 'Ventilation factor', valid: [0, Infinity] },
    O: { symbol: 'O', unit: 'm1/2', quantity: 'Opening factor', valid: [0, 0.2] },
  },
  equation: 'Q_v = 1500 A √H',
  sources: [
    {
      title: 'Fire Technology, doi 10.1007/s10694-022-01218-1',
      edition: '2022',
      locator: 'air inflow 0.5 A √H kg/s, 1.5 A √H MW',
    },
    recalled('Babrauskas, Estimating room flashover potential', '0.5 A √H kg/s × 3.0 MJ/kg of air', '1980'),
  ],
  assumptions: ['Hot, well mixed room; one layer of gas; wind left out.'],
  why: 'It is the oxygen limit. The plateau of the design fire uses 1.40 A √H MW from another source; both are right.',
  outOfRange: 'warn',
  run: ({ F }) => 1500 * F,
});
