import { defineMethod } from '../define-method.ts';
import { OutOfRangeError } from '../estimate.ts';
import { definition } from '../sources.ts';

/** Mean, standard deviation and fractile of a triangular distribution, in the unit of its bounds. */
export const triangularFractile = defineMethod({
  id: 'statistics.triangular-fractile',
  version: 1,
  title: 'Triangular distribution',
  symbol: 'q_p',
  unit: '',
  inputs: {
    a: { symbol: 'a', unit: '', quantity: 'Lowest', valid: [-1e9, 1e9] },
    m: { symbol: 'm', unit: '', quantity: 'Likeliest', valid: [-1e9, 1e9] },
    b: { symbol: 'b', unit: '', quantity: 'Highest', valid: [-1e9, 1e9] },
    p: { symbol: 'p', unit: '', quantity: 'Share below', valid: [0, 1] },
  },
  equation:
    'mean (a + m + b)/3;  variance (a² + b² + m² − ab − am − bm)/18;  q_p = a + √(p (b − a)(m − a)), p < (m − a)/(b − a), else b − √((1 − p)(b − a)(b − m))',
  sources: [definition('triangular distribution')],
  assumptions: ['a ≤ m ≤ b. Where all are one, there is no spread.'],
  why: 'Three numbers are what a person can name from experience.',
  outOfRange: 'refuse',
  outputs: {
    mean: { symbol: 'μ', unit: '', quantity: 'Mean' },
    deviation: { symbol: 'σ', unit: '', quantity: 'Standard deviation' },
    fractile: { symbol: 'q_p', unit: '', quantity: 'Fractile' },
  },
  run({ a, m, b, p }) {
    if (!(a <= m && m <= b)) throw new OutOfRangeError('Lowest, likeliest and highest are not in order.');
    const variance = (a * a + b * b + m * m - a * b - a * m - b * m) / 18;
    const below = p * (b - a) < m - a;
    return {
      mean: (a + m + b) / 3,
      deviation: Math.sqrt(Math.max(0, variance)),
      fractile: below ? a + Math.sqrt(p * (b - a) * (m - a)) : b - Math.sqrt((1 - p) * (b - a) * (b - m)),
    };
  },
});
