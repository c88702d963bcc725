import { defineMethod } from '../define-method.ts';
import { definition, en1991 } from '../sources.ts';

/** Floor, enclosing area and volume of a prism-shaped room. Flat ceiling; A_t includes openings. */
export const enclosureAreas = defineMethod({
  id: 'room.areas',
  version: 1,
  title: 'Areas of the room',
  symbol: 'A_t',
  unit: 'm2',
  inputs: {
    A_f: { symbol: 'A_f', unit: 'm2', quantity: 'Floor area inside the walls, holes taken off', valid: [0, Infinity] },
    P: { symbol: 'P', unit: 'm', quantity: 'Length of all walls, around holes too', valid: [0, Infinity] },
    H: { symbol: 'H', unit: 'm', quantity: 'Clear height', valid: [0, Infinity] },
  },
  equation: 'A_t = 2 A_f + P · H;  V = A_f · H',
  sources: [definition('plane geometry of a room with a flat ceiling'), en1991('Annex A, definition of A_t')],
  assumptions: ['Openings are part of A_t.', 'The ceiling is flat; for a sloping roof the mean height is meant.'],
  why: 'Every code defines A_t with the openings in it; where openings are left out the symbol is A_T.',
  outOfRange: 'refuse',
  outputs: {
    floor: { symbol: 'A_f', unit: 'm2', quantity: 'Floor area' },
    enclosing: { symbol: 'A_t', unit: 'm2', quantity: 'Enclosing area' },
    volume: { symbol: 'V', unit: 'm3', quantity: 'Volume' },
  },
  run: ({ A_f, P, H }) => ({ floor: A_f, enclosing: 2 * A_f + P * H, volume: A_f * H }),
});
