import { defineMethod } from '../define-method.ts';
import { recalled } from '../sources.ts';

/** Rise of the gas in a mechanically ventilated room after Deal and Beyler, K. */
export const forcedDealBeyler = defineMethod({
  id: 'temperature.forced-deal-beyler',
  version: 1,
  title: 'Gas temperature with forced ventilation, Deal and Beyler',
  symbol: 'ΔT',
  unit: 'K',
  inputs: {
    Q: { symbol: 'Q', unit: 'kW', quantity: 'Heat release rate', valid: [0, 1e6] },
    m: { symbol: 'm', unit: 'kg/s', quantity: 'Mass flow of the ventilation', valid: [1e-3, 1000] },
    c_p: { symbol: 'c_p', unit: 'kJ/kgK', quantity: 'Heat capacity of air', valid: [0.9, 1.2] },
    h_k: { symbol: 'h_k', unit: 'kW/m2K', quantity: 'Heat transfer of this relation', valid: [1e-9, 100] },
    A_T: { symbol: 'A_T', unit: 'm2', quantity: 'Lining area', valid: [1e-3, 1e6] },
  },
  equation: 'ΔT = Q/(m c_p + h_k A_T)',
  sources: [recalled('Deal & Beyler, Correlating preflashover room fire temperatures', 'up to about 2000 s', '1990')],
  assumptions: ['The room stays well mixed and the fans keep running.'],
  why: 'A heat balance: it stays sensible for flows the other relation was never tested at.',
  outOfRange: 'refuse',
  run: ({ Q, m, c_p, h_k, A_T }) => Q / (m * c_p + h_k * A_T),
});
