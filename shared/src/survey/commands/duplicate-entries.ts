import type { Command } from '../command.ts';
import { roomAt } from '../derive/room-at.ts';
import { finish } from '../draft/finish.ts';
import { rounded } from '../draft/rounded.ts';
import { SurveyDraft } from '../draft/survey-draft.ts';
import { entryCopy, type CopyMaker } from '../entry-copy.ts';
import { ENTRY_LENGTHS } from '../entry-lengths.ts';
import { entryViolations } from '../invariants/entry-violations.ts';
import { refuse } from '../refuse.ts';
import { rowRefusal } from '../row-fault.ts';
import type { Entry } from '../survey-document.ts';
import { entryWords } from '../words.ts';

export interface DuplicateEntriesInput extends CopyMaker {
  /** One copy each; along a line or over a grid, several of one entry. */
  readonly copies: readonly {
    readonly entry_id: string;
    /** The copy's new id. */
    readonly id: string;
    readonly dx_m: number;
    readonly dy_m: number;
  }[];
}

/** Records entries again beside the ones they copy; a copy that lands in another room belongs there. */
export const duplicateEntries: Command<DuplicateEntriesInput> = (document, input) => {
  const draft = new SurveyDraft(document);
  const added: Entry[] = [];
  for (const { entry_id, id, dx_m, dy_m } of input.copies) {
    const entry = document.entries.get(entry_id);
    const room = entry && document.rooms.get(entry.room_id);
    if (entry === undefined || room === undefined) {
      return refuse('ENTRY_GONE', 'The entry is not in the survey any more.', { ids: [entry_id] });
    }
    const place = { x_m: entry.x_m + dx_m, y_m: entry.y_m + dy_m };
    const target = roomAt(document, room.storey_id, place);
    if (target === null) {
      const message = `There is no room for the copy of ${entryWords(entry)} to stand in.`;
      return refuse('ENTRY_OUTSIDE_ROOMS', message, { ids: [entry_id] });
    }
    const copy = rounded({ ...entryCopy(entry, id, input), ...place, room_id: target.id }, ENTRY_LENGTHS);
    const fault = rowRefusal('entry', copy);
    if (fault !== null) return fault;
    draft.put('entry', copy);
    added.push(copy);
  }
  return finish(draft, [], (outcome) => entryViolations(outcome, added));
};
