import { deleteEntries } from '@embertally/shared/survey/commands/delete-entries';
import { deleteOpening } from '@embertally/shared/survey/commands/delete-opening';
import { deleteRoom } from '@embertally/shared/survey/commands/delete-room';
import { removeCorner } from '@embertally/shared/survey/commands/remove-corner';
import type { BookSession } from '../session/book-session.ts';

/** Deletes what is picked, as one step; undo brings it back. A wall goes only with its room, and the plan says so. */
export function deletePicked(session: BookSession): void {
  const { document, selection } = session.state;
  const idsOf = (kind: string) => selection.flatMap((picked) => (picked.kind === kind ? [picked.id] : []));
  const entryIds = idsOf('entry');
  if (entryIds.length > 0) {
    const only = entryIds.length === 1 ? document.entries.get(entryIds[0] ?? '')?.label : undefined;
    session.run(
      deleteEntries,
      { entry_ids: entryIds },
      only === undefined ? `Deleted ${entryIds.length} entries` : `Deleted ${only}`,
    );
    return;
  }
  const openingIds = idsOf('opening');
  if (openingIds.length > 0) {
    session.run(
      deleteOpening,
      { opening_ids: openingIds },
      openingIds.length === 1 ? 'Deleted an opening' : `Deleted ${openingIds.length} openings`,
    );
    return;
  }
  const [picked] = selection;
  if (picked?.kind === 'room') {
    const room = document.rooms.get(picked.id);
    session.run(deleteRoom, { room_id: picked.id }, `Deleted ${room?.name ?? 'a room'} and its contents`);
  } else if (picked?.kind === 'corner') session.run(removeCorner, { corner_id: picked.id }, 'Removed a corner');
  else if (picked?.kind === 'wall')
    session.say({ kind: 'notice', text: 'A wall goes with its room. Delete the room, or move the wall.' });
}
