import type { Room } from '../survey-document.ts';

/** The room's ring and its holes, as corner ids. */
export function loopsOfRoom(room: Pick<Room, 'ring' | 'holes'>): readonly (readonly string[])[] {
  return room.holes.length === 0 ? [room.ring] : [room.ring, ...room.holes];
}
