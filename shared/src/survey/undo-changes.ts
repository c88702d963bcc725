import type { Change, Changes } from './change.ts';
import type { Refusal } from './command.ts';
import { invertChanges } from './invert-changes.ts';
import { fieldWords, rowWords } from './merge/clash-words.ts';
import { mergeField } from './merge/merge-field.ts';
import { mergeChangeSet } from './merge-change-set.ts';
import { refuse } from './refuse.ts';
import { rowsOf } from './rows.ts';
import { sameValue } from './same-value.ts';
import type { EntityKind, SurveyDocument } from './survey-document.ts';

/** Something an undo leaves as it is because somebody else changed it since. */
export interface Skipped {
  readonly kind: EntityKind;
  readonly id: string;
  /** Null: the whole row. */
  readonly field: string | null;
  /** One sentence for the person. */
  readonly message: string;
}

export interface Undone {
  readonly refused: false;
  /** The changes of the new change set; empty when nothing of the step is left to undo. */
  readonly changes: Changes;
  readonly skipped: readonly Skipped[];
}

/**
 * What takes back a step on the document as it stands now: the inverse of its changes, less what somebody else changed
 * since, which is named. Redoing is undoing the undo.
 *
 * @param changes what the step did, as it was accepted
 */
export function undoChanges(document: SurveyDocument, changes: Changes): Undone | Refusal {
  const skipped: Skipped[] = [];
  const wanted = invertChanges(changes).flatMap((change) => stillPossible(document, change, skipped));
  const outcome = mergeChangeSet(document, wanted);
  if (outcome.ok) return { refused: false, changes: outcome.changes, skipped };
  const [clash] = outcome.clashes;
  const message = `This step cannot be undone any more. ${clash?.message ?? ''}`.trim();
  return refuse('UNDO_IMPOSSIBLE', message, clash === undefined ? {} : { ids: [clash.id] });
}

function stillPossible(document: SurveyDocument, change: Change, skipped: Skipped[]): Change[] {
  const { kind, id, before, after } = change;
  const stored = rowsOf(document, kind).get(id) as Readonly<Record<string, unknown>> | undefined;
  const skip = (field: string | null, what: string): void => {
    skipped.push({ kind, id, field, message: `${what} and stays as it is.` });
  };
  if (before === null) return stored === undefined ? [change] : [];
  if (after === null) {
    if (stored === undefined || sameValue(stored, before)) return stored === undefined ? [] : [change];
    // A corner lives and dies with the rooms that visit it.
    if (kind !== 'corner') skip(null, `${capital(rowWords(document, kind, id))} was changed by someone else`);
    return [];
  }
  if (stored === undefined) {
    if (kind !== 'corner') skip(null, `The ${kind} was deleted by someone else`);
    return [];
  }
  const from: Record<string, unknown> = {};
  const to: Record<string, unknown> = {};
  for (const [field, value] of Object.entries(after)) {
    const merged = mergeField(kind, field, before[field], stored[field], value);
    if (merged.clash) {
      skip(field, `The ${fieldWords(field)} of ${rowWords(document, kind, id)} was changed by someone else`);
      continue;
    }
    from[field] = stored[field];
    to[field] = merged.value;
  }
  return Object.keys(to).length === 0 ? [] : [{ kind, id, before: from, after: to }];
}

function capital(words: string): string {
  return words.charAt(0).toUpperCase() + words.slice(1);
}
