import type { Change, ChangeSetBody } from '@embertally/shared/survey/change';
import { rowsOf } from '@embertally/shared/survey/rows';
import type { SurveyDocument } from '@embertally/shared/survey/survey-document';
import type { KeptSet } from './kept-set.ts';

/**
 * "Keep mine": the same gesture made anew on what the others left, as a change set of its own. An entry they deleted comes
 * back as a copy; anything else that is gone is left out. Null when nothing of it can be kept.
 */
export function keepMine(held: KeptSet, theirs: SurveyDocument, newId: () => string): ChangeSetBody | null {
  const changes = held.body.changes.flatMap((change): Change[] => {
    const row = rowsOf(theirs, change.kind).get(change.id) as Readonly<Record<string, unknown>> | undefined;
    if (change.before === null) return row === undefined ? [change] : [];
    if (change.after === null) return row === undefined ? [] : [{ ...change, before: row }];
    if (row === undefined) return recovered(change, held, theirs, newId);
    const before = Object.fromEntries(Object.keys(change.after).map((field) => [field, row[field]]));
    return [{ ...change, before }];
  });
  return changes.length === 0 ? null : { id: newId(), label: held.body.label, changes };
}

function recovered(change: Change, held: KeptSet, theirs: SurveyDocument, newId: () => string): Change[] {
  const row = held.rows[change.id];
  if (change.kind !== 'entry' || row === undefined || !theirs.rooms.has(String(row['room_id']))) return [];
  const id = newId();
  return [{ kind: 'entry', id, before: null, after: { ...row, id } }];
}
