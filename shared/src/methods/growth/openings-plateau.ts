import { defineMethod } from '../define-method.ts';
import { en1991, recalled } from '../sources.ts';

/** EN (E.6) has m = 0.8 and H_u = 17.5 MJ/kg of wood inside: 0.10 · 0.8 · 17.5 = 1.40 MW per m^5/2, a constant. */
const KW_PER_FACTOR = 0.1 * 0.8 * 17.5 * 1000;

/** Heat release rate that the openings can feed after flashover, kW. */
export const openingsPlateau = defineMethod({
  id: 'growth.openings-plateau-2002',
  version: 1,
  title: 'What the openings can feed',
  symbol: 'Q_max,v',
  unit: 'kW',
  inputs: {
    F: {
      symbol: 'A_v √h_eq',
      unit: 'm5/2',
      quantity: 'Ventilation factor, broken glass counted',
      valid: [0, Infinity],
    },
  },
  equation: 'Q_max,v = 0.10 · m · H_u · A_v √h_eq MW with m = 0.8 and H_u = 17.5 MJ/kg: 1.40 A_v √h_eq MW',
  sources: [en1991('E.4(8), equation (E.6)'), recalled('Kawagoe, Fire behaviour in rooms', '0.09 A √H kg/s', '1958')],
  assumptions: ['m and H_u belong to the equation and stay as they are, whatever burns in the room.'],
  why: 'With another m the plateau would pass the oxygen limit of 1.5 A √H MW, which cannot be.',
  outOfRange: 'refuse',
  run: ({ F }) => KW_PER_FACTOR * F,
});
