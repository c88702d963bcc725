import type { Footprint } from '@embertally/shared/geometry/footprint';
import type { Point } from '@embertally/shared/geometry/point';
import { minus, turned } from './vector.ts';

/** Half the width and height of the upright rectangle around a turned footprint, m. */
export function halfExtent(footprint: Footprint): Point {
  const angle = (footprint.rotation_deg * Math.PI) / 180;
  const cos = Math.abs(Math.cos(angle));
  const sin = Math.abs(Math.sin(angle));
  return {
    x_m: (footprint.width_m * cos + footprint.depth_m * sin) / 2,
    y_m: (footprint.width_m * sin + footprint.depth_m * cos) / 2,
  };
}

/** How far a point lies outside the footprint, m; 0 inside. */
export function distanceToFootprint(point: Point, footprint: Footprint): number {
  const own = turned(minus(point, footprint), -footprint.rotation_deg);
  const dx = Math.max(0, Math.abs(own.x_m) - footprint.width_m / 2);
  const dy = Math.max(0, Math.abs(own.y_m) - footprint.depth_m / 2);
  return Math.hypot(dx, dy);
}
