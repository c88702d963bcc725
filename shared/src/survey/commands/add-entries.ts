import type { Command } from '../command.ts';
import { finish } from '../draft/finish.ts';
import { rounded } from '../draft/rounded.ts';
import { SurveyDraft } from '../draft/survey-draft.ts';
import { entryViolations } from '../invariants/entry-violations.ts';
import { refuse } from '../refuse.ts';
import { rowRefusal } from '../row-fault.ts';
import type { Entry } from '../survey-document.ts';
import { entryWords } from '../words.ts';

export interface AddEntriesInput {
  /** As `newEntryFromKind` or `newEntryFromMaterial` makes them. */
  readonly entries: readonly Entry[];
}

/** The lengths of an entry, rounded when a command commits them. */
export const ENTRY_LENGTHS = ['x_m', 'y_m', 'base_height_m', 'width_m', 'depth_m', 'height_m'] as const;

/** Records contents. All of them or, when one cannot be, none. */
export const addEntries: Command<AddEntriesInput> = (document, input) => {
  const draft = new SurveyDraft(document);
  const added = input.entries.map((entry) => rounded(entry, ENTRY_LENGTHS));
  for (const entry of added) {
    if (document.entries.has(entry.id)) {
      return refuse('ENTRY_EXISTS', `${entryWords(entry)} is recorded already.`, { ids: [entry.id] });
    }
    const fault = rowRefusal('entry', entry);
    if (fault !== null) return fault;
    draft.put('entry', entry);
  }
  return finish(draft, [], (outcome) => entryViolations(outcome, added));
};
