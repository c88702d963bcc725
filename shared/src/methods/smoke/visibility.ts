import { defineMethod } from '../define-method.ts';
import { recalled } from '../sources.ts';
import { FARTHEST_M, REFLECTING, SHINING, SPECIFIC_EXTINCTION } from './extinction.ts';

/** Visibility in a room filled evenly with soot, m; at most 30. */
export const visibility = defineMethod({
  id: 'smoke.visibility',
  version: 1,
  title: 'Visibility',
  symbol: 'S',
  unit: 'm',
  inputs: {
    m: { symbol: 'm_soot', unit: 'kg', quantity: 'Soot in the room', valid: [0, 1e5] },
    V: { symbol: 'V', unit: 'm3', quantity: 'Volume', valid: [0.1, 1e7] },
  },
  equation: 'K = 8700 m_soot/V;  S = C/K, C = 3 for what reflects, 8 for what shines, at most 30 m;  OD = K/2.303',
  sources: [
    { title: 'Lund University thesis on visibility, after Jin', locator: 'abstract: constants 3 and 8' },
    recalled(
      'Mulholland & Croarkin, Specific extinction coefficient of flame generated smoke',
      '8.7 ± 1.1 m2/g',
      '2000',
    ),
  ],
  assumptions: ['Smoke mixed through the whole room. Tests of Jin: 5 to 15 m.'],
  why: 'It puts soot into a distance a person understands.',
  outOfRange: 'refuse',
  outputs: {
    extinction: { symbol: 'K', unit: '1/m', quantity: 'Extinction' },
    density: { symbol: 'OD', unit: '1/m', quantity: 'Optical density, base 10' },
    reflecting: { symbol: 'S_3', unit: 'm', quantity: 'Visibility of what reflects' },
    shining: { symbol: 'S_8', unit: 'm', quantity: 'Visibility of what shines' },
  },
  run({ m, V }) {
    const extinction = (SPECIFIC_EXTINCTION * m) / V;
    const seen = (constant: number): number =>
      extinction * FARTHEST_M > constant ? constant / extinction : FARTHEST_M;
    return {
      extinction,
      density: extinction / Math.LN10,
      reflecting: seen(REFLECTING),
      shining: seen(SHINING),
    };
  },
});
