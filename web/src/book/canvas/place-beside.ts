import { bounds, boundsOverlap, type Bounds } from '@embertally/shared/geometry/bounds';
import type { Point } from '@embertally/shared/geometry/point';
import { segmentsCross } from '@embertally/shared/geometry/segments-cross';
import type { PlateSize } from './place-plates.ts';

export interface OtherPlate extends PlateSize {
  readonly centre: Point;
}
interface BesideWish {
  /** Where the line may end: free places within the room that is named. */
  readonly ends: readonly Point[];
  /** Of all rooms of the storey. */
  readonly outlines: readonly (readonly Point[])[];
  readonly size: PlateSize;
  /** Between the storey and the plate, m. */
  readonly away_m: number;
  /** Between plates, m. */
  readonly gap_m: number;
  /** Plates that stand already. */
  readonly others: readonly OtherPlate[];
  /** Lines to other rooms. */
  readonly lines: readonly Beside[];
  /** Boxes around what the line should not run over. */
  readonly entries: readonly Bounds[];
}
export interface Beside {
  readonly centre: Point;
  readonly leadsTo: Point;
}

const ROWS = 3;
const STEPS = 10;
/** How much longer a line may be, in heights of its plate, to spare a plate, a line or an entry. */
const SPARE_PLATE = 6;
const SPARE_LINE = 4;
const SPARE_ENTRY = 2;

/**
 * Where the plate of a room without free space stands: in rows above and below the storey, where the line to the room is
 * short and runs over as little as can be. Null when every place is taken or the line has nowhere to end.
 */
export function placeBeside({
  ends,
  outlines,
  size,
  away_m,
  gap_m,
  others,
  lines,
  entries,
}: BesideWish): Beside | null {
  const storey = bounds(outlines.flat());
  const taken = others.map((other) => boxAround(other.centre, other, 0));
  let best: Beside | null = null;
  let least = Infinity;
  for (const end of ends)
    for (const centre of places(storey, end, size, away_m, gap_m)) {
      let cost = Math.hypot(centre.x_m - end.x_m, centre.y_m - end.y_m);
      if (cost >= least) continue;
      const box = boxAround(centre, size, gap_m);
      if (taken.some((other) => boundsOverlap(box, other))) continue;
      const crossed = (boxes: readonly Bounds[]) => boxes.filter((other) => lineMeets(end, centre, other)).length;
      const tangled = lines.filter((line) => segmentsCross(end, centre, line.leadsTo, line.centre)).length;
      cost += size.height_m * (SPARE_PLATE * crossed(taken) + SPARE_LINE * tangled + SPARE_ENTRY * crossed(entries));
      if (cost >= least) continue;
      best = { centre, leadsTo: end };
      least = cost;
    }
  return best;
}

function* places(storey: Bounds, end: Point, size: PlateSize, away_m: number, gap_m: number): Generator<Point> {
  const left = storey.minX_m + size.width_m / 2;
  const right = Math.max(left, storey.maxX_m - size.width_m / 2);
  const straight = Math.min(right, Math.max(left, end.x_m));
  for (let row = 0; row < ROWS; row++) {
    const out = away_m + size.height_m / 2 + row * (size.height_m + gap_m);
    for (const y_m of [storey.minY_m - out, storey.maxY_m + out]) {
      yield { x_m: straight, y_m };
      for (let step = 0; step <= STEPS; step++) yield { x_m: left + ((right - left) * step) / STEPS, y_m };
    }
  }
}

function boxAround({ x_m, y_m }: Point, { width_m, height_m }: PlateSize, margin_m: number): Bounds {
  const w = width_m / 2 + margin_m;
  const h = height_m / 2 + margin_m;
  return { minX_m: x_m - w, minY_m: y_m - h, maxX_m: x_m + w, maxY_m: y_m + h };
}

/** Whether a line runs through an upright rectangle. */
function lineMeets(a: Point, b: Point, box: Bounds): boolean {
  const spans = [
    [a.x_m, b.x_m - a.x_m, box.minX_m, box.maxX_m],
    [a.y_m, b.y_m - a.y_m, box.minY_m, box.maxY_m],
  ] as const;
  let from = 0;
  let to = 1;
  for (const [start, run, low, high] of spans) {
    if (run === 0) {
      if (start < low || start > high) return false;
      continue;
    }
    const [enter, leave] = [(low - start) / run, (high - start) / run];
    from = Math.max(from, Math.min(enter, leave));
    to = Math.min(to, Math.max(enter, leave));
  }
  return from <= to;
}
