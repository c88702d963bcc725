import { defineMethod } from '../define-method.ts';
import { recalled } from '../sources.ts';

/** How much of the variance of the density one input causes alone, in percent. */
export const varianceShare = defineMethod({
  id: 'uncertainty.variance-share',
  version: 1,
  title: 'Share of the variance',
  symbol: 'S_j',
  unit: '%',
  inputs: {
    V_j: { symbol: 'V_j/q²', unit: '', quantity: 'Relative variance from this input alone', valid: [0, Infinity] },
    V: { symbol: 'V/q²', unit: '', quantity: 'Relative variance of the density', valid: [1e-300, Infinity] },
  },
  equation: 'S_j = 100 V_j / V,  V_j = Var(E[q_f | X_j])',
  sources: [
    recalled('Sobol’, Sensitivity estimates for nonlinear mathematical models', 'first-order index', '1993'),
    recalled('Saltelli and others, Global Sensitivity Analysis: The Primer', '1.2.14', '2008'),
  ],
  assumptions: [
    'Exact, without sampling: the load is a sum of products of independent inputs.',
    'Everything of one material shares one heat and one moisture; each entry has one mass and one cabinet.',
  ],
  why: 'It says which input to look at first: knowing it exactly would take about this much of the variance away.',
  outOfRange: 'refuse',
  run: ({ V_j, V }) => (100 * V_j) / V,
});
