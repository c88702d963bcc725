import type { KeptSet } from './kept-set.ts';

/** Where unsent change sets of one person wait. Rejects when the device will not store. */
export interface Outbox {
  /** All sets of a survey, in the order they were made. */
  load(surveyId: string): Promise<readonly KeptSet[]>;
  put(surveyId: string, set: KeptSet): Promise<void>;
  remove(surveyId: string, id: string): Promise<void>;
}
