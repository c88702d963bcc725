import { footprint, type Footprint } from '@embertally/shared/geometry/footprint';
import type { Point } from '@embertally/shared/geometry/point';
import { bounds, boundsOverlap, type Bounds } from '@embertally/shared/geometry/bounds';
import { pointInRing } from '@embertally/shared/geometry/point-in-ring';

/** A size on the plan, m. */
export interface PlateSize {
  readonly width_m: number;
  readonly height_m: number;
}
export interface PlateWish {
  readonly ring: readonly Point[];
  readonly holes: readonly (readonly Point[])[];
  /** Footprints that must stay visible. */
  readonly entries: readonly Footprint[];
  /** What would be written, fullest first; the first that fits is taken. */
  readonly sizes: readonly PlateSize[];
  /** Distance kept from wall centre lines and entries, m. */
  readonly clearance_m: number;
  /** Where the plate would stand best. */
  readonly wish: Point;
}
export interface Plate {
  readonly centre: Point;
  /** Index of the size that fitted. */
  readonly size: number;
}

interface Blocked {
  readonly ring: readonly Point[];
  readonly box: Bounds;
  /** Stands square to the plan: its box is all of it. */
  readonly square: boolean;
}

const STEPS = 20;

/**
 * Where a room's plate stands: the free place nearest to the wished one that covers no entry and touches no wall, in the
 * fullest wording that fits. Null when no wording fits. A plate always lies within its own room, so plates of different
 * rooms cannot meet.
 */
export function placePlate(request: PlateWish): Plate | null {
  const places = candidates(request.ring, request.wish);
  const blocked = request.entries.map((entry): Blocked => {
    const ring = footprint(entry);
    return { ring, box: bounds(ring), square: Math.abs(entry.rotation_deg % 90) < 1e-9 };
  });
  for (const [size, plate] of request.sizes.entries())
    for (const centre of places) if (isFree(centre, plate, request, blocked)) return { centre, size };
  return null;
}

function candidates(ring: readonly Point[], wish: Point): readonly Point[] {
  const box = bounds(ring);
  const places: Point[] = [wish];
  for (let i = 1; i < STEPS; i++)
    for (let j = 1; j < STEPS; j++)
      places.push({
        x_m: box.minX_m + ((box.maxX_m - box.minX_m) * i) / STEPS,
        y_m: box.minY_m + ((box.maxY_m - box.minY_m) * j) / STEPS,
      });
  const away = (place: Point) => Math.hypot(place.x_m - wish.x_m, place.y_m - wish.y_m);
  return places.sort((a, b) => away(a) - away(b));
}

function isFree(
  centre: Point,
  plate: PlateSize,
  { ring, holes, clearance_m }: PlateWish,
  blocked: readonly Blocked[],
): boolean {
  const kept = rectangle(centre, plate, clearance_m);
  const box = bounds(kept);
  if (blocked.some((entry) => boundsOverlap(entry.box, box) && (entry.square || overlaps(kept, entry.ring))))
    return false;
  if (!kept.every((corner) => pointInRing(corner, ring) === 'inside')) return false;
  if (meetsOutline(kept, ring)) return false;
  return !holes.some((hole) => overlaps(kept, hole));
}

function rectangle(centre: Point, plate: PlateSize, margin: number): readonly Point[] {
  const w = plate.width_m / 2 + margin;
  const h = plate.height_m / 2 + margin;
  return [
    { x_m: centre.x_m - w, y_m: centre.y_m - h },
    { x_m: centre.x_m + w, y_m: centre.y_m - h },
    { x_m: centre.x_m + w, y_m: centre.y_m + h },
    { x_m: centre.x_m - w, y_m: centre.y_m + h },
  ];
}

/** Whether two outlines share any ground: edges that meet, or one inside the other. */
function overlaps(a: readonly Point[], b: readonly Point[]): boolean {
  const [firstA] = a;
  const [firstB] = b;
  if (firstA === undefined || firstB === undefined) return false;
  return meetsOutline(a, b) || pointInRing(firstA, b) !== 'outside' || pointInRing(firstB, a) !== 'outside';
}

/** Whether any edge of an upright rectangle's outline meets any edge of a ring. */
function meetsOutline(box: readonly Point[], ring: readonly Point[]): boolean {
  const around = bounds(box);
  return ring.some((a, index) => {
    const b = ring[(index + 1) % ring.length] ?? a;
    return edgeEntersBox(a, b, around);
  });
}

/** Clips a segment to an upright rectangle: true when any of it is left. */
function edgeEntersBox(a: Point, b: Point, box: ReturnType<typeof bounds>): boolean {
  let from = 0;
  let to = 1;
  const dx = b.x_m - a.x_m;
  const dy = b.y_m - a.y_m;
  const sides: readonly (readonly [number, number])[] = [
    [-dx, a.x_m - box.minX_m],
    [dx, box.maxX_m - a.x_m],
    [-dy, a.y_m - box.minY_m],
    [dy, box.maxY_m - a.y_m],
  ];
  for (const [rate, room] of sides) {
    if (rate === 0) {
      if (room < 0) return false;
      continue;
    }
    const t = room / rate;
    if (rate < 0) from = Math.max(from, t);
    else to = Math.min(to, t);
    if (from > to) return false;
  }
  return true;
}
