import { defineMethod } from '../define-method.ts';
import { dbSi, en1991 } from '../sources.ts';

const NODES = [
  [25, 1.1],
  [250, 1.5],
  [2500, 1.9],
  [5000, 2.0],
  [10_000, 2.13],
] as const;

/** Factor for the size of the fire compartment. Below 25 m² 1.10, from 10 000 m² 2.13. */
export const deltaQ1 = defineMethod({
  id: 'load.delta-q1-2002',
  version: 1,
  title: 'Factor for compartment size',
  symbol: 'δ_q1',
  unit: '',
  inputs: {
    A_f: { symbol: 'A_f', unit: 'm2', quantity: 'Floor area of the fire compartment', valid: [0, 10_000] },
    reading: { symbol: '', quantity: 'Between the rows of the table', choices: ['linear', 'step-up'] },
  },
  equation: 'A_f 25, 250, 2500, 5000, 10 000 m2: δ_q1 1.10, 1.50, 1.90, 2.00, 2.13',
  sources: [en1991('Table E.1'), dbSi('Table B.2, which states linear interpolation')],
  assumptions: ['A_f is the fire compartment, not the room, where rooms are not separated by rated construction.'],
  why: 'The table prints no rule between its rows; linear is stated elsewhere, the step up is the cautious variant.',
  outOfRange: 'warn',
  run({ A_f, reading }) {
    if (A_f <= NODES[0][0]) return NODES[0][1];
    for (let i = 1; i < NODES.length; i += 1) {
      const [to, high] = NODES[i]!;
      if (A_f > to) continue;
      const [from, low] = NODES[i - 1]!;
      return reading === 'step-up' ? high : low + ((high - low) * (A_f - from)) / (to - from);
    }
    return NODES[NODES.length - 1]![1];
  },
});
