import { openingsOfRoom } from '@embertally/shared/survey/derive/openings-of-room';
import { Disclosure } from '../../../components/disclosure.tsx';
import { useBook } from '../../session/use-book.ts';
import { AddOpeningForm } from './add-opening-form.tsx';
import { OpeningsTable } from './openings-table.tsx';

/** The openings of the room in hand as a table, and a form to add one. */
export function OpeningsPart() {
  const document = useBook((state) => state.document);
  const room = document.rooms.get(useBook((state) => state.roomInHand) ?? '');
  const canEdit = useBook((state) => state.canEdit);
  if (room === undefined) return <p className="text-soft">No room is in hand: choose one under Rooms.</p>;
  const openings = openingsOfRoom(document, room.id);
  return (
    <div className="grid grid-cols-[minmax(0,1fr)] gap-4">
      {canEdit && (
        <Disclosure title={`Add an opening to ${room.name}`} open={openings.length === 0}>
          <AddOpeningForm key={room.id} room={room} />
        </Disclosure>
      )}
      {openings.length === 0 ? (
        <p className="max-w-[60ch] text-soft">
          {room.name} has no opening. Without one no air is reckoned to reach a fire, and flashover and burn-out are not
          computed.
        </p>
      ) : (
        <OpeningsTable room={room} openings={openings} canEdit={canEdit} />
      )}
    </div>
  );
}
