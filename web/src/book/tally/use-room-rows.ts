import type { Standing } from '@embertally/shared/limits/standing';
import { entriesOfRoom } from '@embertally/shared/survey/derive/entries-of-room';
import { roomArea } from '@embertally/shared/survey/derive/room-area';
import {
  roomsInReadingOrder,
  roomsOfBuildingInReadingOrder,
} from '@embertally/shared/survey/derive/rooms-in-reading-order';
import type { Room } from '@embertally/shared/survey/survey-document';
import { useMemo } from 'react';
import { useBook } from '../session/use-book.ts';
import { useBookSession } from '../session/use-book-session.ts';
import { roomStanding } from './room-standing.ts';

export interface RoomRow {
  readonly room: Room;
  readonly storeyName: string;
  readonly area_m2: number | null;
  readonly entries: number;
  /** Null while the tally is on its way or where it has no density. */
  readonly density_MJ_m2: number | null;
  readonly standing: Standing;
}

/**
 * The rooms with their headline, in the reading order of the plan.
 *
 * @param which of one storey, or of the whole building
 */
export function useRoomRows(which: 'storey' | 'building'): readonly RoomRow[] {
  const session = useBookSession();
  const document = useBook((state) => state.document);
  const limits = useBook((state) => state.limits);
  const storeyId = useBook((state) => state.storeyId);
  const engineReady = useBook((state) => state.engineReady);
  return useMemo(() => {
    const rooms =
      which === 'building'
        ? roomsOfBuildingInReadingOrder(document)
        : storeyId === null
          ? []
          : roomsInReadingOrder(document, storeyId);
    const limited = new Set(limits.map((limit) => limit.room_id));
    return rooms.map((room): RoomRow => {
      const tally = engineReady ? session.tally(room.id) : null;
      return {
        room,
        storeyName: document.storeys.get(room.storey_id)?.name ?? '',
        area_m2: roomArea(document, room.id),
        entries: entriesOfRoom(document, room.id).length,
        density_MJ_m2: tally?.load.perFloor?.value ?? null,
        standing: limited.has(room.id) ? roomStanding(tally) : 'no limit set',
      };
    });
  }, [document, limits, storeyId, which, engineReady, session]);
}
