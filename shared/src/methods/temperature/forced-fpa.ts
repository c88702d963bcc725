import { defineMethod } from '../define-method.ts';
import { recalled } from '../sources.ts';

/** Rise of the gas in a mechanically ventilated room after Foote, Pagni and Alvares, K. */
export const forcedFpa = defineMethod({
  id: 'temperature.forced-fpa',
  version: 1,
  title: 'Gas temperature with forced ventilation, Foote, Pagni and Alvares',
  symbol: 'ΔT',
  unit: 'K',
  inputs: {
    Q: { symbol: 'Q', unit: 'kW', quantity: 'Heat release rate', valid: [150, 490] },
    m: { symbol: 'm', unit: 'kg/s', quantity: 'Mass flow of the ventilation', valid: [0.11, 0.33] },
    T_0: { symbol: 'T_0', unit: 'K', quantity: 'Temperature of the air supplied', valid: [250, 330] },
    c_p: { symbol: 'c_p', unit: 'kJ/kgK', quantity: 'Heat capacity of air', valid: [0.9, 1.2] },
    h_k: { symbol: 'h_k', unit: 'kW/m2K', quantity: 'Heat transfer into the linings', valid: [1e-6, 100] },
    A_T: { symbol: 'A_T', unit: 'm2', quantity: 'Lining area', valid: [1e-3, 1e6] },
  },
  equation: 'ΔT/T_0 = 0.63 [Q/(m c_p T_0)]^0.72 [h_k A_T/(m c_p)]^(−0.36)',
  sources: [
    recalled(
      'Foote, Pagni & Alvares, Temperature correlations for forced-ventilated compartment fires',
      'one room of 120 m3',
      '1985',
    ),
  ],
  assumptions: ['The room stays well mixed and the fans keep running.'],
  why: 'Rooms with fans and closed doors have no opening that the natural relation could use.',
  outOfRange: 'warn',
  run: ({ Q, m, T_0, c_p, h_k, A_T }) =>
    0.63 * T_0 * (Q / (m * c_p * T_0)) ** 0.72 * ((h_k * A_T) / (m * c_p)) ** -0.36,
});
