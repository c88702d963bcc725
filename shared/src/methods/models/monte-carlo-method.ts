import { recalled } from '../sources.ts';
import type { SpreadMethod } from './spread-method.ts';

export type SampledQuantity = 'total' | 'perFloor' | 'peak' | 'equivalentTime';

/** How a band from samples is made, for screens, prints and workings. */
export const MONTE_CARLO_METHOD: SpreadMethod<SampledQuantity> = {
  id: 'uncertainty.monte-carlo',
  version: 1,
  ref: 'uncertainty.monte-carlo@1',
  title: 'How sure it is, from samples',
  symbol: 'q_p',
  unit: 'MJ/m2',
  inputs: {
    N: { symbol: 'N', unit: '', quantity: 'Samples', valid: [1, 100_000] },
    seed: { symbol: 'seed', unit: '', quantity: 'Where the random numbers begin', valid: [0, Number.MAX_SAFE_INTEGER] },
  },
  outOfRange: 'warn',
  outputs: {
    total: { symbol: 'Q', unit: 'MJ', quantity: 'Heat kept in the room' },
    perFloor: { symbol: 'q_f', unit: 'MJ/m2', quantity: 'Fire load density' },
    peak: { symbol: 'Q_pk', unit: 'kW', quantity: 'Peak heat release' },
    equivalentTime: { symbol: 't_e', unit: 'min', quantity: 'Equivalent time of exposure as kept' },
  },
  equation:
    'Q = (1 + o) Σ f_i Σ M H ψ;  q_f = Q/A_f;  N times with every input drawn anew;  x_p = x_(⌈pN⌉) in ascending order',
  why: 'Inputs that are multiplied, lopsided or shared by many entries are taken as they are, not only to first order.',
  sources: [
    recalled('JCGM 101, Propagation of distributions using a Monte Carlo method', '5.9, 7', '2008'),
    recalled('Blackman & Vigna, Scrambled linear pseudorandom number generators', 'xoshiro128** 1.1', '2021'),
    recalled('Wichura, Algorithm AS 241, Applied Statistics 37, 477', 'normal quantile', '1988'),
  ],
  assumptions: [
    'Masses by how they are known: weighed 3 % (normal); counted 10 %, measured 20 %, estimated 30 %, hearsay 50 % (lognormal).',
    'One heat a material, triangular from its lowest over its stated to its highest value; moisture, where stated, ± 3 points.',
    'What a closed cabinet lets into the fire: triangular 0, 0.85, 1, one draw for each entry.',
    'Things overlooked: triangular 0, 5, 15 % of the load, one draw for the room.',
    'Floor area 1 %, openings 3 %, height 2 % (normal); plateau of the fuel 25 %, growth coefficient 30 % (lognormal).',
    'Where nothing else is said the spreads are our own choice from common practice.',
  ],
  limits: ['This is how well the amount is known, not how it changes from day to day.'],
};
