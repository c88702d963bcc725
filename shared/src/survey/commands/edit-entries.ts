import type { Command } from '../command.ts';
import { countedAnew } from '../counted-anew.ts';
import { finish } from '../draft/finish.ts';
import { rounded } from '../draft/rounded.ts';
import { SurveyDraft } from '../draft/survey-draft.ts';
import { ENTRY_LENGTHS } from '../entry-lengths.ts';
import { entryViolations } from '../invariants/entry-violations.ts';
import { refuse } from '../refuse.ts';
import { rowRefusal } from '../row-fault.ts';
import type { Entry } from '../survey-document.ts';

export interface EditEntriesInput {
  readonly entry_ids: readonly string[];
  /** The same fields for all of them. To put entries elsewhere, move them: this does not change their room. */
  readonly patch: Partial<Omit<Entry, 'id' | 'room_id'>>;
}

/** Changes what is recorded of one or more entries, all of them or none. Peak and curve go with the count unless they are given. */
export const editEntries: Command<EditEntriesInput> = (document, { entry_ids, patch }) => {
  const draft = new SurveyDraft(document);
  const edited: Entry[] = [];
  for (const id of entry_ids) {
    const entry = document.entries.get(id);
    if (entry === undefined) return refuse('ENTRY_GONE', 'The entry is not in the survey any more.', { ids: [id] });
    const counted = patch.count === undefined ? {} : countedAnew(entry, patch.count);
    const row = rounded({ ...entry, ...counted, ...patch }, ENTRY_LENGTHS);
    const fault = rowRefusal('entry', row);
    if (fault !== null) return fault;
    draft.put('entry', row);
    edited.push(row);
  }
  return finish(draft, [], (outcome) => entryViolations(outcome, edited));
};
