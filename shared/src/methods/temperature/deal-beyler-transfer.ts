import { defineMethod } from '../define-method.ts';
import { recalled } from '../sources.ts';

const W_PER_KW = 1000;

/** Heat transfer into one lining as Deal and Beyler use it, kW/m²K. Not the h_k of the natural relation. */
export const dealBeylerTransfer = defineMethod({
  id: 'temperature.deal-beyler-transfer',
  version: 1,
  title: 'Heat transfer for forced ventilation, Deal and Beyler',
  symbol: 'h_k',
  unit: 'kW/m2K',
  inputs: {
    t: { symbol: 't', unit: 's', quantity: 'Time', valid: [1, 2000] },
    k: { symbol: 'k', unit: 'W/mK', quantity: 'Conductivity', valid: [1e-4, 1000] },
    rho: { symbol: 'ρ', unit: 'kg/m3', quantity: 'Density', valid: [1, 25_000] },
    c: { symbol: 'c', unit: 'J/kgK', quantity: 'Heat capacity', valid: [10, 20_000] },
    d: { symbol: 'δ', unit: 'm', quantity: 'Thickness', valid: [1e-5, 10] },
  },
  equation: 'h_k = 0.4 max(√(k ρ c/t) ; k/δ)',
  sources: [recalled('Deal & Beyler, Correlating preflashover room fire temperatures', 'h_k', '1990')],
  assumptions: ['One lining.'],
  why: 'The relation it goes with was fitted with this transfer.',
  outOfRange: 'warn',
  run: ({ t, k, rho, c, d }) => (0.4 * Math.max(Math.sqrt((k * rho * c) / t), k / d)) / W_PER_KW,
});
