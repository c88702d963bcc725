import { limitUnits } from '../limits/limit-units.ts';
import { limitNames } from '../limits/limit-names.ts';
import { standingOf, type Standing } from '../limits/standing.ts';
import { figure } from '../methods/figure.ts';
import type { WorkingInput, WorkingStep } from '../methods/working.ts';
import { estimateRoom } from '../tally/estimate-room.ts';
import type { RoomInput, RoomInputEntry, RoomInputLimit } from '../tally/room-input.ts';
import type { Answer } from './answer.ts';
import { questionEstimate } from './question-estimate.ts';
import { HOW_MANY_METHOD } from '../methods/models/question-method.ts';
import { searchChange, type Sight } from './search-change.ts';

export interface HowMany {
  /** One piece; with `by: 'mass'` one piece of 1 kg. */
  readonly further: RoomInputEntry;
  readonly by: 'pieces' | 'mass';
  readonly limit: Pick<RoomInputLimit, 'quantity' | 'bound'>;
  /** `within`: the standing stays within, below 90 % of the bound. `not over`: up to the bound itself. */
  readonly keep: 'within' | 'not over';
}

const KEEPS = 'keeps to it';
const PASSES = 'passes it';
const NOT_COVERED = 'cannot be told';
const MOST = { pieces: 100_000, mass: 1_000_000 } as const;
const TOLERANCE = { pieces: 1, mass: 0.001 } as const;
const ADMITTED: Readonly<Record<HowMany['keep'], readonly Standing[]>> = {
  within: ['within'],
  'not over': ['within', 'near'],
};

/**
 * How many further pieces, or how many kilograms, the room can take before a bound is passed, up to 100,000 pieces or
 * 1,000,000 kg. The answer is the largest amount that keeps to the bound; `never` when the bound is passed already, when
 * the amount is without effect, or when what is bounded cannot be computed.
 */
export function howManyMore(input: RoomInput, question: HowMany): Answer {
  const { further, by, limit, keep } = question;
  const unit = limitUnits[limit.quantity];
  const range = {
    from: 0,
    to: MOST[by],
    tolerance: TOLERANCE[by],
    steps: 'doubling' as const,
    ...(by === 'pieces' && { whole: true }),
  };
  const held: RoomInput = { ...input, limits: [limit] };
  const look = (x: number): Omit<Sight, 'x'> => {
    const room = x === 0 ? held : { ...held, contents: [...input.contents, amountOf(further, x, by)] };
    const value = estimateRoom(room, { spread: false }).limits[0]?.value?.value ?? null;
    if (value === null) return { state: x === 0 ? KEEPS : NOT_COVERED, value };
    return { state: ADMITTED[keep].includes(standingOf(value, limit.bound)) ? KEEPS : PASSES, value };
  };
  const result = searchChange(range, look, (state) => state !== KEEPS);
  const [before, after] = result.found ? [result.before, result.after] : [result.start, result.end];
  const never = whyNone(question, result.found, before, after, unit);
  const estimate = questionEstimate(HOW_MANY_METHOD, by, {
    value: never === undefined ? before.x : null,
    ...(never !== undefined && { never }),
    warnings: [],
    inputs: inputsOf(input, question, unit),
    steps: [
      ...(result.found ? [before, after] : [after]).map((sight) => stepOf(sight, question, unit)),
      { text: 'Times the tally was worked out', value: result.looks, unit: '' },
    ],
  });
  return { estimate, before, after, readingUnit: unit };
}

/** Several pieces together: masses by count, peak and footprint grown with them. A kilogram more is a larger piece. */
function amountOf(further: RoomInputEntry, amount: number, by: HowMany['by']): RoomInputEntry {
  if (by === 'mass') {
    return { ...further, parts: further.parts.map((part) => ({ ...part, mass_kg: part.mass_kg * amount })) };
  }
  return {
    ...further,
    count: further.count * amount,
    ...(further.peak_kW == null ? {} : { peak_kW: further.peak_kW * amount }),
    ...(further.width_m == null ? {} : { width_m: further.width_m * amount }),
  };
}

function whyNone(
  { keep, limit, by }: HowMany,
  found: boolean,
  before: Sight,
  after: Sight,
  unit: string,
): string | undefined {
  const bound = `${figure(limit.bound)} ${unit}`;
  if (!found && after.x === 0) {
    const share =
      keep === 'within' && (before.value ?? 0) <= limit.bound ? `is at 90 % of ${bound} or above` : `is over ${bound}`;
    return `No answer: ${limitNames[limit.quantity].toLowerCase()} ${share} already.`;
  }
  if (after.state === NOT_COVERED) return 'No answer: what this bound is set on cannot be computed for the room.';
  if (found) return undefined;
  return `No answer up to ${figure(after.x)} ${by === 'mass' ? 'kg' : 'pieces'}: none of them brings the room to ${bound}.`;
}

function stepOf({ x, state, value }: Sight, { by, limit }: HowMany, unit: string): WorkingStep {
  const amount = by === 'mass' ? `${figure(x)} kg more` : `${figure(x)} more`;
  return { text: `With ${amount} the room ${state}. ${limitNames[limit.quantity]}`, value, unit };
}

function inputsOf(input: RoomInput, { further, by, limit, keep }: HowMany, unit: string): WorkingInput[] {
  const mass = further.count * further.parts.reduce((sum, part) => sum + part.mass_kg, 0);
  return [
    {
      name: 'further',
      symbol: '',
      quantity: 'What is added',
      unit: '',
      value: further.label ?? further.id,
      origin: 'given',
    },
    ...(by === 'pieces'
      ? [
          {
            name: 'mass',
            symbol: 'm_1',
            quantity: 'Mass of one',
            unit: 'kg',
            value: mass,
            origin: 'catalogue',
          } as const,
        ]
      : []),
    {
      name: 'contents',
      symbol: 'n_0',
      quantity: 'Entries already recorded',
      unit: '',
      value: input.contents.length,
      origin: 'given',
    },
    { name: 'bound', symbol: 'bound', quantity: limitNames[limit.quantity], unit, value: limit.bound, origin: 'given' },
    {
      name: 'keep',
      symbol: '',
      quantity: 'What shall be kept',
      unit: '',
      value: keep === 'within' ? 'within: below 90 % of the bound' : 'not over: up to the bound',
      origin: 'given',
    },
    {
      name: 'to',
      symbol: 'x_1',
      quantity: 'Where the search ends',
      unit: by === 'mass' ? 'kg' : '',
      value: MOST[by],
      origin: 'default',
    },
  ];
}
