import type { Changes } from '@embertally/shared/survey/change';
import type { SurveyDocument } from '@embertally/shared/survey/survey-document';
import { undoChanges } from '@embertally/shared/survey/undo-changes';
import type { Selected } from './book-state.ts';

/** One gesture that can be taken back. The selection travels with it, so that undo shows what it undid. */
export interface Step {
  readonly label: string;
  readonly changes: Changes;
  readonly selection: readonly Selected[];
}

/** What to apply to go one step back or forward, and what had to stay because somebody else changed it. */
export interface StepTaken {
  readonly label: string;
  readonly changes: Changes;
  readonly selection: readonly Selected[];
  readonly skipped: readonly string[];
}

export interface History {
  push(step: Step): void;
  undo(document: SurveyDocument): StepTaken | null;
  redo(document: SurveyDocument): StepTaken | null;
  /** What the next undo takes back, for the button; null when there is nothing. */
  nextUndo(): string | null;
  nextRedo(): string | null;
  clear(): void;
  /** Own steps, oldest first, to keep on the device. */
  steps(): readonly Step[];
  restore(steps: readonly Step[]): void;
}

export const MAX_STEPS = 100;

/**
 * The last 100 own steps of one survey. A step whose every change has been overtaken by others is still taken off the
 * stack, so it never blocks the ones below it.
 */
export function createHistory(): History {
  let done: Step[] = [];
  let undone: Step[] = [];

  const take = (from: Step[], to: Step[], verb: string, document: SurveyDocument): StepTaken | null => {
    const step = from.pop();
    if (step === undefined) return null;
    const outcome = undoChanges(document, step.changes);
    if (outcome.refused) return { ...step, changes: [], skipped: [outcome.message] };
    const { changes, skipped } = outcome;
    if (changes.length > 0) to.push({ ...step, changes });
    return {
      label: `${verb}: ${step.label}`,
      changes,
      selection: step.selection,
      skipped: skipped.map((row) => row.message),
    };
  };

  return {
    push(step) {
      done = [...done, step].slice(-MAX_STEPS);
      undone = [];
    },
    undo: (document) => take(done, undone, 'Undone', document),
    redo: (document) => take(undone, done, 'Done again', document),
    nextUndo: () => done.at(-1)?.label ?? null,
    nextRedo: () => undone.at(-1)?.label ?? null,
    clear() {
      done = [];
      undone = [];
    },
    steps: () => done,
    restore(steps) {
      done = steps.slice(-MAX_STEPS);
      undone = [];
    },
  };
}
