import { nearestOnSegment } from './nearest-on-segment.ts';
import type { Point } from './point.ts';
import { ROUNDING_M, TOLERANCE_M } from './tolerance.ts';

/** Whether a place lies on the segment a–b, ends included, within the plan's tolerance. */
export function onSegment(point: Point, a: Point, b: Point): boolean {
  const reach = TOLERANCE_M + ROUNDING_M;
  if (point.x_m < Math.min(a.x_m, b.x_m) - reach || point.x_m > Math.max(a.x_m, b.x_m) + reach) return false;
  if (point.y_m < Math.min(a.y_m, b.y_m) - reach || point.y_m > Math.max(a.y_m, b.y_m) + reach) return false;
  return nearestOnSegment(point, a, b).distance_m <= reach;
}
