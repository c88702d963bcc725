import { defineMethod } from '../define-method.ts';
import { jcss } from '../sources.ts';

/** Variant: equivalent time of the probabilistic model code, s. */
export const equivalentTimeJcss = defineMethod({
  id: 'burnout.equivalent-time-jcss',
  version: 1,
  title: 'Equivalent time of the probabilistic model code',
  symbol: 't_eq',
  unit: 's',
  inputs: {
    q_0: { symbol: 'q_0', unit: 'MJ/m2', quantity: 'Load per floor area', valid: [0, Infinity] },
    A_f: { symbol: 'A_f', unit: 'm2', quantity: 'Floor area', valid: [1e-6, Infinity] },
    A_t: { symbol: 'A_t', unit: 'm2', quantity: 'Enclosing area', valid: [1e-6, Infinity] },
    f: { symbol: 'f', unit: 'm1/2', quantity: 'Opening factor', valid: [0.01, 0.3] },
  },
  equation: 't_eq = β q_0 A_f / (A_t √f);  β = 4.0 s m^2.25/MJ',
  sources: [jcss('equation (10) and its table of β')],
  assumptions: ['β is the mean of a lognormal distribution with standard deviation 1.0.', 'm is part of q_0.'],
  why: 'It states the scatter of its own constant, for comparison.',
  outOfRange: 'warn',
  run: ({ q_0, A_f, A_t, f }) => (4 * q_0 * A_f) / (A_t * Math.sqrt(f)),
});
