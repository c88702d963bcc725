import { defineMethod } from '../define-method.ts';
import { recalled } from '../sources.ts';

const NOT_A_SUPPLY = 'A survey of what was used or a rule of thumb; never a required supply.';
const area = { symbol: 'A', unit: 'm2', quantity: 'Area on fire' } as const;

/** Flow that brigades were seen to use against the area on fire, L/min. */
export const observedFlowLondon = defineMethod({
  id: 'water.observed-sardqvist',
  version: 1,
  title: 'Flow that was used in London fires, Särdqvist and Holmstedt',
  symbol: 'F',
  unit: 'L/min',
  inputs: { A: { ...area, valid: [1, 5000] } },
  equation: 'F = 61 A^0.57',
  sources: [
    recalled('Särdqvist & Holmstedt, Water for manual fire suppression', 'non-residential fires, London', '2001'),
  ],
  assumptions: [NOT_A_SUPPLY],
  why: 'What was really used, beside what a heat balance says.',
  outOfRange: 'warn',
  run: ({ A }) => 61 * A ** 0.57,
});

/** Flow of the rule of Iowa for filling a room with steam, L/min. */
export const ruleOfIowa = defineMethod({
  id: 'water.rule-of-iowa',
  version: 1,
  title: 'Flow by the rule of Iowa, for about 30 seconds',
  symbol: 'F',
  unit: 'L/min',
  inputs: { V: { symbol: 'V', unit: 'm3', quantity: 'Volume of the room', valid: [1, 2000] } },
  equation: 'V in ft3 over 100 US gallons per minute: F = 1.3368 V',
  sources: [recalled('Royer & Nelson, Iowa State University', 'volume over 100', '1959')],
  assumptions: [NOT_A_SUPPLY, 'One closed room of ordinary size.'],
  why: 'Often quoted; it stands here with its origin and its limits.',
  outOfRange: 'warn',
  run: ({ V }) => ((V / 0.3048 ** 3) * 3.785411784) / 100,
});

/** Number of jets that were used against the area on fire. */
export const jetsUsed = defineMethod({
  id: 'water.jets-thomas',
  version: 1,
  title: 'Jets that were used, Thomas',
  symbol: 'N',
  unit: '',
  inputs: { A: { ...area, valid: [1, 30_000] } },
  equation: 'N = 0.33 √A',
  sources: [recalled('Thomas, Use of water in the extinction of large fires', 'large fires', '1959')],
  assumptions: [NOT_A_SUPPLY],
  why: 'The oldest survey of the three.',
  outOfRange: 'warn',
  run: ({ A }) => 0.33 * Math.sqrt(A),
});
