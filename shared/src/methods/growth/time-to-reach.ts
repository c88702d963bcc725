import { defineMethod } from '../define-method.ts';
import { en1991 } from '../sources.ts';

/** Time at which the growing fire reaches a heat release rate, s. Holds up to the end of growth; callers see to it. */
export const timeToReach = defineMethod({
  id: 'growth.time-to-reach',
  version: 1,
  title: 'Time to reach a heat release rate',
  symbol: 't',
  unit: 's',
  inputs: {
    Q: { symbol: 'Q', unit: 'kW', quantity: 'Heat release rate to reach', valid: [0, Infinity] },
    alpha: { symbol: 'α', unit: 'kW/s2', quantity: 'Growth coefficient', valid: [1e-9, Infinity] },
  },
  equation: 't = √(Q/α)',
  sources: [en1991('E.4(2), solved for t')],
  assumptions: ['Counted from established burning; smouldering before it is left out.'],
  why: 'Inside the growth phase it is exact for the design curve.',
  outOfRange: 'refuse',
  run: ({ Q, alpha }) => Math.sqrt(Q / alpha),
});
