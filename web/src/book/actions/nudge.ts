import { moveCorner } from '@embertally/shared/survey/commands/move-corner';
import { moveEntries } from '@embertally/shared/survey/commands/move-entries';
import { moveOpening } from '@embertally/shared/survey/commands/move-opening';
import { moveWall } from '@embertally/shared/survey/commands/move-wall';
import type { BookSession } from '../session/book-session.ts';

/**
 * Moves what is picked by a step on the plan, m: entries and corners as they are, a wall at right angles to itself, an
 * opening along its wall. Returns false when nothing picked can be moved so.
 */
export function nudge(session: BookSession, dx_m: number, dy_m: number): boolean {
  const { document, selection, storeyId } = session.state;
  const entries = selection.flatMap(({ kind, id }) => (kind === 'entry' ? (document.entries.get(id) ?? []) : []));
  if (entries.length > 0) {
    const moves = entries.map((entry) => ({ entry_id: entry.id, x_m: entry.x_m + dx_m, y_m: entry.y_m + dy_m }));
    const [first] = entries;
    const label =
      entries.length === 1 && first !== undefined ? `Moved ${first.label}` : `Moved ${entries.length} entries`;
    session.run(moveEntries, { moves }, label);
    return true;
  }
  const [picked] = selection;
  if (picked?.kind === 'corner') {
    const corner = document.corners.get(picked.id);
    if (corner === undefined) return false;
    session.run(moveCorner, { corner_id: corner.id, x_m: corner.x_m + dx_m, y_m: corner.y_m + dy_m }, 'Moved a corner');
    return true;
  }
  if (picked?.kind === 'wall' && storeyId !== null) {
    const [a = '', b = ''] = picked.id.split('|');
    session.run(moveWall, { storey_id: storeyId, wall: [a, b], dx_m, dy_m }, 'Moved a wall');
    return true;
  }
  if (picked?.kind === 'opening') {
    const opening = document.openings.get(picked.id);
    const from = document.corners.get(opening?.wall[0] ?? '');
    const to = document.corners.get(opening?.wall[1] ?? '');
    if (opening === undefined || from === undefined || to === undefined) return false;
    const span = Math.hypot(to.x_m - from.x_m, to.y_m - from.y_m);
    const along = ((to.x_m - from.x_m) * dx_m + (to.y_m - from.y_m) * dy_m) / span;
    if (Math.abs(along) < 1e-6) return false;
    const place = { opening_id: opening.id, wall: opening.wall, offset_m: Math.max(0, opening.offset_m + along) };
    session.run(moveOpening, place, `Moved a ${opening.kind}`);
    return true;
  }
  return false;
}
