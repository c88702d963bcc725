import { defineMethod } from '../define-method.ts';
import { en1991, jcss } from '../sources.ts';

/** Opening factor, m^½: ventilation factor over all enclosing surfaces, openings included. */
export const openingFactor = defineMethod({
  id: 'room.opening-factor',
  version: 1,
  title: 'Opening factor',
  symbol: 'O',
  unit: 'm1/2',
  inputs: {
    F: { symbol: 'A_v √h_eq', unit: 'm5/2', quantity: 'Ventilation factor', valid: [0, Infinity] },
    A_t: { symbol: 'A_t', unit: 'm2', quantity: 'Enclosing area, openings included', valid: [1e-6, Infinity] },
  },
  equation: 'O = A_v √h_eq / A_t',
  sources: [en1991('Annex A'), jcss('2.20.3')],
  assumptions: ['A_t contains the openings here, unlike A_T in the flashover criteria.'],
  why: 'It says how much air a room gets for its size, and bounds the parametric curve.',
  outOfRange: 'refuse',
  run: ({ F, A_t }) => F / A_t,
});
