import { moveCorner } from '@embertally/shared/survey/commands/move-corner';
import type { Corner } from '@embertally/shared/survey/survey-document';
import type { Point } from '@embertally/shared/geometry/point';
import { sceneOf } from '../../interaction/scene.ts';
import { snapPoint } from '../../interaction/snap-point.ts';
import { snapSettings, snapTargets } from '../snap-targets.ts';
import type { ToolPorts } from '../tool.ts';
import type { Drag } from './drag.ts';

/** Moves one corner; the plan is shown as it would be, or in refusal's colour with the corner where the pointer is. */
export function dragCorner({ session, show }: ToolPorts, corner: Corner): Drag {
  let to: Point = corner;
  return {
    name: 'moving a corner',
    move(pointer) {
      const { document } = session.state;
      const scene = sceneOf(document, corner.storey_id);
      if (scene === null) return;
      const neighbours = scene.walls.flatMap(({ corners: [first, second], a, b }) =>
        first === corner.id ? [b] : second === corner.id ? [a] : [],
      );
      const targets = snapTargets(scene, [], new Set([corner.id]));
      const snapped = snapPoint(pointer.point, targets, snapSettings(session.state, pointer));
      to = snapped.point;
      const result = moveCorner(document, { corner_id: corner.id, ...pointOf(to) });
      const bare = [
        { kind: 'corner' as const, id: corner.id, before: { ...pointOf(corner) }, after: { ...pointOf(to) } },
      ];
      show({
        changes: result.refused ? bare : result.changes,
        unfit: result.refused,
        lengths: neighbours.map((neighbour) => ({ a: neighbour, b: to })),
        guides: snapped.guides,
        snap: { at: pointer.point, why: snapped.why },
      });
    },
    commit() {
      if (to.x_m === corner.x_m && to.y_m === corner.y_m) return;
      session.run(moveCorner, { corner_id: corner.id, ...pointOf(to) }, 'Moved a corner');
    },
  };
}

function pointOf({ x_m, y_m }: Point): Point {
  return { x_m, y_m };
}
