import { distance } from '@embertally/shared/geometry/distance';
import { nearestOnSegment } from '@embertally/shared/geometry/nearest-on-segment';
import type { Point } from '@embertally/shared/geometry/point';
import { pointInRing } from '@embertally/shared/geometry/point-in-ring';
import { signedArea } from '@embertally/shared/geometry/signed-area';
import type { Selected } from '../session/book-state.ts';
import { distanceToFootprint } from './footprint-space.ts';
import type { Scene } from './scene.ts';

/** Something under the pointer. `distance` in metres: 0 when the pointer is on it. */
export interface Hit extends Selected {
  readonly distance: number;
  /** Area in m² for things that have one: of two under the pointer the smaller is meant. */
  readonly area: number;
}

/** What wins when several things lie under the pointer, first to last. "On" is under the pointer, "near" beside it. */
export const HIT_ORDER = [
  'corner near',
  'opening on',
  'entry on',
  'opening near',
  'entry near',
  'wall on',
  'wall near',
  'room on',
] as const;

export interface HitOptions {
  /** How far beside a thing the pointer still means it, m (pixels ÷ zoom). */
  readonly margin: number;
  /** Corners count only while their room or wall is picked; otherwise they would be in the way of everything. */
  readonly corners?: ReadonlySet<string>;
}

/**
 * Everything under a point, the most likely meant first: by HIT_ORDER, then nearest, then smallest
 * area.
 */
export function hitTest(scene: Scene, point: Point, { margin, corners }: HitOptions): readonly Hit[] {
  const half = scene.storey.wall_thickness_m / 2;
  const hits: Hit[] = [];
  if (corners !== undefined)
    for (const { corners: ids, a, b } of scene.walls)
      for (const [id, at] of [[ids[0], a] as const, [ids[1], b] as const])
        if (corners.has(id) && distance(point, at) <= margin && !hits.some((hit) => hit.id === id))
          hits.push({ kind: 'corner', id, distance: distance(point, at), area: 0 });
  for (const { opening, a, b } of scene.openings) {
    const beside = Math.max(0, nearestOnSegment(point, a, b).distance_m - half);
    if (beside <= margin) hits.push({ kind: 'opening', id: opening.id, distance: beside, area: 0 });
  }
  for (const entry of scene.entries) {
    const beside = distanceToFootprint(point, entry);
    if (beside <= margin / 2)
      hits.push({ kind: 'entry', id: entry.id, distance: beside, area: entry.width_m * entry.depth_m });
  }
  for (const wall of scene.walls) {
    const beside = Math.max(0, nearestOnSegment(point, wall.a, wall.b).distance_m - half);
    if (beside <= margin) hits.push({ kind: 'wall', id: wall.id, distance: beside, area: 0 });
  }
  for (const { room, ring, holes } of scene.rooms)
    if (pointInRing(point, ring) === 'inside' && !holes.some((hole) => pointInRing(point, hole) === 'inside'))
      hits.push({ kind: 'room', id: room.id, distance: 0, area: Math.abs(signedArea(ring)) });
  return hits.sort(byLikelihood);
}

function byLikelihood(a: Hit, b: Hit): number {
  return rank(a) - rank(b) || a.distance - b.distance || a.area - b.area;
}

function rank(hit: Hit): number {
  const place = hit.kind === 'corner' || hit.distance > 0 ? 'near' : 'on';
  const order: readonly string[] = HIT_ORDER;
  return order.indexOf(`${hit.kind} ${place}`);
}
