import { defineMethod } from '../define-method.ts';
import { definition, en1991 } from '../sources.ts';
import { gumbelParameters } from './gumbel-parameters.ts';

/** Share of rooms of a use that hold less than q, in percent, for a Gumbel distribution. */
export const gumbelPlace = defineMethod({
  id: 'statistics.gumbel-place',
  version: 1,
  title: 'Place among rooms of the same use',
  symbol: 'P(q)',
  unit: '%',
  inputs: {
    q: { symbol: 'q', unit: 'MJ/m2', quantity: 'Stored and passing load per floor area', valid: [0, Infinity] },
    mean: { symbol: 'q_m', unit: 'MJ/m2', quantity: 'Mean of the use', valid: [1e-9, Infinity] },
    V: { symbol: 'V', unit: '', quantity: 'Coefficient of variation of the use', valid: [1e-9, 5] },
  },
  equation: 'P(q) = 100 exp(−exp(−(q − u)/β));  β = 0.77970 V q_m;  u = q_m − 0.57722 β',
  sources: [en1991('Table E.4, movable load'), definition('type I extreme value distribution')],
  assumptions: ['Fixed load is left out: the surveys behind the distribution counted movable load only.'],
  why: 'Table E.4 follows this distribution with V = 0.30.',
  outOfRange: 'refuse',
  run({ q, mean, V }) {
    const { u, beta } = gumbelParameters(mean, V);
    return 100 * Math.exp(-Math.exp(-(q - u) / beta));
  },
});
