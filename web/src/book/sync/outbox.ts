import type { Step } from '../session/history.ts';
import type { KeptSet } from './kept-set.ts';

/** Where unsent change sets of one person wait, and their way back. Rejects when the device will not store. */
export interface Outbox {
  /** All sets of a survey, in the order they were made. */
  load(surveyId: string): Promise<readonly KeptSet[]>;
  put(surveyId: string, set: KeptSet): Promise<void>;
  remove(surveyId: string, id: string): Promise<void>;
  /** This person's last steps in a survey, so that undo survives a reload. */
  loadSteps(surveyId: string): Promise<readonly Step[]>;
  putSteps(surveyId: string, steps: readonly Step[]): Promise<void>;
}
