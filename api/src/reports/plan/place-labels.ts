import type { Point } from '../pdf/sheet.ts';
import { insideRings, rectMeetsPolygon, rectsOverlap, segmentTouches, type Rect } from './polygon.ts';

export interface LabelSize {
  readonly width: number;
  readonly height: number;
}

export interface LabelRequest {
  readonly id: string;
  /** Outline of the room and its holes on the sheet, in points. */
  readonly rings: readonly (readonly Point[])[];
  /** Footprints of what stands in the room. */
  readonly obstacles: readonly (readonly Point[])[];
  /** Plates from the one that says most to the one that says least; the first that finds room is taken. */
  readonly sizes: readonly LabelSize[];
}

export interface PlacedLabel extends Rect {
  readonly id: string;
  /** Index of the size that found room. */
  readonly size: number;
  /** Where a line from the plate ends, when the plate stands outside its room. */
  readonly pointsAt: Point | null;
}

const CLEARANCE = 2.5;
const MOST_CANDIDATES = 1600;
const OUTSIDE_GAP = 10;
const OUTSIDE_STEP = 4;

/**
 * A place for every label: inside its room on free floor, never over an entry, a wall or another label; the nearest such
 * place to the middle. A label that finds none, even as its smallest plate, stands outside the plan with a line to its
 * room. `plan` is the box of the whole drawing.
 */
export function placeLabels(requests: readonly LabelRequest[], plan: Rect): PlacedLabel[] {
  const placed: PlacedLabel[] = [];
  const waiting: LabelRequest[] = [];
  for (const request of requests) {
    const inside = placeInside(request, placed);
    if (inside === null) waiting.push(request);
    else placed.push(inside);
  }
  for (const request of waiting) placed.push(placeOutside(request, placed, plan));
  return placed;
}

function placeInside(request: LabelRequest, placed: readonly PlacedLabel[]): PlacedLabel | null {
  const box = boxOf(request.rings.flat());
  const middle: Point = [box.x + box.width / 2, box.y + box.height / 2];
  for (const [index, size] of request.sizes.entries()) {
    const [spanX, spanY] = [box.width - size.width, box.height - size.height];
    if (spanX < 0 || spanY < 0) continue;
    const step = Math.max(2, Math.sqrt((spanX * spanY) / MOST_CANDIDATES));
    const candidates = [{ x: box.x + spanX / 2, y: box.y + spanY / 2, far: 0 }];
    const [columns, rows] = [Math.max(1, Math.floor(spanX / step)), Math.max(1, Math.floor(spanY / step))];
    for (let column = 0; column <= columns; column++) {
      for (let row = 0; row <= rows; row++) {
        const x = box.x + (spanX * column) / columns;
        const y = box.y + (spanY * row) / rows;
        candidates.push({ x, y, far: Math.hypot(x + size.width / 2 - middle[0], y + size.height / 2 - middle[1]) });
      }
    }
    candidates.sort((a, b) => a.far - b.far || a.y - b.y || a.x - b.x);
    for (const { x, y } of candidates) {
      const rect = { x, y, ...size };
      if (isFree(rect, request, placed)) return { id: request.id, size: index, ...rect, pointsAt: null };
    }
  }
  return null;
}

function isFree(rect: Rect, request: LabelRequest, placed: readonly PlacedLabel[]): boolean {
  const around = grown(rect, CLEARANCE);
  if (!insideRings([rect.x, rect.y], request.rings)) return false;
  for (const ring of request.rings) {
    for (let at = 0, before = ring.length - 1; at < ring.length; before = at++) {
      if (segmentTouches(ring[before] ?? [0, 0], ring[at] ?? [0, 0], around)) return false;
    }
  }
  return (
    placed.every((other) => !rectsOverlap(around, other)) &&
    request.obstacles.every((obstacle) => !rectMeetsPolygon(around, obstacle))
  );
}

function placeOutside(request: LabelRequest, placed: readonly PlacedLabel[], plan: Rect): PlacedLabel {
  const index = request.sizes.length - 1;
  const size = request.sizes[index] ?? { width: 0, height: 0 };
  const target = middleOf(request.rings);
  const toLeft = target[0] < plan.x + plan.width / 2;
  const columns = toLeft
    ? [plan.x - OUTSIDE_GAP - size.width, plan.x + plan.width + OUTSIDE_GAP]
    : [plan.x + plan.width + OUTSIDE_GAP, plan.x - OUTSIDE_GAP - size.width];
  const rows = Math.max(1, Math.ceil(plan.height / OUTSIDE_STEP));
  const heights = Array.from({ length: rows + 1 }, (_, row) => plan.y + row * OUTSIDE_STEP).sort(
    (a, b) => Math.abs(a - target[1]) - Math.abs(b - target[1]) || a - b,
  );
  for (const x of columns) {
    for (const y of heights) {
      const rect = { x, y: y - size.height / 2, ...size };
      if (placed.every((other) => !rectsOverlap(grown(rect, 1), other))) {
        return { id: request.id, size: index, ...rect, pointsAt: target };
      }
    }
  }
  return { id: request.id, size: index, x: target[0], y: target[1], ...size, pointsAt: null };
}

/** A place on the floor of a room near its middle. */
function middleOf(rings: readonly (readonly Point[])[]): Point {
  const box = boxOf(rings.flat());
  const steps = 24;
  let best: Point = [box.x + box.width / 2, box.y + box.height / 2];
  let nearest = Infinity;
  for (let column = 1; column < steps; column++) {
    for (let row = 1; row < steps; row++) {
      const point: Point = [box.x + (box.width * column) / steps, box.y + (box.height * row) / steps];
      const far = Math.hypot(column - steps / 2, row - steps / 2);
      if (far < nearest && insideRings(point, rings)) [best, nearest] = [point, far];
    }
  }
  return best;
}

function boxOf(points: readonly Point[]): Rect {
  let [left, top, right, bottom] = [Infinity, Infinity, -Infinity, -Infinity];
  for (const [x, y] of points) {
    [left, right] = [Math.min(left, x), Math.max(right, x)];
    [top, bottom] = [Math.min(top, y), Math.max(bottom, y)];
  }
  return { x: left, y: top, width: right - left, height: bottom - top };
}

function grown(rect: Rect, by: number): Rect {
  return { x: rect.x - by, y: rect.y - by, width: rect.width + by * 2, height: rect.height + by * 2 };
}
