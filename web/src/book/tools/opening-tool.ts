import { addOpening } from '@embertally/shared/survey/commands/add-opening';
import { nearestWall } from '@embertally/shared/survey/derive/nearest-wall';
import { newOpening, OPENING_STARTS } from '@embertally/shared/survey/new-opening';
import type { Opening } from '@embertally/shared/survey/survey-document';
import { NO_PREVIEW } from '../interaction/preview.ts';
import { toGrid } from '../interaction/snap.ts';
import { towards } from '../interaction/vector.ts';
import { marginPx, type Tool, type ToolPointer, type ToolPorts } from './tool.ts';

/** How far from a wall the opening still jumps to it, px. */
const REACH_PX = 22;

/** Puts openings into walls: a ghost follows the pointer along the nearest wall, a press places it; stays in hand. */
export function openingTool(ports: ToolPorts): Tool {
  const { session } = ports;
  let pressed = false;

  const found = (pointer: ToolPointer): { opening: Opening; show: () => void } | null => {
    const { document, storeyId, camera, placing } = session.state;
    if (storeyId === null) return null;
    const near = nearestWall(document, storeyId, pointer.point);
    const storey = document.storeys.get(storeyId);
    const reach = (REACH_PX + marginPx(pointer.type)) / camera.pxPerM + (storey?.wall_thickness_m ?? 0) / 2;
    if (near === null || near.distance_m > reach) return null;
    const start = OPENING_STARTS[placing.openingKind];
    const { wall } = near;
    const free = wall.length_m - start.width_m;
    const wished = near.along_m - start.width_m / 2;
    const offset_m = Math.max(0, Math.min(Math.max(0, free), pointer.free ? wished : toGrid(wished)));
    const opening = newOpening({
      id: session.newId(),
      storey_id: storeyId,
      wall: [wall.a, wall.b],
      offset_m,
      kind: placing.openingKind,
    });
    const a = document.corners.get(wall.a);
    const b = document.corners.get(wall.b);
    if (a === undefined || b === undefined) return null;
    const from = towards(a, b, offset_m);
    const to = towards(a, b, Math.min(wall.length_m, offset_m + start.width_m));
    return {
      opening,
      show: () => {
        ports.show({
          openingGhost: { opening, a: from, b: to },
          lengths: [
            { a, b: from },
            { a: to, b },
          ],
          snap: { at: pointer.point, why: pointer.free ? null : 'wall' },
          unfit: free < 0,
        });
      },
    };
  };

  return {
    name: 'opening',
    state: () => (pressed ? 'pressed' : 'idle'),
    down(pointer) {
      pressed = true;
      found(pointer)?.show();
    },
    move(pointer) {
      const place = found(pointer);
      if (place === null) ports.show(NO_PREVIEW);
      else place.show();
    },
    up(pointer) {
      if (!pressed) return;
      pressed = false;
      const place = found(pointer);
      ports.show(NO_PREVIEW);
      if (place === null) {
        session.say({ kind: 'refusal', text: 'An opening stands in a wall. Press on or close to one.' });
        return;
      }
      const { opening } = place;
      const result = session.run(addOpening, { opening }, `Put a ${opening.kind} in a wall`);
      if (!result.refused) session.select([{ kind: 'opening', id: opening.id }]);
    },
    key: () => false,
    cancel() {
      pressed = false;
      ports.show(NO_PREVIEW);
    },
  };
}
