import { moveWall } from '@embertally/shared/survey/commands/move-wall';
import type { WallShape } from '../../interaction/scene.ts';
import { GRID_M } from '../../interaction/snap.ts';
import { dot, length, minus } from '../../interaction/vector.ts';
import type { ToolPointer, ToolPorts } from '../tool.ts';
import type { Drag } from './drag.ts';

/** Moves a wall at right angles to itself, in grid steps; every corner on its straight line comes along. */
export function dragWall({ session, show }: ToolPorts, storey_id: string, wall: WallShape, from: ToolPointer): Drag {
  const along = minus(wall.b, wall.a);
  const span = length(along);
  const normal = { x_m: -along.y_m / span, y_m: along.x_m / span };
  let by_m = 0;
  const input = () => ({
    storey_id,
    wall: wall.corners,
    dx_m: normal.x_m * by_m,
    dy_m: normal.y_m * by_m,
  });
  return {
    name: 'moving a wall',
    move(pointer) {
      const raw = dot(minus(pointer.point, from.point), normal);
      by_m = pointer.free ? raw : Math.round(raw / GRID_M) * GRID_M;
      const result = moveWall(session.state.document, input());
      show({
        ...(result.refused ? {} : { changes: result.changes }),
        unfit: result.refused,
        lengths: [
          { a: from.point, b: { x_m: from.point.x_m + normal.x_m * by_m, y_m: from.point.y_m + normal.y_m * by_m } },
        ],
        snap: { at: pointer.point, why: pointer.free ? null : 'grid' },
      });
    },
    commit() {
      if (by_m === 0) return;
      session.run(moveWall, input(), 'Moved a wall');
    },
  };
}
