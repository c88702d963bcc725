import { defineMethod } from '../define-method.ts';
import { recalled } from '../sources.ts';

/** Burning rate of wood cribs and inflow of air under ventilation control, kg/s. */
export const kawagoe = defineMethod({
  id: 'room.kawagoe',
  version: 1,
  title: 'Burning rate under ventilation control',
  symbol: 'R',
  unit: 'kg/s',
  inputs: { F: { symbol: 'A √H', unit: 'm5/2', quantity: 'Ventilation factor', valid: [0, Infinity] } },
  equation: 'R = 0.09 A √H;  air = 0.5 A √H',
  sources: [
    {
      title: 'Fire Technology, doi 10.1007/s10694-022-01218-1',
      edition: '2022',
      locator: '0.09 A √H kg/s = 5.5 kg/min',
    },
    recalled('Kawagoe, Fire behaviour in rooms', 'burning rate', '1958'),
  ],
  assumptions: ['Wood cribs; one vertical opening; gases above 300 °C.'],
  why: 'It says how many kilograms of wood the air of the openings can burn.',
  outOfRange: 'refuse',
  outputs: {
    rate: { symbol: 'R', unit: 'kg/s', quantity: 'Burning rate' },
    air: { symbol: 'm_air', unit: 'kg/s', quantity: 'Inflow of air' },
  },
  run: ({ F }) => ({ rate: 0.09 * F, air: 0.5 * F }),
});
