import type { MethodInputs, MethodOutput, MethodSummary } from '../define-method.ts';
import { recalled } from '../sources.ts';

/** A question is a search over the book's own methods: it has no relation of its own. */
export interface QuestionMethod extends MethodSummary {
  readonly outputs: Readonly<Record<string, MethodOutput>>;
}

const SOURCES: MethodSummary['sources'] = [
  recalled('Burden & Faires, Numerical analysis', 'bisection: a change of sign is halved until it is narrow enough'),
  { title: 'The methods of the tally', locator: 'every reading between the ends is made by them, as in the tally' },
];
const RANGE: MethodInputs = {
  from: { symbol: 'x_0', unit: '', quantity: 'Where the search begins', valid: [0, 1e6] },
  to: { symbol: 'x_1', unit: '', quantity: 'Where it ends', valid: [0, 1e6] },
};
const STEPS = 'Steps first, then the step with the change is halved until it is as narrow as the tolerance.';
const BETWEEN = 'A change and its reversal within one step stay unseen.';
const shared = {
  version: 1,
  inputs: RANGE,
  sources: SOURCES,
  outOfRange: 'refuse',
} as const;

/** How many, or how much, of one thing fits under a bound. */
export const HOW_MANY_METHOD: QuestionMethod = {
  ...shared,
  id: 'question.how-many',
  ref: 'question.how-many@1',
  title: 'How many more fit under a bound',
  symbol: 'n',
  unit: '',
  outputs: {
    pieces: { symbol: 'n', unit: '', quantity: 'Further pieces' },
    mass: { symbol: 'Δm', unit: 'kg', quantity: 'Further mass' },
  },
  equation: 'largest n with reading(contents + n pieces) ≤ bound',
  assumptions: [
    'The pieces stand together as one further entry, kept open and stored; their peaks and footprints add up.',
    'The first count at which the bound is passed ends the answer, even where a larger one would keep it again.',
    BETWEEN,
  ],
  why: 'The tally is worked out anew for every count tried, so steps and jumps of its methods are in the answer.',
};

/** What opening, or what height, would change a reading. */
export const WHAT_CHANGES_METHOD: QuestionMethod = {
  ...shared,
  id: 'question.what-changes',
  ref: 'question.what-changes@1',
  title: 'What would change a reading',
  symbol: 'x',
  unit: 'm',
  outputs: {
    width: { symbol: 'w', unit: 'm', quantity: 'Width of the opening' },
    openingHeight: { symbol: 'h', unit: 'm', quantity: 'Height of the opening' },
    alike: { symbol: 'n', unit: '', quantity: 'Openings of this size' },
    roomHeight: { symbol: 'H', unit: 'm', quantity: 'Height of the room' },
    storageHeight: { symbol: 'h_s', unit: 'm', quantity: 'Height of the goods' },
  },
  equation: 'first x from x_0 towards x_1 with reading(x) ≠ reading(x_0)',
  assumptions: [STEPS, 'Everything else stays as recorded.', BETWEEN],
  why: 'Readings change in leaps where a method ends or another one takes over; halving finds the place of a leap as well.',
};
