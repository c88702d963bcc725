import { defineMethod } from '../define-method.ts';
import { dbSi, en1991 } from '../sources.ts';

/** Fire load per floor area, MJ/m². The floor must be larger than 0. */
export const perFloor = defineMethod({
  id: 'load.per-floor',
  version: 1,
  title: 'Fire load per floor area',
  symbol: 'q_f,k',
  unit: 'MJ/m2',
  inputs: {
    Q: { symbol: 'Q_fi,k', unit: 'MJ', quantity: 'Fire load', valid: [0, Infinity] },
    A_f: { symbol: 'A_f', unit: 'm2', quantity: 'Floor area', valid: [1e-6, Infinity] },
  },
  equation: 'q_f,k = Q_fi,k / A_f',
  sources: [en1991('E.2.1, equation (E.3)'), dbSi('B.4, definition of q_f,k')],
  assumptions: ['The load is spread evenly over the floor; the local peak says how uneven it is.'],
  why: 'Limits of permits and codes are set per floor area.',
  outOfRange: 'refuse',
  run: ({ Q, A_f }) => Q / A_f,
});
