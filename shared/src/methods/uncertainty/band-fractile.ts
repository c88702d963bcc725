import { defineMethod } from '../define-method.ts';
import { OutOfRangeError } from '../estimate.ts';
import { definition, gum } from '../sources.ts';
import { lognormalParameters } from '../statistics/lognormal-parameters.ts';
import { normalQuantile } from '../statistics/normal-distribution.ts';
import { portableExp } from '../statistics/portable-functions.ts';

/** How sure the survey is: the value the load per floor area stays below with probability p, first order. */
export const bandFractile = defineMethod({
  id: 'uncertainty.band',
  version: 1,
  title: 'How sure the survey is',
  symbol: 'q_p',
  unit: 'MJ/m2',
  inputs: {
    q: { symbol: 'q_f', unit: 'MJ/m2', quantity: 'Load per floor area as counted', valid: [0, Infinity] },
    u: { symbol: 'u(q_f)', unit: 'MJ/m2', quantity: 'Its standard uncertainty', valid: [0, Infinity] },
    o: { symbol: 'o', unit: '', quantity: 'Mean share overlooked', valid: [0, 1] },
    p: { symbol: 'p', unit: '', quantity: 'Probability', valid: [1e-9, 1 - 1e-9] },
  },
  equation: 'q_p of a lognormal distribution with mean q_f (1 + o) and standard deviation u(q_f)',
  sources: [gum('6.3, expanded uncertainty'), definition('lognormal distribution')],
  assumptions: [
    'This is how well the amount is known, not how it changes from day to day.',
    'The middle lies above the counted figure because surveys overlook things and never count what is not there.',
  ],
  why: 'A load is never below zero, so the band is not symmetric.',
  outOfRange: 'refuse',
  run({ q, u, o, p }) {
    if (q === 0) return 0;
    const mean = q * (1 + o);
    const V = u / mean;
    if (!Number.isFinite(V))
      throw new OutOfRangeError('The load is next to nothing beside its uncertainty: check both.');
    const { mu, sigma } = lognormalParameters(mean, V);
    return portableExp(mu + sigma * normalQuantile(p));
  },
});
