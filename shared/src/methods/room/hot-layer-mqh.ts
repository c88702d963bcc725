import { defineMethod } from '../define-method.ts';
import { recalled } from '../sources.ts';

/** The rise the tests reached, K; the relation is not carried beyond it. */
export const LARGEST_RISE_K = 600;
const POSITION = { centre: 1, wall: 1.3, corner: 1.7 } as const;

/** Rise of the hot layer above ambient with a natural opening, K, at most 600. */
export const hotLayerMqh = defineMethod({
  id: 'room.hot-layer-mqh',
  version: 1,
  title: 'Hot layer after McCaffrey, Quintiere and Harkleroad',
  symbol: 'ΔT',
  unit: 'K',
  inputs: {
    Q: { symbol: 'Q', unit: 'kW', quantity: 'Heat release rate', valid: [0, Infinity] },
    h_k: { symbol: 'h_k', unit: 'kW/m2K', quantity: 'Heat transfer into the linings', valid: [1e-9, 100] },
    A_T: { symbol: 'A_T', unit: 'm2', quantity: 'Lining area, openings left out', valid: [1e-6, Infinity] },
    F: { symbol: 'A √H', unit: 'm5/2', quantity: 'Ventilation factor', valid: [1e-9, Infinity] },
    position: { symbol: '', quantity: 'Where the fire burns', choices: ['centre', 'wall', 'corner'] },
  },
  equation: 'ΔT = 6.85 [Q² / (h_k A_T A √H)]^⅓, × 1.3 at a wall, × 1.7 in a corner, at most 600 K',
  sources: [
    recalled(
      'McCaffrey, Quintiere & Harkleroad, Estimating room temperatures and the likelihood of flashover',
      'equation with 6.85',
      '1981',
    ),
    recalled(
      'Mowrer & Williamson, Estimating room temperatures from fires along walls and in corners',
      'factors 1.3 and 1.7',
      '1987',
    ),
  ],
  assumptions: [
    'A rise in kelvin, not a temperature.',
    'Steady or slowly growing fire; one opening or several as one.',
  ],
  why: 'The relation with the widest base of room tests.',
  outOfRange: 'warn',
  run: ({ Q, h_k, A_T, F, position }) =>
    Math.min(LARGEST_RISE_K, POSITION[position] * 6.85 * Math.cbrt((Q * Q) / (h_k * A_T * F))),
});
