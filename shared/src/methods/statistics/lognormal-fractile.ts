import { defineMethod } from '../define-method.ts';
import { definition, recalled } from '../sources.ts';
import { lognormalParameters } from './lognormal-parameters.ts';
import { normalQuantile } from './normal-distribution.ts';

/** Value that a share p stays below, lognormal distribution from mean and coefficient of variation. */
export const lognormalFractile = defineMethod({
  id: 'statistics.lognormal-fractile',
  version: 1,
  title: 'Fractile of a lognormal distribution',
  symbol: 'q_p',
  unit: 'MJ/m2',
  inputs: {
    mean: { symbol: 'q_m', unit: 'MJ/m2', quantity: 'Mean', valid: [1e-9, Infinity] },
    V: { symbol: 'V', unit: '', quantity: 'Coefficient of variation', valid: [0, 5] },
    p: { symbol: 'p', unit: '', quantity: 'Probability', valid: [1e-9, 1 - 1e-9] },
  },
  equation: 's² = ln(1 + V²);  μ = ln q_m − s²/2;  q_p = exp(μ + s z_p)',
  sources: [
    definition('lognormal distribution'),
    recalled('Zalok et al., survey of shops', 'mean 747, standard deviation 833 MJ/m2', '2009'),
  ],
  assumptions: [],
  why: 'Loads of mixed shops and of stock spread too far for a Gumbel distribution and are never below zero.',
  outOfRange: 'refuse',
  run({ mean, V, p }) {
    const { mu, sigma } = lognormalParameters(mean, V);
    return Math.exp(mu + sigma * normalQuantile(p));
  },
});
