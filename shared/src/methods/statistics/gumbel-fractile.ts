import { defineMethod } from '../define-method.ts';
import { OutOfRangeError } from '../estimate.ts';
import { definition, en1991 } from '../sources.ts';
import { gumbelParameters } from './gumbel-parameters.ts';

/** Value that a share p of rooms of a use stays below, Gumbel distribution from mean and coefficient of variation. */
export const gumbelFractile = defineMethod({
  id: 'statistics.gumbel-fractile',
  version: 1,
  title: 'Fractile of a Gumbel distribution',
  symbol: 'q_p',
  unit: 'MJ/m2',
  inputs: {
    mean: { symbol: 'q_m', unit: 'MJ/m2', quantity: 'Mean', valid: [1e-9, Infinity] },
    V: { symbol: 'V', unit: '', quantity: 'Coefficient of variation', valid: [1e-9, 5] },
    p: { symbol: 'p', unit: '', quantity: 'Probability', valid: [1e-9, 1 - 1e-9] },
  },
  equation: 'β = 0.77970 V q_m;  u = q_m − 0.57722 β;  q_p = u − β ln(−ln p)',
  sources: [
    en1991('Table E.4: its 80 % values are these with V = 0.30'),
    definition('type I extreme value distribution'),
  ],
  assumptions: [],
  why: 'It reproduces every 80 % value of the table.',
  outOfRange: 'refuse',
  run({ mean, V, p }) {
    const { u, beta } = gumbelParameters(mean, V);
    const fractile = u - beta * Math.log(-Math.log(p));
    if (fractile < 0)
      throw new OutOfRangeError(
        'With so large a spread this distribution goes below zero here: check V or use the lognormal one.',
      );
    return fractile;
  },
});
