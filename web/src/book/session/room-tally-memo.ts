import type { Limit } from '@embertally/shared/contracts/limits';
import { entriesOfRoom } from '@embertally/shared/survey/derive/entries-of-room';
import { openingsOfRoom } from '@embertally/shared/survey/derive/openings-of-room';
import { roomsOfOpening } from '@embertally/shared/survey/derive/rooms-of-opening';
import { roomInput } from '@embertally/shared/survey/room-input';
import type { SurveyDocument } from '@embertally/shared/survey/survey-document';
import type { RoomInput } from '@embertally/shared/tally/room-input';
import type { RoomTally } from '@embertally/shared/tally/room-tally';

export interface RoomTallyMemo {
  use(estimate: (input: RoomInput) => RoomTally): void;
  read(document: SurveyDocument, roomId: string, limits: readonly Limit[]): RoomTally | null;
  /** What the tally is made from; the same object until something it is made of changes. */
  input(document: SurveyDocument, roomId: string, limits: readonly Limit[]): RoomInput | null;
}

interface Kept {
  readonly parts: readonly unknown[];
  readonly input: RoomInput;
  tally: RoomTally | null;
}

/**
 * Tallies by room, recomputed only when a row they are made of was replaced. A change in one room leaves the tallies of
 * all others as they are.
 */
export function roomTallyMemo(): RoomTallyMemo {
  const kept = new Map<string, Kept>();
  let engine: ((input: RoomInput) => RoomTally) | null = null;
  const keep = (document: SurveyDocument, roomId: string, limits: readonly Limit[]): Kept | null => {
    const parts = partsOf(document, roomId, limits);
    if (parts === null) return null;
    const before = kept.get(roomId);
    if (before !== undefined && same(before.parts, parts)) return before;
    const now = { parts, input: roomInput(document, roomId, limits), tally: null };
    kept.set(roomId, now);
    return now;
  };
  return {
    use(estimate) {
      engine = estimate;
      kept.clear();
    },
    read(document, roomId, limits) {
      if (engine === null) return null;
      const room = keep(document, roomId, limits);
      if (room === null) return null;
      room.tally ??= engine(room.input);
      return room.tally;
    },
    input(document, roomId, limits) {
      return keep(document, roomId, limits)?.input ?? null;
    },
  };
}

/** Every row the tally of a room depends on, by identity; and how many rooms each opening leads to. */
function partsOf(document: SurveyDocument, roomId: string, limits: readonly Limit[]): readonly unknown[] | null {
  const room = document.rooms.get(roomId);
  if (room === undefined) return null;
  const openings = openingsOfRoom(document, roomId);
  return [
    room,
    document.storeys.get(room.storey_id),
    ...room.ring.map((corner) => document.corners.get(corner)),
    ...room.holes.flat().map((corner) => document.corners.get(corner)),
    ...openings,
    ...openings.map((opening) => roomsOfOpening(document, opening).length),
    ...entriesOfRoom(document, roomId),
    ...limits.filter((limit) => limit.room_id === roomId),
  ];
}

function same(a: readonly unknown[], b: readonly unknown[]): boolean {
  return a.length === b.length && a.every((part, index) => Object.is(part, b[index]));
}
