import { moveOpening } from '@embertally/shared/survey/commands/move-opening';
import { nearestWall } from '@embertally/shared/survey/derive/nearest-wall';
import type { Opening } from '@embertally/shared/survey/survey-document';
import { toGrid } from '../../interaction/snap.ts';
import { towards } from '../../interaction/vector.ts';
import type { ToolPorts } from '../tool.ts';
import type { Drag } from './drag.ts';

/** Slides an opening along its wall, or into another wall the pointer comes close to. */
export function dragOpening({ session, show }: ToolPorts, opening: Opening): Drag {
  let place: { wall: readonly [string, string]; offset_m: number } | null = null;
  return {
    name: 'moving an opening',
    move(pointer) {
      const { document } = session.state;
      const near = nearestWall(document, opening.storey_id, pointer.point);
      const a = near === null ? undefined : document.corners.get(near.wall.a);
      const b = near === null ? undefined : document.corners.get(near.wall.b);
      if (near === null || a === undefined || b === undefined) return;
      const free = near.wall.length_m - opening.width_m;
      const wished = near.along_m - opening.width_m / 2;
      const offset_m = Math.max(0, Math.min(Math.max(0, free), pointer.free ? wished : toGrid(wished)));
      place = { wall: [near.wall.a, near.wall.b], offset_m };
      const result = moveOpening(document, { opening_id: opening.id, ...place });
      const from = towards(a, b, offset_m);
      const to = towards(a, b, offset_m + opening.width_m);
      show({
        changes: result.refused ? [] : result.changes,
        openingGhost: { opening, a: from, b: to },
        lengths: [
          { a, b: from },
          { a: to, b },
        ],
        unfit: result.refused,
        snap: { at: pointer.point, why: pointer.free ? null : 'wall' },
      });
    },
    commit() {
      if (place !== null) session.run(moveOpening, { opening_id: opening.id, ...place }, `Moved a ${opening.kind}`);
    },
  };
}
