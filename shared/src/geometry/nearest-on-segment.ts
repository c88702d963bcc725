import type { Point } from './point.ts';

export interface NearestOnSegment {
  readonly point: Point;
  /** Where along the segment: 0 at `a`, 1 at `b`. */
  readonly t: number;
  readonly distance_m: number;
}

/** The place on the segment a–b nearest to `point`. A segment of no length answers with its end. */
export function nearestOnSegment(point: Point, a: Point, b: Point): NearestOnSegment {
  const dx = b.x_m - a.x_m;
  const dy = b.y_m - a.y_m;
  const squared = dx * dx + dy * dy;
  const raw = squared === 0 ? 0 : ((point.x_m - a.x_m) * dx + (point.y_m - a.y_m) * dy) / squared;
  const t = Math.min(1, Math.max(0, raw));
  const nearest = { x_m: a.x_m + t * dx, y_m: a.y_m + t * dy };
  return { point: nearest, t, distance_m: Math.hypot(point.x_m - nearest.x_m, point.y_m - nearest.y_m) };
}
