import { defineMethod } from '../define-method.ts';
import { OutOfRangeError } from '../estimate.ts';
import { definition } from '../sources.ts';

/** How far mass fractions may miss 1. */
export const MIXTURE_GAP = 0.005;

/** Heat of a mixture by mass, MJ/kg; net of nets or gross of grosses, never one of the other. */
export const mixture = defineMethod({
  id: 'heat.mixture',
  version: 1,
  title: 'Heat of a mixture',
  symbol: 'H',
  unit: 'MJ/kg',
  inputs: {
    f: { symbol: 'f_i', unit: 'kg/kg', quantity: 'Mass fraction', valid: [0, 1], list: true },
    H: { symbol: 'H_i', unit: 'MJ/kg', quantity: 'Heat of a part', valid: [0, 150], list: true },
  },
  equation: 'H = Σ f_i H_i/Σ f_i',
  sources: [definition('heats of a mixture add up by mass')],
  assumptions: ['Mass fractions add up to 1 within 0.5 %.', 'No heat of mixing; what does not burn counts with 0.'],
  why: 'Most things are made of more than one material.',
  outOfRange: 'refuse',
  run({ f, H }) {
    if (f.length === 0 || f.length !== H.length) throw new OutOfRangeError('Every part needs a mass and a heat.');
    const whole = f.reduce((sum, one) => sum + one, 0);
    if (!(Math.abs(whole - 1) <= MIXTURE_GAP + 1e-9))
      throw new OutOfRangeError('The mass fractions do not add up to 1 within 0.5 %.');
    return f.reduce((sum, one, i) => sum + one * H[i]!, 0) / whole;
  },
});
