import type { Changes } from './change.ts';
import type { SurveyDocument } from './survey-document.ts';

/** A command that cannot be done: what is wrong in one sentence, and where, so that the message can stand there. */
export interface Refusal {
  readonly refused: true;
  /** SCREAMING_SNAKE, noun first: `ROOM_OVERLAPS`. */
  readonly code: string;
  readonly message: string;
  /** The field of the input the message belongs to, when there is one. */
  readonly field?: string;
  /** Rows the message is about. */
  readonly ids?: readonly string[];
}

export interface Done {
  readonly refused: false;
  readonly changes: Changes;
}

/**
 * One gesture. Pure: the document is not changed; ids and times come in with the input. One command = one change set =
 * one undo step.
 */
export type Command<Input> = (document: SurveyDocument, input: Input) => Done | Refusal;
