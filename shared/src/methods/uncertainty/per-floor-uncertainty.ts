import { defineMethod } from '../define-method.ts';
import { gum } from '../sources.ts';

/** Standard uncertainty of the load per floor area, MJ/m², first order. */
export const perFloorUncertainty = defineMethod({
  id: 'uncertainty.per-floor',
  version: 1,
  title: 'Standard uncertainty of the load per floor area',
  symbol: 'u(q_f)',
  unit: 'MJ/m2',
  inputs: {
    Q: { symbol: 'Q', unit: 'MJ', quantity: 'Fire load', valid: [0, Infinity] },
    u_Q: { symbol: 'u(Q)', unit: 'MJ', quantity: 'Standard uncertainty of the fire load', valid: [0, Infinity] },
    A_f: { symbol: 'A_f', unit: 'm2', quantity: 'Floor area', valid: [1e-6, Infinity] },
    r_A: { symbol: 'u(A_f)/A_f', unit: '', quantity: 'Relative uncertainty of the floor area', valid: [0, 1] },
    r_o: { symbol: 'u_o', unit: '', quantity: 'Spread of the share overlooked', valid: [0, 1] },
  },
  equation: 'u²(q_f) = [u²(Q) + (Q u(A_f)/A_f)² + (Q u_o)²] / A_f²',
  sources: [gum('5.1.2')],
  assumptions: ['Things overlooked: triangular from 0 to 15 %, most likely 5 %; our own choice from common practice.'],
  why: 'It can be shown at once; sampling replaces it where it is asked for.',
  outOfRange: 'refuse',
  run: ({ Q, u_Q, A_f, r_A, r_o }) => Math.hypot(u_Q, Q * r_A, Q * r_o) / A_f,
});
