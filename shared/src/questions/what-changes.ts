import type { EstimateWarning } from '../methods/estimate.ts';
import { figure } from '../methods/figure.ts';
import type { WorkingInput, WorkingStep } from '../methods/working.ts';
import { estimateRoom } from '../tally/estimate-room.ts';
import type { Answer } from './answer.ts';
import type { Lever } from './lever.ts';
import { questionEstimate } from './question-estimate.ts';
import { WHAT_CHANGES_METHOD } from '../methods/models/question-method.ts';
import { READINGS, type ReadingName } from './reading.ts';
import { searchChange, type SearchResult, type Sight } from './search-change.ts';

export type Direction = 'more' | 'less';

/**
 * From which value of the lever on a reading of the room is another one than now. The answer is the first value found at
 * which it is, to the lever's tolerance, and never a guess: where the reading stays, the answer says so with the range.
 */
export function whatChanges(lever: Lever, name: ReadingName, direction: Direction): Answer {
  const reading = READINGS[name];
  const to = direction === 'more' ? lever.most : lever.least;
  const range = { from: lever.now, to, tolerance: lever.tolerance, ...(lever.whole && { whole: true }) };
  const result = searchChange(range, (x) => reading.read(estimateRoom(lever.apply(x), { spread: false })));
  const [before, after] = result.found ? [result.before, result.after] : [result.start, result.end];
  const estimate = questionEstimate(WHAT_CHANGES_METHOD, lever.output, {
    value: result.found ? after.x : null,
    ...(!result.found && { never: whyNone(lever, to, reading.title, before.state) }),
    warnings: warningsOf(result, reading.unit),
    inputs: inputsOf(lever, to, reading.title),
    steps: [
      ...[before, after].map((sight) => stepOf(lever, sight, reading.unit)),
      { text: 'Times the tally was worked out', value: result.looks, unit: '' },
    ],
  });
  return { estimate, before, after, readingUnit: reading.unit };
}

function whyNone(lever: Lever, to: number, title: string, state: string): string {
  const unit = lever.unit === '' ? '' : ` ${lever.unit}`;
  if (lever.now === to) return `No answer: there is nothing to search, ${figure(to)}${unit} is where the range ends.`;
  const [low, high] = lever.now < to ? [lever.now, to] : [to, lever.now];
  return `No answer between ${figure(low)} and ${figure(high)}${unit}. ${title}: ${state}, all the way.`;
}

function stepOf(lever: Lever, { x, state, value }: Sight, unit: string): WorkingStep {
  const at = `${lever.title} ${figure(x)}${lever.unit === '' ? '' : ` ${lever.unit}`}: ${state}`;
  return value === null ? { text: `${at}.` } : { text: at, value, unit };
}

function warningsOf(result: SearchResult, unit: string): EstimateWarning[] {
  if (!result.found) return [];
  const { before, after } = result;
  return [
    ...(result.jump && before.value !== null && after.value !== null
      ? [
          {
            code: 'JUMP',
            text: `The number behind it leaps here, from ${figure(before.value)} to ${figure(after.value)} ${unit}: on either side hold to the worse one.`,
          },
        ]
      : []),
    ...(result.further > 0
      ? [
          {
            code: 'CHANGES_AGAIN',
            text: `Further on the reading changes ${result.further === 1 ? 'once' : `${result.further} times`} more; this is the first change.`,
          },
        ]
      : []),
  ];
}

function inputsOf(lever: Lever, to: number, title: string): WorkingInput[] {
  const number = (name: string, symbol: string, quantity: string, value: number, note?: string): WorkingInput => ({
    name,
    symbol,
    quantity,
    unit: lever.unit,
    value,
    origin: note === undefined ? 'given' : 'default',
    ...(note !== undefined && { note }),
  });
  return [
    { name: 'reading', symbol: '', quantity: 'What is watched', unit: '', value: title, origin: 'given' },
    number('from', 'x_0', `${lever.title}, as it is`, lever.now),
    number('to', 'x_1', 'Where the search ends', to, 'end of the range of this question'),
    number('tolerance', 'ε', 'Pinned down to', lever.tolerance, 'the grid of the plan'),
  ];
}
