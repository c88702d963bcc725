import type { Place } from './spread-entry.ts';

/** A footprint with everything that distances ask for worked out once. Lengths in m. */
export interface PlacedRectangle {
  readonly x: number;
  readonly y: number;
  readonly cos: number;
  readonly sin: number;
  /** Half of the width and of the depth. */
  readonly halfWidth: number;
  readonly halfDepth: number;
}

export function placedRectangle(place: Place): PlacedRectangle {
  const angle = (place.rotation_deg * Math.PI) / 180;
  return {
    x: place.x_m,
    y: place.y_m,
    cos: Math.cos(angle),
    sin: Math.sin(angle),
    halfWidth: place.width_m / 2,
    halfDepth: place.depth_m / 2,
  };
}

/** Square of the distance from a point to the nearest place of the rectangle, m²; 0 inside. */
export function squaredDistanceTo(rectangle: PlacedRectangle, x: number, y: number): number {
  const dx = x - rectangle.x;
  const dy = y - rectangle.y;
  const u = Math.abs(dx * rectangle.cos + dy * rectangle.sin) - rectangle.halfWidth;
  const v = Math.abs(dy * rectangle.cos - dx * rectangle.sin) - rectangle.halfDepth;
  return (u > 0 ? u * u : 0) + (v > 0 ? v * v : 0);
}

/** Clear distance between two footprints on the plan, m; 0 where they touch or overlap. */
export function clearDistance(a: PlacedRectangle, b: PlacedRectangle): number {
  if (rectanglesOverlap(a, b)) return 0;
  return Math.sqrt(Math.min(nearestCorner(a, b), nearestCorner(b, a)));
}

function nearestCorner(from: PlacedRectangle, to: PlacedRectangle): number {
  let least = Infinity;
  for (let corner = 0; corner < 4; corner += 1) {
    const u = corner < 2 ? from.halfWidth : -from.halfWidth;
    const v = corner % 2 === 0 ? from.halfDepth : -from.halfDepth;
    const x = from.x + u * from.cos - v * from.sin;
    const y = from.y + u * from.sin + v * from.cos;
    least = Math.min(least, squaredDistanceTo(to, x, y));
  }
  return least;
}

/** Touching edges are no overlap; rounding of a turned plan must not make one. */
const LEAST_OVERLAP_M = 1e-9;

/** Whether two footprints share more than an edge: no side of either keeps them apart. */
export function rectanglesOverlap(a: PlacedRectangle, b: PlacedRectangle): boolean {
  return (
    !apartAlong(a, b, a.cos, a.sin) &&
    !apartAlong(a, b, -a.sin, a.cos) &&
    !apartAlong(a, b, b.cos, b.sin) &&
    !apartAlong(a, b, -b.sin, b.cos)
  );
}

function apartAlong(a: PlacedRectangle, b: PlacedRectangle, x: number, y: number): boolean {
  const between = Math.abs((b.x - a.x) * x + (b.y - a.y) * y);
  return between > reach(a, x, y) + reach(b, x, y) - LEAST_OVERLAP_M;
}

function reach({ cos, sin, halfWidth, halfDepth }: PlacedRectangle, x: number, y: number): number {
  return halfWidth * Math.abs(cos * x + sin * y) + halfDepth * Math.abs(cos * y - sin * x);
}
