import { useBook } from '../../session/use-book.ts';
import { RoomFields } from './room-fields.tsx';

/** Everything known of the room in hand. */
export function RoomPart() {
  const room = useBook((state) => state.document.rooms.get(state.roomInHand ?? ''));
  const canEdit = useBook((state) => state.canEdit);
  if (room === undefined) return <p className="text-soft">No room is in hand: choose one under Rooms.</p>;
  return <RoomFields key={room.id} room={room} canEdit={canEdit} />;
}
