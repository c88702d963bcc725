import type { RoomInput } from '../tally/room-input.ts';

/** One thing about a room that a question varies. */
export interface Lever {
  /** What it is, for sentences: `Width of Door 1`. */
  readonly title: string;
  /** The output of the question's method that names it. */
  readonly output: string;
  readonly unit: string;
  readonly now: number;
  readonly least: number;
  readonly most: number;
  /** The answer is pinned down to this. */
  readonly tolerance: number;
  readonly whole?: boolean;
  /** The room with it at another value. */
  readonly apply: (x: number) => RoomInput;
}
