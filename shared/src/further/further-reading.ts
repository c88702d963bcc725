import { OutOfRangeError, type Estimate } from '../methods/estimate.ts';
import type { RoomBasis } from '../tally/room-basis.ts';
import type { RoomInput } from '../tally/room-input.ts';
import type { RoomTally } from '../tally/room-tally.ts';
import type { FurtherAsked } from './further-asked.ts';

export type FurtherTopic =
  | 'load'
  | 'openings'
  | 'one fire'
  | 'large room'
  | 'smoke'
  | 'burn-out'
  | 'next door'
  | 'goods'
  | 'sprinklers'
  | 'water';

/** What the readings are made from. */
export interface FurtherGiven {
  readonly input: RoomInput;
  readonly tally: RoomTally;
  readonly basis: RoomBasis;
  readonly asked: FurtherAsked;
}

export interface NamedReading {
  readonly name: string;
  readonly estimate: Estimate;
}

/** Numbers of methods that stand beside the tally: variants and further looks, never used in it. */
export interface FurtherReading {
  readonly id: string;
  readonly topic: FurtherTopic;
  readonly title: string;
  /** What it is for and how it differs from the tally. */
  readonly note: string;
  /** Empty where it does not apply. */
  readonly numbers: readonly NamedReading[];
  /** Why it does not apply, or which input it needs. */
  readonly why?: string;
}

type About = Pick<FurtherReading, 'id' | 'topic' | 'title' | 'note'>;

/**
 * A reading made where it can be. A method that refuses its inputs is no fault here: what it says is why there is no
 * number.
 *
 * @param make the numbers, or why there are none
 */
export function readingOf(about: About, make: () => readonly NamedReading[] | string): FurtherReading {
  try {
    const made = make();
    return typeof made === 'string' ? { ...about, numbers: [], why: made } : { ...about, numbers: made };
  } catch (error) {
    if (!(error instanceof OutOfRangeError)) throw error;
    return { ...about, numbers: [], why: error.message.replace(/^[\w.-]+@\d+: /, '') };
  }
}
