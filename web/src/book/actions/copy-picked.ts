import { addEntries } from '@embertally/shared/survey/commands/add-entries';
import { duplicateEntries } from '@embertally/shared/survey/commands/duplicate-entries';
import { footprint } from '@embertally/shared/geometry/footprint';
import { roomAt } from '@embertally/shared/survey/derive/room-at';
import type { Entry } from '@embertally/shared/survey/survey-document';
import type { BookSession } from '../session/book-session.ts';

const GAP_M = 0.1;

/** Puts a copy of each picked entry beside it: to the right, else above, left, below, where the room has floor. */
export function duplicatePicked(session: BookSession): void {
  const { document, selection, storeyId } = session.state;
  const entries = selection.flatMap(({ kind, id }) => (kind === 'entry' ? (document.entries.get(id) ?? []) : []));
  if (entries.length === 0 || storeyId === null) return;
  const across = Math.max(...entries.map((entry) => entry.width_m)) + GAP_M;
  const up = Math.max(...entries.map((entry) => entry.depth_m)) + GAP_M;
  const ways = [
    [across, 0],
    [0, up],
    [-across, 0],
    [0, -up],
  ] as const;
  const inOwnRoom = (entry: Entry, [dx, dy]: readonly [number, number]) =>
    footprint({ ...entry, x_m: entry.x_m + dx, y_m: entry.y_m + dy }).every(
      (corner) => roomAt(document, storeyId, corner)?.id === entry.room_id,
    );
  const [dx_m, dy_m] = ways.find((way) => entries.every((entry) => inOwnRoom(entry, way))) ?? [GAP_M, GAP_M];
  const copies = entries.map((entry) => ({ entry_id: entry.id, id: session.newId(), dx_m, dy_m }));
  const label =
    entries.length === 1 ? `Duplicated ${entries[0]?.label ?? 'an entry'}` : `Duplicated ${entries.length} entries`;
  const made = { recorded_by: session.person, recorded_at: session.now() };
  const result = session.run(duplicateEntries, { copies, ...made }, label);
  if (!result.refused) session.select(copies.map(({ id }) => ({ kind: 'entry', id })));
}

/** Puts what was copied into the middle of the view, distances kept; what would land outside all rooms is refused. */
export function pasteCopied(session: BookSession): void {
  const { document, clipboard, storeyId, camera } = session.state;
  if (clipboard.length === 0 || storeyId === null) return;
  const middle = {
    x_m: clipboard.reduce((sum, entry) => sum + entry.x_m, 0) / clipboard.length,
    y_m: clipboard.reduce((sum, entry) => sum + entry.y_m, 0) / clipboard.length,
  };
  const entries = clipboard.flatMap((entry): Entry[] => {
    const place = { x_m: entry.x_m - middle.x_m + camera.x_m, y_m: entry.y_m - middle.y_m + camera.y_m };
    const room = roomAt(document, storeyId, place);
    if (room === null) return [];
    const made = { recorded_by: session.person, recorded_at: session.now(), confirmed_by: null, confirmed_at: null };
    return [{ ...entry, ...place, ...made, id: session.newId(), room_id: room.id, photos: [] }];
  });
  if (entries.length < clipboard.length) {
    session.say({ kind: 'refusal', text: 'Move the view so that a room lies in its middle, then paste there.' });
    return;
  }
  const result = session.run(
    addEntries,
    { entries },
    entries.length === 1 ? 'Pasted an entry' : `Pasted ${entries.length} entries`,
  );
  if (!result.refused) session.select(entries.map(({ id }) => ({ kind: 'entry', id })));
}
