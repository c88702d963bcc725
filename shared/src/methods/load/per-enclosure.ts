import { defineMethod } from '../define-method.ts';
import { en1991 } from '../sources.ts';

/** Fire load per area of all enclosing surfaces, openings included, MJ/m². */
export const perEnclosure = defineMethod({
  id: 'load.per-enclosure',
  version: 1,
  title: 'Fire load per enclosing area',
  symbol: 'q_t,k',
  unit: 'MJ/m2',
  inputs: {
    Q: { symbol: 'Q_fi,k', unit: 'MJ', quantity: 'Fire load', valid: [0, Infinity] },
    A_t: {
      symbol: 'A_t',
      unit: 'm2',
      quantity: 'Area of floor, ceiling and walls, openings included',
      valid: [1e-6, Infinity],
    },
  },
  equation: 'q_t,k = Q_fi,k / A_t',
  sources: [en1991('E.2.1, equation (E.3)')],
  assumptions: ['Openings and vents are part of A_t; neither the combustion factor nor any δ is in it.'],
  why: 'The parametric curve asks for the load per enclosing area: three to six times less than per floor area.',
  outOfRange: 'refuse',
  run: ({ Q, A_t }) => Q / A_t,
});
