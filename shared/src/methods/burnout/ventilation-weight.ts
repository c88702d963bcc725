import { defineMethod } from '../define-method.ts';
import { dbSi, en1991 } from '../sources.ts';
import { portableExp, portableLog } from '../statistics/portable-functions.ts';

/** Ventilation factor w_f of the equivalent time, at least 0.5. α_v outside 0.025 to 0.25 is for the caller to decide. */
export const ventilationWeight = defineMethod({
  id: 'burnout.ventilation-weight-2002',
  version: 1,
  title: 'Ventilation factor of the equivalent time',
  symbol: 'w_f',
  unit: '',
  inputs: {
    H: { symbol: 'H', unit: 'm', quantity: 'Height of the room', valid: [0.1, 100] },
    alpha_v: { symbol: 'α_v', unit: '', quantity: 'Outside wall openings over floor', valid: [0.025, 0.25] },
    alpha_h: { symbol: 'α_h', unit: '', quantity: 'Roof openings over floor', valid: [0, 1] },
  },
  equation: 'w_f = (6/H)^0.3 [0.62 + 90 (0.4 − α_v)⁴/(1 + b_v α_h)] ≥ 0.5;  b_v = 12.5 (1 + 10 α_v − α_v²) ≥ 10',
  sources: [en1991('Annex F, equation (F.3)'), dbSi('B.3 and B.5; all twenty cells of the printed table are met')],
  assumptions: ['Openings are those to the outside, broken glass counted.'],
  why: 'The general form; rooms under 100 m2 have a simpler variant.',
  outOfRange: 'refuse',
  outputs: {
    w_f: { symbol: 'w_f', unit: '', quantity: 'Ventilation factor' },
    b_v: { symbol: 'b_v', unit: '', quantity: 'Factor of roof openings' },
  },
  run({ H, alpha_v, alpha_h }) {
    const b_v = Math.max(10, 12.5 * (1 + 10 * alpha_v - alpha_v * alpha_v));
    // Powers written out: the last digit of a power differs between engines, and samples must not.
    const gap = (0.4 - alpha_v) * (0.4 - alpha_v);
    const w_f = portableExp(0.3 * portableLog(6 / H)) * (0.62 + (90 * gap * gap) / (1 + b_v * alpha_h));
    return { w_f: Math.max(0.5, w_f), b_v };
  },
});
