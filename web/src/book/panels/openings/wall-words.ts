import { bounds } from '@embertally/shared/geometry/bounds';
import { loopsOfRoom } from '@embertally/shared/survey/derive/loops-of-room';
import { wallKey } from '@embertally/shared/survey/derive/wall-key';
import { wallsByKey } from '@embertally/shared/survey/derive/walls';
import type { Room, SurveyDocument } from '@embertally/shared/survey/survey-document';

export interface NamedWall {
  /** Either way round the same: a key for lists. */
  readonly key: string;
  readonly wall: readonly [string, string];
  readonly length_m: number;
  /** Names of the rooms on the other side; empty: outside. */
  readonly beyond: readonly string[];
  /** "bottom wall", "right wall", "slanted wall": where it lies in the room as drawn. */
  readonly side: string;
}

/** The walls of a room in ring order, told apart by where they lie and what is beyond them. */
export function namedWalls(document: SurveyDocument, room: Room): readonly NamedWall[] {
  const walls = wallsByKey(document, room.storey_id);
  return loopsOfRoom(room).flatMap((loop) => {
    const corners = loop.flatMap((id) => document.corners.get(id) ?? []);
    const box = bounds(corners);
    return loop.flatMap((a, index): readonly NamedWall[] => {
      const b = loop[(index + 1) % loop.length] ?? a;
      const from = document.corners.get(a);
      const to = document.corners.get(b);
      const wall = walls.get(wallKey(a, b));
      if (from === undefined || to === undefined || wall === undefined) return [];
      const level = Math.abs(from.y_m - to.y_m) < 1e-6;
      const upright = Math.abs(from.x_m - to.x_m) < 1e-6;
      const middleX = (box.minX_m + box.maxX_m) / 2;
      const middleY = (box.minY_m + box.maxY_m) / 2;
      const side = level
        ? from.y_m < middleY
          ? 'bottom wall'
          : 'top wall'
        : upright
          ? from.x_m < middleX
            ? 'left wall'
            : 'right wall'
          : 'slanted wall';
      const beyond = wall.roomIds.flatMap((id) => (id === room.id ? [] : (document.rooms.get(id)?.name ?? [])));
      return [{ key: wallKey(a, b), wall: [a, b], length_m: wall.length_m, beyond, side }];
    });
  });
}
