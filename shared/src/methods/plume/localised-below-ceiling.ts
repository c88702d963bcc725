import { defineMethod } from '../define-method.ts';
import { en1991 } from '../sources.ts';

const HOTTEST = 900;

/** Gas temperature on the axis of a fire whose flame does not reach the ceiling, °C. */
export const localisedBelowCeiling = defineMethod({
  id: 'plume.localised-below-ceiling-2002',
  version: 1,
  title: 'Localised fire, flame below the ceiling',
  symbol: 'Θ(z)',
  unit: '°C',
  inputs: {
    Q: { symbol: 'Q', unit: 'W', quantity: 'Heat release rate', valid: [1, 50e6] },
    D: { symbol: 'D', unit: 'm', quantity: 'Diameter of the fire', valid: [0.01, 10] },
    z: { symbol: 'z', unit: 'm', quantity: 'Height on the axis', valid: [0, 100] },
  },
  equation:
    'L_f = −1.02 D + 0.0148 Q^(2/5);  z_0 = −1.02 D + 0.00524 Q^(2/5);  Θ(z) = 20 + 0.25 (0.8 Q)^(2/3) (z − z_0)^(−5/3) ≤ 900',
  sources: [en1991('Annex C, equations (C.1) to (C.3), after Heskestad')],
  assumptions: ['80 % of the rate goes into the plume. For a ceiling below L_f the other relation applies.'],
  why: 'In large halls one stack burns while the rest of the air stays cool.',
  outOfRange: 'refuse',
  outputs: {
    flame: { symbol: 'L_f', unit: 'm', quantity: 'Flame length' },
    origin: { symbol: 'z_0', unit: 'm', quantity: 'Virtual origin' },
    temperature: { symbol: 'Θ(z)', unit: '°C', quantity: 'Gas temperature' },
  },
  run({ Q, D, z }) {
    const flame = Math.max(0, -1.02 * D + 0.0148 * Q ** 0.4);
    const origin = -1.02 * D + 0.00524 * Q ** 0.4;
    const rise = z > origin ? 0.25 * (0.8 * Q) ** (2 / 3) * (z - origin) ** (-5 / 3) : Infinity;
    return { flame, origin, temperature: Math.min(HOTTEST, 20 + rise) };
  },
});
