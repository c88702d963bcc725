import { defineMethod } from '../define-method.ts';
import { dbSi, en1991 } from '../sources.ts';

/** Design fire load density q_f,d, MJ/m² of floor. */
export const designLoad = defineMethod({
  id: 'load.design-2002',
  version: 1,
  title: 'Design fire load',
  symbol: 'q_f,d',
  unit: 'MJ/m2',
  inputs: {
    q_fk: { symbol: 'q_f,k', unit: 'MJ/m2', quantity: 'Characteristic load per floor area', valid: [0, Infinity] },
    m: { symbol: 'm', unit: '', quantity: 'Combustion factor', valid: [0, 1] },
    delta_q1: { symbol: 'δ_q1', unit: '', quantity: 'Factor for the size of the compartment', valid: [1, 2.13] },
    delta_q2: { symbol: 'δ_q2', unit: '', quantity: 'Factor for the danger of activation', valid: [0.5, 3] },
    delta_n: { symbol: 'Π δ_n', unit: '', quantity: 'Product of the factors for protection', valid: [0.1, 3.375] },
  },
  equation: 'q_f,d = q_f,k · m · δ_q1 · δ_q2 · Π δ_n',
  sources: [en1991('E.1(3), equation (E.1)'), dbSi('B.4, equation (B.7)')],
  assumptions: [
    'The δ are reliability factors for structural design, not a forecast of the fire.',
    'Annex E is informative; several countries replace or forbid it.',
  ],
  why: 'It is the value burn-out checks of structures are made with; the load as kept always stands before it.',
  outOfRange: 'warn',
  run: ({ q_fk, m, delta_q1, delta_q2, delta_n }) => q_fk * m * delta_q1 * delta_q2 * delta_n,
});
