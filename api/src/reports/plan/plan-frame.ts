import type { Point as PlanPoint } from '@embertally/shared/geometry/point';
import type { Point } from '../pdf/sheet.ts';
import { planScale, type PlanScale } from './plan-scale.ts';
import type { Rect } from './polygon.ts';

/** The drawing on the sheet: its true scale, its box, and where a place of the plan lies. */
export interface PlanFrame {
  readonly scale: PlanScale;
  readonly box: Rect;
  at(point: PlanPoint): Point;
}

/**
 * Fits the points of a storey into a box of the sheet at the largest round scale and centres them.
 *
 * @param edge space kept free inside the box on every side for labels that stand outside the plan, in points
 */
export function planFrame(points: readonly PlanPoint[], into: Rect, edge: number): PlanFrame {
  let [minX, minY, maxX, maxY] = [Infinity, Infinity, -Infinity, -Infinity];
  for (const { x_m, y_m } of points) {
    [minX, maxX] = [Math.min(minX, x_m), Math.max(maxX, x_m)];
    [minY, maxY] = [Math.min(minY, y_m), Math.max(maxY, y_m)];
  }
  if (points.length === 0) [minX, minY, maxX, maxY] = [0, 0, 1, 1];
  const scale = planScale(maxX - minX, maxY - minY, into.width - edge * 2, into.height - edge * 2);
  const k = scale.pointsPerMetre;
  const [width, height] = [(maxX - minX) * k, (maxY - minY) * k];
  const box = { x: into.x + (into.width - width) / 2, y: into.y + (into.height - height) / 2, width, height };
  return { scale, box, at: ({ x_m, y_m }) => [box.x + (x_m - minX) * k, box.y + (maxY - y_m) * k] };
}
