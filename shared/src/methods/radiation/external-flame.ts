import { defineMethod } from '../define-method.ts';
import { en1991 } from '../sources.ts';

const GRAVITY = 9.81;
const DENSITY = 0.45;

/** Height of the flame above the top of a window, m, without forced draught. */
export const externalFlame = defineMethod({
  id: 'radiation.external-flame-2002',
  version: 1,
  title: 'Flame out of a window',
  symbol: 'L_L',
  unit: 'm',
  inputs: {
    Q: { symbol: 'Q', unit: 'MW', quantity: 'Heat release rate', valid: [0, 1000] },
    A_v: { symbol: 'A_v', unit: 'm2', quantity: 'Area of the openings', valid: [0.01, 1000] },
    h: { symbol: 'h_eq', unit: 'm', quantity: 'Height of the openings', valid: [0.1, 20] },
  },
  equation: 'L_L = h_eq [2.37 (Q/(A_v · 0.45 √(9.81 h_eq)))^(2/3) − 1], at least 0',
  sources: [en1991('Annex B, equation (B.7), after Law & O’Brien')],
  assumptions: ['No forced draught. For one window it is about 1.9 (Q/w_t)^(2/3) − h.'],
  why: 'It reaches the floor above.',
  outOfRange: 'refuse',
  run: ({ Q, A_v, h }) => Math.max(0, h * (2.37 * (Q / (A_v * DENSITY * Math.sqrt(GRAVITY * h))) ** (2 / 3) - 1)),
});
