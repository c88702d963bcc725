import type { Estimate } from '../methods/estimate.ts';
import type { Sight } from './search-change.ts';

/** What a question is answered with: a number with its working, or `never` with why there is none in the range. */
export interface Answer {
  readonly estimate: Estimate;
  /** The readings on both sides of the answer; without an answer, those at both ends of the search. */
  readonly before: Sight;
  readonly after: Sight;
  /** The unit of the number behind the readings. */
  readonly readingUnit: string;
}
