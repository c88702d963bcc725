import { defineMethod } from '../define-method.ts';
import { en1991 } from '../sources.ts';

/** The lower of what fuel and openings can feed, kW. */
export const plateau = defineMethod({
  id: 'growth.plateau-2002',
  version: 1,
  title: 'Highest heat release rate the room allows',
  symbol: 'Q_max',
  unit: 'kW',
  inputs: {
    fuel: { symbol: 'Q_max,f', unit: 'kW', quantity: 'What the fuel can feed', valid: [0, Infinity] },
    openings: { symbol: 'Q_max,v', unit: 'kW', quantity: 'What the openings can feed', valid: [0, Infinity] },
  },
  equation: 'Q_max = min(Q_max,f ; Q_max,v)',
  sources: [en1991('E.4(7)-(8)')],
  assumptions: ['Without any opening only the fuel limits the rate; then the air in the room ends the fire first.'],
  why: 'A fire needs both.',
  outOfRange: 'refuse',
  run: ({ fuel, openings }) => Math.min(fuel, openings),
});
