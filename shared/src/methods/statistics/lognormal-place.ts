import { defineMethod } from '../define-method.ts';
import { definition } from '../sources.ts';
import { lognormalParameters } from './lognormal-parameters.ts';
import { normalCdf } from './normal-distribution.ts';

/** Share of rooms of a use that hold less than q, in percent, for a lognormal distribution. */
export const lognormalPlace = defineMethod({
  id: 'statistics.lognormal-place',
  version: 1,
  title: 'Place among rooms of the same use',
  symbol: 'P(q)',
  unit: '%',
  inputs: {
    q: { symbol: 'q', unit: 'MJ/m2', quantity: 'Stored and passing load per floor area', valid: [0, Infinity] },
    mean: { symbol: 'q_m', unit: 'MJ/m2', quantity: 'Mean of the use', valid: [1e-9, Infinity] },
    V: { symbol: 'V', unit: '', quantity: 'Coefficient of variation of the use', valid: [1e-9, 5] },
  },
  equation: 'P(q) = 100 Φ((ln q − μ)/s);  s² = ln(1 + V²);  μ = ln q_m − s²/2',
  sources: [definition('lognormal distribution')],
  assumptions: ['Fixed load is left out: the surveys behind the distribution counted movable load only.'],
  why: 'The survey of the use found a lognormal spread.',
  outOfRange: 'refuse',
  run({ q, mean, V }) {
    if (q === 0) return 0;
    const { mu, sigma } = lognormalParameters(mean, V);
    return 100 * normalCdf((Math.log(q) - mu) / sigma);
  },
});
