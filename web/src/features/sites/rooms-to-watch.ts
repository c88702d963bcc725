import type { RoomSummary } from '@embertally/shared/contracts/surveys';

/** The rooms over or near a limit, the most exceeded first. */
export function roomsToWatch(rooms: readonly RoomSummary[]): readonly RoomSummary[] {
  return rooms
    .filter((room) => room.standing === 'over' || room.standing === 'near')
    .toSorted((a, b) => (b.ratio ?? 0) - (a.ratio ?? 0));
}
