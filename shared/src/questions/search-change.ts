/** What a room is like at one value of what is varied. */
export interface Sight {
  readonly x: number;
  /** The reading in words; a change of it is what is looked for. */
  readonly state: string;
  /** The number behind it; null where there is none. */
  readonly value: number | null;
}

export interface SearchRange {
  /** Where the search begins, and where it ends: below or above. */
  readonly from: number;
  readonly to: number;
  /** The change is pinned down to this width; 1 with `whole`. */
  readonly tolerance: number;
  /** Whole numbers only. */
  readonly whole?: boolean;
  /** `even`: 32 equal steps. `doubling`: 1, 2, 4 … tolerances, for counts and masses without a natural end. */
  readonly steps?: 'even' | 'doubling';
}

export interface Change {
  /** The last value at which the reading is as at the start, and the first one found at which it is not. */
  readonly before: Sight;
  readonly after: Sight;
  /** The number behind the reading leaps between the two, however near they lie. */
  readonly jump: boolean;
  /** How often the reading changes again further on, as far as the steps show. */
  readonly further: number;
  readonly looks: number;
}

export interface NoChange {
  readonly start: Sight;
  readonly end: Sight;
  readonly looks: number;
}

export type SearchResult = ({ readonly found: true } & Change) | ({ readonly found: false } & NoChange);

const EVEN_STEPS = 32;
const MOST_HALVINGS = 80;
/** A leap: more than this share of the number within the tolerance. */
const JUMP = 0.01;

/**
 * Looks for the first change of a reading from a start towards an end: steps until it differs, then halves the step until
 * it is no wider than the tolerance. Halving needs no slope, so leaps of the number behind the reading do no harm. A
 * change and its reversal within one step stay unseen.
 *
 * @param look reads the room at a value between the two ends
 * @param wanted looks for this reading instead of any change
 */
export function searchChange(
  range: SearchRange,
  look: (x: number) => Omit<Sight, 'x'>,
  wanted?: (state: string) => boolean,
): SearchResult {
  let looks = 0;
  const at = (x: number): Sight => {
    looks += 1;
    return { x, ...look(x) };
  };
  const start = at(range.from);
  const isReached = wanted ?? ((state: string) => state !== start.state);
  if (wanted?.(start.state)) return { found: false, start, end: start, looks };
  let last = start;
  let found: Omit<Change, 'further' | 'looks'> | undefined;
  let further = 0;
  for (const x of stepsOf(range)) {
    const next = at(x);
    if (found) {
      if (next.state !== last.state) further += 1;
    } else if (isReached(next.state)) {
      found = pinDown(range, last, next, at, isReached);
    }
    last = next;
  }
  return found ? { found: true, ...found, further, looks } : { found: false, start, end: last, looks };
}

/** Every step after the start, the end among them. */
function stepsOf({ from, to, tolerance, whole, steps }: SearchRange): number[] {
  const sign = Math.sign(to - from);
  const length = Math.abs(to - from);
  if (!(length > 0)) return [];
  const offsets: number[] = [];
  if (steps === 'doubling') {
    for (let step = tolerance; step < length; step *= 2) offsets.push(step);
  } else {
    for (let k = 1; k < EVEN_STEPS; k += 1) {
      const offset = whole ? Math.round((length * k) / EVEN_STEPS) : (length * k) / EVEN_STEPS;
      if (offset > (offsets.at(-1) ?? 0) && offset < length) offsets.push(offset);
    }
  }
  return [...offsets.map((offset) => from + sign * offset), to];
}

function pinDown(
  { tolerance, whole }: SearchRange,
  low: Sight,
  high: Sight,
  at: (x: number) => Sight,
  isReached: (state: string) => boolean,
): Omit<Change, 'further' | 'looks'> {
  const width = whole ? 1 : tolerance;
  let [before, after] = [low, high];
  // One part in a million million: what is left is the rounding of the two ends.
  for (let k = 0; k < MOST_HALVINGS && Math.abs(after.x - before.x) > width * (1 + 1e-12); k += 1) {
    const middle = (before.x + after.x) / 2;
    const next = at(whole ? Math.trunc(middle) : middle);
    if (isReached(next.state)) after = next;
    else before = next;
  }
  const leap =
    before.value === null || after.value === null
      ? false
      : Math.abs(after.value - before.value) > JUMP * Math.max(Math.abs(before.value), Math.abs(after.value));
  return { before, after, jump: !whole && leap };
}
