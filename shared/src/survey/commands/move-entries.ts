import { pointInRegion } from '../../geometry/point-in-region.ts';
import type { Point } from '../../geometry/point.ts';
import type { Command, Refusal } from '../command.ts';
import { freePlace } from '../derive/free-place.ts';
import { roomAt } from '../derive/room-at.ts';
import { roomRegion } from '../derive/room-region.ts';
import { finish } from '../draft/finish.ts';
import { rounded } from '../draft/rounded.ts';
import { SurveyDraft } from '../draft/survey-draft.ts';
import { ENTRY_LENGTHS } from '../entry-lengths.ts';
import { entryViolations } from '../invariants/entry-violations.ts';
import { refuse } from '../refuse.ts';
import { rowRefusal } from '../row-fault.ts';
import type { Entry, Room, SurveyDocument } from '../survey-document.ts';
import { entryWords } from '../words.ts';

export interface EntryMove {
  readonly entry_id: string;
  /** Where its middle goes. Without a place but with a room: a free place there. */
  readonly x_m?: number;
  readonly y_m?: number;
  readonly rotation_deg?: number;
  /** Another room, also on another storey; left out: the room at the place, on the entry's own storey. */
  readonly room_id?: string;
}

export interface MoveEntriesInput {
  readonly moves: readonly EntryMove[];
}

/** Moves contents. Over a wall an entry goes to that room; where there is no room all of them stay where they were. */
export const moveEntries: Command<MoveEntriesInput> = (document, { moves }) => {
  const draft = new SurveyDraft(document);
  const moved: Entry[] = [];
  for (const move of moves) {
    const entry = document.entries.get(move.entry_id);
    if (entry === undefined)
      return refuse('ENTRY_GONE', 'The entry is not in the survey any more.', { ids: [move.entry_id] });
    const target = targetOf(document, entry, move);
    if ('refused' in target) return target;
    const rotation_deg = move.rotation_deg ?? entry.rotation_deg;
    const row = rounded({ ...entry, ...target, rotation_deg }, ENTRY_LENGTHS);
    const fault = rowRefusal('entry', row);
    if (fault !== null) return fault;
    draft.put('entry', row);
    moved.push(row);
  }
  return finish(draft, [], (outcome) => entryViolations(outcome, moved));
};

function targetOf(document: SurveyDocument, entry: Entry, move: EntryMove): (Point & { room_id: string }) | Refusal {
  const from = document.rooms.get(entry.room_id);
  const to = move.room_id === undefined ? from : document.rooms.get(move.room_id);
  if (to === undefined) {
    return refuse('ROOM_GONE', 'The room is not in the survey any more.', { field: 'room_id', ids: [entry.id] });
  }
  if (move.x_m === undefined && move.y_m === undefined && to.id !== entry.room_id) {
    const place = freePlace(document, to.id, entry);
    if (place !== null) return { ...place, room_id: to.id };
  }
  const place = { x_m: move.x_m ?? entry.x_m, y_m: move.y_m ?? entry.y_m };
  const room = move.room_id !== undefined || isIn(document, to, place) ? to : roomAt(document, to.storey_id, place);
  if (room !== null) return { ...place, room_id: room.id };
  const message = `There is no room there, so ${entryWords(entry)} stays where it was.`;
  return refuse('ENTRY_OUTSIDE_ROOMS', message, { field: 'x_m', ids: [entry.id] });
}

/** On a wall between two rooms an entry stays with its own. */
function isIn(document: SurveyDocument, room: Room, place: Point): boolean {
  const region = roomRegion(document.corners, room);
  return region !== null && pointInRegion(place, region) !== 'outside';
}
