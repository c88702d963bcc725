import type { SnapTargets, SnapSettings } from '../interaction/snap-point.ts';
import type { Scene } from '../interaction/scene.ts';
import type { BookState } from '../session/book-state.ts';
import type { ToolPointer } from './tool.ts';
import type { Point } from '@embertally/shared/geometry/point';

const SNAP_PX = 10;

/** What a point on this storey may snap to. `without`: corners that move along with it. */
export function snapTargets(
  scene: Scene,
  drawn: readonly Point[],
  without: ReadonlySet<string> = new Set(),
): SnapTargets {
  const walls = scene.walls.filter(({ corners }) => !corners.some((corner) => without.has(corner)));
  const corners = new Map<string, Point>();
  for (const wall of scene.walls) {
    corners.set(wall.corners[0], wall.a);
    corners.set(wall.corners[1], wall.b);
  }
  for (const id of without) corners.delete(id);
  return { corners: [...corners.values()], walls, drawn };
}

export function snapSettings(state: BookState, pointer: ToolPointer): SnapSettings {
  const px = pointer.type === 'touch' ? 2 * SNAP_PX : SNAP_PX;
  // The keyboard already moves in steps; a pull wider than half a step would hold it fast.
  const threshold = pointer.type === 'keyboard' ? 0.02 : px / state.camera.pxPerM;
  return { threshold, suspended: pointer.free };
}
