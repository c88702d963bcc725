import { entriesOfRoom } from '@embertally/shared/survey/derive/entries-of-room';
import { Disclosure } from '../../../components/disclosure.tsx';
import { NewerHeatNotice } from '../../plan/newer-heat-notice.tsx';
import { useBook } from '../../session/use-book.ts';
import { AddEntryForm } from './add-entry-form.tsx';
import { ContentsTable } from './contents-table.tsx';
import { CopyContentsForm } from './copy-contents-form.tsx';

/** The contents of the room in hand as a table, and a form to add to them. */
export function ContentsPart() {
  const document = useBook((state) => state.document);
  const room = document.rooms.get(useBook((state) => state.roomInHand) ?? '');
  const canEdit = useBook((state) => state.canEdit);
  if (room === undefined) return <p className="text-soft">No room is in hand: choose one under Rooms.</p>;
  const entries = entriesOfRoom(document, room.id);
  return (
    <div className="grid grid-cols-[minmax(0,1fr)] gap-4" tabIndex={-1}>
      {canEdit && (
        <div>
          <Disclosure title={`Add contents to ${room.name}`} open={entries.length === 0}>
            <AddEntryForm key={room.id} room={room} />
          </Disclosure>
          {document.rooms.size > 1 && (
            <Disclosure title="Copy the contents of another room">
              <CopyContentsForm key={room.id} room={room} />
            </Disclosure>
          )}
        </div>
      )}
      {entries.length === 0 ? (
        <p className="text-soft">Nothing is recorded in {room.name} yet.</p>
      ) : (
        <>
          <NewerHeatNotice entries={entries} canEdit={canEdit} />
          <ContentsTable room={room} entries={entries} canEdit={canEdit} />
        </>
      )}
    </div>
  );
}
