import type { RoomInput } from '@embertally/shared/tally/room-input';
import { useSyncExternalStore } from 'react';
import { useBookSession } from './use-book-session.ts';

/** What the tally of a room is made from: the same object until the room changes; null without a room. */
export function useRoomInput(roomId: string | null): RoomInput | null {
  const session = useBookSession();
  return useSyncExternalStore(session.subscribe, () => (roomId === null ? null : session.roomInput(roomId)));
}
