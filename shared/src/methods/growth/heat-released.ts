import { defineMethod } from '../define-method.ts';
import { en1991 } from '../sources.ts';

/** Heat that the fire gives off in all, MJ. */
export const heatReleased = defineMethod({
  id: 'growth.heat-released',
  version: 1,
  title: 'Heat released',
  symbol: 'E',
  unit: 'MJ',
  inputs: {
    m: { symbol: 'm', unit: '', quantity: 'Combustion factor', valid: [0, 1] },
    Q: { symbol: 'Q_fi,k', unit: 'MJ', quantity: 'Fire load', valid: [0, Infinity] },
  },
  equation: 'E = m · Q_fi,k',
  sources: [en1991('E.3 and E.4(9)')],
  assumptions: ['No credit for protection: the curve is not shortened by sprinklers or a brigade.'],
  why: 'The curve has to hold the heat that is there, once reduced for incomplete burning and no more.',
  outOfRange: 'refuse',
  run: ({ m, Q }) => m * Q,
});
