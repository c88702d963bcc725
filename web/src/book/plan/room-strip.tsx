import { editRoom } from '@embertally/shared/survey/commands/edit-room';
import type { Room } from '@embertally/shared/survey/survey-document';
import { deletePicked } from '../actions/delete-picked.ts';
import { useBook } from '../session/use-book.ts';
import { useBookSession } from '../session/use-book-session.ts';
import { StripField } from './strip-field.tsx';
import { StripQuantity } from './strip-quantity.tsx';
import { StripVerb } from './strip-verb.tsx';

/** The name and height of one room; the rest stands in the table of rooms. */
export function RoomStrip({ room }: { readonly room: Room }) {
  const session = useBookSession();
  const storeyHeight_m = useBook((state) => state.document.storeys.get(room.storey_id)?.height_m ?? 0);
  const edit = (patch: Parameters<typeof editRoom>[1]['patch'], label: string): string | null => {
    const result = session.run(editRoom, { room_id: room.id, patch }, label, { refusal: 'returned' });
    return result.refused ? result.message : null;
  };
  return (
    <>
      <StripField
        label="Room"
        wide
        value={room.name}
        onCommit={(typed) =>
          typed.trim() === ''
            ? 'Enter a name for the room'
            : edit({ name: typed.trim() }, `Named a room ${typed.trim()}`)
        }
      />
      <StripQuantity
        label="Height"
        unit="m"
        value={room.height_m ?? storeyHeight_m}
        onCommit={(height_m) => edit({ height_m }, `Changed the height of ${room.name}`)}
      />
      <StripVerb
        label="Split"
        onPress={() => {
          session.setTool('split-room');
        }}
      />
      <StripVerb
        label="Delete room"
        onPress={() => {
          deletePicked(session);
        }}
      />
    </>
  );
}
