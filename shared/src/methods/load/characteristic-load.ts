import { defineMethod } from '../define-method.ts';
import { en1991, recalled } from '../sources.ts';

/** 80 % value of a Gumbel distribution over its mean, per unit of coefficient of variation: (√6/π)(−ln(−ln 0.8) − 0.5772). */
const GUMBEL_80 = 0.7195;

/** Characteristic load per floor area from what was found: permanent at its expected value, variable at its 80 % value. */
export const characteristicLoad = defineMethod({
  id: 'load.characteristic',
  version: 1,
  title: 'Characteristic load',
  symbol: 'q_f,k',
  unit: 'MJ/m2',
  inputs: {
    fixed: { symbol: 'q_fixed', unit: 'MJ/m2', quantity: 'Fixed load per floor area', valid: [0, Infinity] },
    variable: {
      symbol: 'q_var',
      unit: 'MJ/m2',
      quantity: 'Stored and passing load per floor area',
      valid: [0, Infinity],
    },
    V: { symbol: 'V', unit: '', quantity: 'Coefficient of variation of the variable load', valid: [0, 2] },
    basis: {
      symbol: '',
      quantity: 'What the surveyed amount stands for',
      choices: ['as_surveyed', 'mean', 'peak_stock'],
    },
  },
  equation: 'q_f,k = q_fixed + q_var · (1 + 0.7195 V) when the survey is a mean; q_fixed + q_var otherwise',
  sources: [en1991('E.2.1'), recalled('Gumbel, Statistics of Extremes', '80 % value: mean (1 + 0.7195 V)')],
  assumptions: [
    'As surveyed: the day of the survey is taken as the characteristic state.',
    'Agreed maximum stock: the surveyed amount is not exceeded.',
  ],
  why: 'One day is neither a mean nor an 80 % value; a person says what it stands for and the figure says so.',
  outOfRange: 'warn',
  run: ({ fixed, variable, V, basis }) => fixed + variable * (basis === 'mean' ? 1 + GUMBEL_80 * V : 1),
});
