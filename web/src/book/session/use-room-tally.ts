import type { RoomTally } from '@embertally/shared/tally/room-tally';
import { useSyncExternalStore } from 'react';
import { useBookSession } from './use-book-session.ts';

/** The tally of a room, moving with every change; null while the engine loads or without a room. */
export function useRoomTally(roomId: string | null): RoomTally | null {
  const session = useBookSession();
  return useSyncExternalStore(session.subscribe, () => (roomId === null ? null : session.tally(roomId)));
}
