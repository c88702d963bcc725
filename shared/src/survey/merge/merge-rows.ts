import type { Change, Changes, Clash } from '../change.ts';
import { rowsOf } from '../rows.ts';
import { sameValue } from '../same-value.ts';
import type { SurveyDocument } from '../survey-document.ts';
import { fieldWords, rowWords } from './clash-words.ts';
import { mergeField } from './merge-field.ts';

export interface MergedRows {
  /** What is still to be done to the document, each change starting from the stored value. */
  readonly changes: Changes;
  readonly clashes: readonly Clash[];
}

/** Row by row, what a change set still does to a document that has moved on, and where the two disagree. */
export function mergeRows(document: SurveyDocument, changes: Changes): MergedRows {
  const merged: Change[] = [];
  const clashes: Clash[] = [];
  for (const change of changes) {
    const stored = rowsOf(document, change.kind).get(change.id) as Record<string, unknown> | undefined;
    if (change.before === null) mergeCreate(document, change, stored, merged, clashes);
    else if (change.after === null) mergeDelete(document, change, stored, merged, clashes);
    else mergeEdit(document, change, stored, merged, clashes);
  }
  return { changes: merged, clashes };
}

type Stored = Readonly<Record<string, unknown>> | undefined;

function mergeCreate(
  document: SurveyDocument,
  change: Change,
  stored: Stored,
  merged: Change[],
  clashes: Clash[],
): void {
  if (stored === undefined) merged.push(change);
  else if (!sameValue(stored, change.after)) {
    const message = `${sentenceStart(rowWords(document, change.kind, change.id))} is in the survey already and has been changed since.`;
    clashes.push(clashOf(change, 'edited', null, null, stored, change.after, message));
  }
}

function mergeDelete(
  document: SurveyDocument,
  change: Change,
  stored: Stored,
  merged: Change[],
  clashes: Clash[],
): void {
  if (stored === undefined) return;
  if (sameValue(stored, change.before)) {
    merged.push(change);
    return;
  }
  const message =
    change.kind === 'corner'
      ? 'A wall of what you deleted was moved by someone else.'
      : `${sentenceStart(rowWords(document, change.kind, change.id))} was changed while you deleted it.`;
  clashes.push(clashOf(change, 'edited', null, change.before, stored, null, message));
}

function mergeEdit(document: SurveyDocument, change: Change, stored: Stored, merged: Change[], clashes: Clash[]): void {
  const { kind, id } = change;
  if (stored === undefined) {
    const message = `The ${kind} you changed was deleted.`;
    clashes.push(clashOf(change, 'gone', null, change.before, null, change.after, message));
    return;
  }
  const before: Record<string, unknown> = {};
  const after: Record<string, unknown> = {};
  for (const [field, wanted] of Object.entries(change.after ?? {})) {
    const base = change.before?.[field];
    const outcome = mergeField(kind, field, base, stored[field], wanted);
    if (outcome.clash) {
      const message = `The ${fieldWords(field)} of ${rowWords(document, kind, id)} was changed by someone else as well.`;
      clashes.push(clashOf(change, 'field', field, base, stored[field], wanted, message));
    } else if (!sameValue(outcome.value, stored[field])) {
      before[field] = stored[field];
      after[field] = outcome.value;
    }
  }
  if (Object.keys(after).length > 0) merged.push({ kind, id, before, after });
}

/** Who made the other change and when is filled in by whoever keeps the history. */
export function clashOf(
  about: Pick<Change, 'kind' | 'id'>,
  reason: Clash['reason'],
  field: string | null,
  base: unknown,
  theirs: unknown,
  mine: unknown,
  message: string,
): Clash {
  return { reason, kind: about.kind, id: about.id, field, base, theirs, mine, by: null, at: null, message };
}

function sentenceStart(words: string): string {
  return words.charAt(0).toUpperCase() + words.slice(1);
}
