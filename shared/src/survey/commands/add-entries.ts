import type { Command } from '../command.ts';
import { finish } from '../draft/finish.ts';
import { rounded } from '../draft/rounded.ts';
import { SurveyDraft } from '../draft/survey-draft.ts';
import { entryViolations } from '../invariants/entry-violations.ts';
import { ENTRY_LENGTHS } from '../entry-lengths.ts';
import { refuse } from '../refuse.ts';
import { rowRefusal } from '../row-fault.ts';
import type { Entry } from '../survey-document.ts';
import { entryWords } from '../words.ts';

export interface AddEntriesInput {
  /** As `newEntryFromKind` or `newEntryFromMaterial` makes them. */
  readonly entries: readonly Entry[];
}

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
