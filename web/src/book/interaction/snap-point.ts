import { distance } from '@embertally/shared/geometry/distance';
import { nearestOnSegment } from '@embertally/shared/geometry/nearest-on-segment';
import type { Point } from '@embertally/shared/geometry/point';
import { towards } from './vector.ts';
import { toGrid, type Guide, type Snapped } from './snap.ts';

export interface SnapTargets {
  readonly corners: readonly Point[];
  readonly walls: readonly { readonly a: Point; readonly b: Point }[];
  /** Points being drawn now; a new one may stand in line with them. */
  readonly drawn?: readonly Point[];
}
export interface SnapSettings {
  /** m: pixels ÷ zoom. */
  readonly threshold: number;
  /** The person holds the key that lets go of all snapping. */
  readonly suspended: boolean;
}

/**
 * Pulls a point to what it is close to. A corner beats a wall, a wall beats standing in line with a corner, and what is
 * left goes to the 0.1 m grid.
 */
export function snapPoint(point: Point, targets: SnapTargets, { threshold, suspended }: SnapSettings): Snapped {
  if (suspended) return { point, why: null, guides: [] };
  const corner = nearest(point, [...targets.corners, ...(targets.drawn ?? [])], threshold);
  if (corner !== null) return { point: corner, why: 'corner', guides: [] };
  const anchors = [...(targets.drawn ?? []), ...targets.corners];
  const onWall = snapToWall(point, targets.walls, anchors, threshold);
  if (onWall !== null) return onWall;
  const x = axis(point.x_m, anchors, threshold, 'x_m');
  const y = axis(point.y_m, anchors, threshold, 'y_m');
  const snapped = { x_m: x?.value ?? toGrid(point.x_m), y_m: y?.value ?? toGrid(point.y_m) };
  const guides = [x, y].flatMap((hit): Guide[] =>
    hit === null ? [] : [{ a: hit.anchor, b: snapped, why: 'in line' }],
  );
  return { point: snapped, why: guides.length > 0 ? 'in line' : 'grid', guides };
}

function snapToWall(
  point: Point,
  walls: SnapTargets['walls'],
  anchors: readonly Point[],
  threshold: number,
): Snapped | null {
  let best: { point: Point; wall: SnapTargets['walls'][number]; distance: number } | null = null;
  for (const wall of walls) {
    const near = nearestOnSegment(point, wall.a, wall.b);
    if (near.distance_m <= threshold && (best === null || near.distance_m < best.distance))
      best = { point: near.point, wall, distance: near.distance_m };
  }
  if (best === null) return null;
  const { a, b } = best.wall;
  const guide: Guide = { a, b, why: 'wall' };
  const level = Math.abs(a.y_m - b.y_m) < 1e-9;
  const upright = Math.abs(a.x_m - b.x_m) < 1e-9;
  if (level || upright) {
    const name = level ? 'x_m' : 'y_m';
    const hit = axis(best.point[name], anchors, threshold, name);
    const along = clamp(hit?.value ?? toGrid(best.point[name]), a[name], b[name]);
    const at = level ? { x_m: along, y_m: a.y_m } : { x_m: a.x_m, y_m: along };
    return {
      point: at,
      why: 'wall',
      guides: hit === null ? [guide] : [guide, { a: hit.anchor, b: at, why: 'in line' }],
    };
  }
  const along = Math.min(distance(a, b), toGrid(distance(a, best.point)));
  return { point: towards(a, b, along), why: 'wall', guides: [guide] };
}

function axis(
  value: number,
  anchors: readonly Point[],
  threshold: number,
  name: 'x_m' | 'y_m',
): { value: number; anchor: Point } | null {
  let best: { value: number; anchor: Point; distance: number } | null = null;
  for (const anchor of anchors) {
    const away = Math.abs(anchor[name] - value);
    if (away <= threshold && (best === null || away < best.distance))
      best = { value: anchor[name], anchor, distance: away };
  }
  return best;
}

function nearest(point: Point, candidates: readonly Point[], threshold: number): Point | null {
  let best: Point | null = null;
  for (const candidate of candidates) {
    const limit = best === null ? threshold : distance(point, best);
    if (distance(point, candidate) <= limit) best = candidate;
  }
  return best;
}

function clamp(value: number, a: number, b: number): number {
  return Math.min(Math.max(a, b), Math.max(Math.min(a, b), value));
}
