import { defineMethod } from '../define-method.ts';
import { definition } from '../sources.ts';

/** Heat of a run of cables, MJ. */
export const cableRun = defineMethod({
  id: 'storage.cable-run',
  version: 1,
  title: 'Heat of cables',
  symbol: 'Q',
  unit: 'MJ',
  inputs: {
    L: { symbol: 'L', unit: 'm', quantity: 'Length', valid: [0, 1e6] },
    n: { symbol: 'n', unit: '', quantity: 'Number of cables', valid: [0, 1e5] },
    m: { symbol: 'm′', unit: 'kg/m', quantity: 'Non-metal per metre of one cable', valid: [0, 20] },
    H: { symbol: 'H_u', unit: 'MJ/kg', quantity: 'Net heat of the non-metal', valid: [5, 45] },
  },
  equation: 'Q = L n m′ H_u',
  sources: [definition('mass times heat; manufacturers state kg/m or MJ/m')],
  assumptions: ['Metal does not count: heat per kg of whole cable is three times lower.'],
  why: 'Trays are a fixed load that nobody carries in and nobody sees.',
  outOfRange: 'refuse',
  run: ({ L, n, m, H }) => L * n * m * H,
});
