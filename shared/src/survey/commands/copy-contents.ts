import { bounds } from '../../geometry/bounds.ts';
import { pointInRegion } from '../../geometry/point-in-region.ts';
import { roundToMillimetre } from '../../geometry/round-to-millimetre.ts';
import type { Command } from '../command.ts';
import { clearRing } from '../derive/clear-ring.ts';
import { entriesOfRoom } from '../derive/entries-of-room.ts';
import { freePlace } from '../derive/free-place.ts';
import { finish } from '../draft/finish.ts';
import { SurveyDraft } from '../draft/survey-draft.ts';
import { entryCopy, type CopyMaker } from '../entry-copy.ts';
import { entryViolations } from '../invariants/entry-violations.ts';
import { refuse } from '../refuse.ts';
import { rowRefusal } from '../row-fault.ts';
import type { Entry } from '../survey-document.ts';

export interface CopyContentsInput extends CopyMaker {
  readonly from_room_id: string;
  readonly to_room_id: string;
  /** A new id for the copy of each entry; entries without one are left out. */
  readonly ids: Readonly<Record<string, string>>;
}

/**
 * Records a room's contents in another room as well, each at the same place counted from the lower left, or at a free
 * place where the other room has no floor there.
 */
export const copyContents: Command<CopyContentsInput> = (document, input) => {
  const from = clearRing(document, input.from_room_id);
  const to = clearRing(document, input.to_room_id);
  if (from === null || to === null) return refuse('ROOM_GONE', 'The room is not in the survey any more.');
  const dx_m = bounds(to.ring).minX_m - bounds(from.ring).minX_m;
  const dy_m = bounds(to.ring).minY_m - bounds(from.ring).minY_m;
  const draft = new SurveyDraft(document);
  const added: Entry[] = [];
  for (const entry of entriesOfRoom(document, input.from_room_id)) {
    const id = input.ids[entry.id];
    if (id === undefined) continue;
    const same = { x_m: roundToMillimetre(entry.x_m + dx_m), y_m: roundToMillimetre(entry.y_m + dy_m) };
    const fits = pointInRegion(same, to) !== 'outside';
    const place = fits ? same : (freePlace(document, input.to_room_id, entry, added) ?? same);
    const copy = { ...entryCopy(entry, id, input), ...place, room_id: input.to_room_id };
    const fault = rowRefusal('entry', copy);
    if (fault !== null) return fault;
    draft.put('entry', copy);
    added.push(copy);
  }
  return finish(draft, [], (outcome) => entryViolations(outcome, added));
};
