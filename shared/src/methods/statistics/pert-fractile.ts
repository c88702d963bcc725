import { defineMethod } from '../define-method.ts';
import { OutOfRangeError } from '../estimate.ts';
import { recalled } from '../sources.ts';
import { incompleteBeta } from './incomplete-beta.ts';

const HALVINGS = 60;

/** Mean, standard deviation and fractile of a PERT distribution, in the unit of its bounds. */
export const pertFractile = defineMethod({
  id: 'statistics.pert-fractile',
  version: 1,
  title: 'PERT distribution',
  symbol: 'q_p',
  unit: '',
  inputs: {
    a: { symbol: 'a', unit: '', quantity: 'Lowest', valid: [-1e9, 1e9] },
    m: { symbol: 'm', unit: '', quantity: 'Likeliest', valid: [-1e9, 1e9] },
    b: { symbol: 'b', unit: '', quantity: 'Highest', valid: [-1e9, 1e9] },
    p: { symbol: 'p', unit: '', quantity: 'Share below', valid: [0, 1] },
  },
  equation:
    'α = 1 + 4 (m − a)/(b − a);  β = 1 + 4 (b − m)/(b − a);  mean (a + 4m + b)/6;  variance (mean − a)(b − mean)/7;  I((q_p − a)/(b − a); α, β) = p',
  sources: [recalled('Vose, Risk Analysis', 'PERT as a beta distribution')],
  assumptions: ['a ≤ m ≤ b. Where all are one, there is no spread.'],
  why: 'It leans on the likeliest value more than the triangular one and has no corner.',
  outOfRange: 'refuse',
  outputs: {
    alpha: { symbol: 'α', unit: '', quantity: 'First shape' },
    beta: { symbol: 'β', unit: '', quantity: 'Second shape' },
    mean: { symbol: 'μ', unit: '', quantity: 'Mean' },
    deviation: { symbol: 'σ', unit: '', quantity: 'Standard deviation' },
    fractile: { symbol: 'q_p', unit: '', quantity: 'Fractile' },
  },
  run({ a, m, b, p }) {
    if (!(a <= m && m <= b)) throw new OutOfRangeError('Lowest, likeliest and highest are not in order.');
    const width = b - a;
    const lean = width > 0 ? (m - a) / width : 0.5;
    const alpha = 1 + 4 * lean;
    const beta = 1 + 4 * (1 - lean);
    const mean = (a + 4 * m + b) / 6;
    const deviation = Math.sqrt(Math.max(0, (mean - a) * (b - mean)) / 7);
    let low = 0;
    let high = 1;
    for (let i = 0; i < HALVINGS; i += 1) {
      const middle = (low + high) / 2;
      if (incompleteBeta(middle, alpha, beta) < p) low = middle;
      else high = middle;
    }
    return { alpha, beta, mean, deviation, fractile: a + (width * (low + high)) / 2 };
  },
});
