import { defineMethod } from '../define-method.ts';
import { recalled } from '../sources.ts';

const SMALL_SPILL_L = 95;

/** Area of a liquid that runs out on a hard floor, m², at most that of the bund. */
export const spillArea = defineMethod({
  id: 'pool.spill-area',
  version: 1,
  title: 'Area of a spill',
  symbol: 'A',
  unit: 'm2',
  inputs: {
    V: { symbol: 'V', unit: 'L', quantity: 'Volume', valid: [0, 1e6] },
    A_bund: { symbol: 'A_bund', unit: 'm2', quantity: 'Area of bund, tray or room', valid: [0.01, 1e6] },
  },
  equation: 'A = min(A_bund ; 1.4 V), V < 95 L;  min(A_bund ; 0.36 V) above',
  sources: [
    recalled(
      'Gottuk & White, SFPE Handbook of Fire Protection Engineering',
      'liquid fuel fires, spill area per volume',
    ),
  ],
  assumptions: [
    'Level, smooth floor. The relation steps down at 95 L, as its source has it: show both areas near there.',
  ],
  why: 'What runs out burns over a far larger area than its can.',
  outOfRange: 'refuse',
  run: ({ V, A_bund }) => Math.min(A_bund, (V < SMALL_SPILL_L ? 1.4 : 0.36) * V),
});
