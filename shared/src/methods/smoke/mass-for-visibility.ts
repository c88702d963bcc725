import { defineMethod } from '../define-method.ts';
import { recalled } from '../sources.ts';
import { REFLECTING, SHINING, SPECIFIC_EXTINCTION } from './extinction.ts';

/** Mass that may burn before visibility falls to a distance, kg. */
export const massForVisibility = defineMethod({
  id: 'smoke.mass-for-visibility',
  version: 1,
  title: 'Mass burnt at which visibility falls to a distance',
  symbol: 'm_S',
  unit: 'kg',
  inputs: {
    V: { symbol: 'V', unit: 'm3', quantity: 'Volume', valid: [0.1, 1e7] },
    S: { symbol: 'S', unit: 'm', quantity: 'Visibility', valid: [1, 30] },
    y_s: { symbol: 'y_s', unit: 'kg/kg', quantity: 'Soot yield', valid: [1e-4, 0.3] },
    seen: { symbol: 'C', quantity: 'What is to be seen', choices: ['reflecting', 'shining'] },
  },
  equation: 'm_S = C V/(S · 8700 · y_s)',
  sources: [
    recalled(
      'Mulholland & Croarkin, Specific extinction coefficient of flame generated smoke',
      '8.7 ± 1.1 m2/g',
      '2000',
    ),
    { title: 'Lund University thesis on visibility, after Jin', locator: 'abstract: constants 3 and 8' },
  ],
  assumptions: ['Smoke mixed through the whole room, none leaves it. 10 m is usual, 5 m in small rooms.'],
  why: 'At the end of the oxygen visibility is always next to nothing; how little is enough says more.',
  outOfRange: 'refuse',
  run: ({ V, S, y_s, seen }) => ((seen === 'reflecting' ? REFLECTING : SHINING) * V) / (S * SPECIFIC_EXTINCTION * y_s),
});
