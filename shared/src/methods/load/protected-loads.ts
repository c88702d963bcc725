import { defineMethod } from '../define-method.ts';
import { figure } from '../figure.ts';
import { en1991 } from '../sources.ts';

/**
 * Variant: what counts of loads in containers that stay whole but are not rated, MJ: the largest single one, and at
 * least 10 % of all of them; the rest counts 0.
 */
export const protectedLoads = defineMethod({
  id: 'load.protected-2002',
  version: 1,
  title: 'Protected loads, EN 10 % rule',
  symbol: 'Q_protected',
  unit: 'MJ',
  inputs: {
    Q: { symbol: 'Q_i', unit: 'MJ', quantity: 'Heat in one container', valid: [0, Infinity], list: true },
  },
  equation: 'max(max Q_i ; 0.10 Σ Q_i)',
  sources: [en1991('E.2.3(3)-(4)')],
  assumptions: ['A person confirms that the load that counts cannot heat the rest to ignition.'],
  why: 'Only when asked for: the default 0.85 needs no heat balance.',
  outOfRange: 'refuse',
  run: ({ Q }) =>
    Math.max(
      0,
      Q.reduce((a, b) => Math.max(a, b), 0),
      0.1 * Q.reduce((a, b) => a + b, 0),
    ),
  explain: ({ Q }) => [
    { text: `${Q.length} containers hold`, value: Q.reduce((a, b) => a + b, 0), unit: 'MJ' },
    { text: `largest ${figure(Q.reduce((a, b) => Math.max(a, b), 0))} MJ, a tenth of all together is the least` },
  ],
});
