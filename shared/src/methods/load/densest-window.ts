import { footprint, type Footprint } from '../../geometry/footprint.ts';
import type { Ring } from '../../geometry/point.ts';
import { overlapArea } from './overlap-area.ts';
import { windowBounds, type HeatBox } from './window-bounds.ts';

export interface PlacedLoad {
  /** MJ */
  readonly heat: number;
  readonly footprint: Footprint;
}

export interface DensestWindow {
  /** MJ/m² */
  readonly density: number;
  /** Lower left corner, m. */
  readonly x: number;
  readonly y: number;
}

interface Box extends HeatBox {
  readonly area: number;
  /** For a footprint that is turned off the axes. */
  readonly ring: Ring | undefined;
}

interface Position {
  readonly heat: number;
  readonly x: number;
  readonly y: number;
}

const SIDE_M = 2;
/** How many columns, and how many windows around a turned footprint, are improved step by step. */
const REFINED = 8;
/** A turn this close to a quarter, as a share of one, stands along the axes. */
const ALONG_AXES = 1e-8;
const FIRST_STEP_M = 0.25;
const FINEST_STEP_M = 0.004;
/** How far the improvement of a start may wander. */
const REACH_M = 1;

/**
 * The window of 2 × 2 m with the most heat. For footprints along the axes the heat inside a window is piecewise
 * bilinear in its position, so the maximum lies where a window edge meets a footprint edge from inside: every such
 * column is swept exactly. Turned footprints take part in the sweep as their bounding boxes; the best columns are then
 * measured exactly and improved step by step.
 */
export function densestWindow(loads: readonly PlacedLoad[]): DensestWindow {
  const boxes = loads.filter(({ heat }) => heat > 0).map(boxOf);
  const turned = boxes.some(({ ring }) => ring !== undefined);
  const swept = sweep(boxes, turned ? REFINED : 1);
  if (swept.length === 0) return { density: 0, x: 0, y: 0 };
  const starts = turned ? [...swept, ...aroundTurned(boxes)] : swept;
  const best = turned ? starts.map((position) => climb(boxes, position)).reduce(hotter) : swept.reduce(hotter);
  return { density: best.heat / (SIDE_M * SIDE_M), x: best.x, y: best.y };
}

/** Windows in the middle of the turned footprints with the most heat: a bounding box says little of a long, turned one. */
function aroundTurned(boxes: readonly Box[]): Position[] {
  return boxes
    .filter(({ ring }) => ring !== undefined)
    .sort((a, b) => b.heat - a.heat)
    .slice(0, REFINED)
    .map(({ heat, x0, x1, y0, y1 }) => ({ heat, x: (x0 + x1 - SIDE_M) / 2, y: (y0 + y1 - SIDE_M) / 2 }));
}

function hotter(a: Position, b: Position): Position {
  return b.heat > a.heat ? b : a;
}

function boxOf({ heat, footprint: rectangle }: PlacedLoad): Box {
  const { x_m, y_m, width_m, depth_m, rotation_deg } = rectangle;
  const area = width_m * depth_m;
  const quarters = rotation_deg / 90;
  if (Math.abs(quarters - Math.round(quarters)) < ALONG_AXES) {
    const upright = Math.round(quarters) % 2 === 0;
    const [halfWidth, halfDepth] = upright ? [width_m / 2, depth_m / 2] : [depth_m / 2, width_m / 2];
    return {
      heat,
      x0: x_m - halfWidth,
      x1: x_m + halfWidth,
      y0: y_m - halfDepth,
      y1: y_m + halfDepth,
      area,
      ring: undefined,
    };
  }
  const ring = footprint(rectangle);
  const xs = ring.map((corner) => corner.x_m);
  const ys = ring.map((corner) => corner.y_m);
  return { heat, x0: Math.min(...xs), x1: Math.max(...xs), y0: Math.min(...ys), y1: Math.max(...ys), area, ring };
}

/** The best position of the best columns, best first, a few at most. Columns that cannot win are left out. */
function sweep(boxes: readonly Box[], keep: number): Position[] {
  if (boxes.length === 0) return [];
  const bounds = windowBounds(boxes, SIDE_M);
  const columns = new Set<number>();
  for (const { x0, x1 } of boxes) columns.add(x0).add(x1 - SIDE_M);
  const events = yEvents(boxes);
  const weights = new Float64Array(boxes.length);
  const weigh = weigher(boxes);
  let kept: Position[] = bounds.start.heat > 0 ? [bounds.start] : [];
  for (const x of [...columns].sort((a, b) => bounds.most(b) - bounds.most(a))) {
    const worst = kept.length < keep ? 0 : kept[kept.length - 1]!.heat;
    if (bounds.most(x) <= worst) break;
    weigh(x, weights);
    const best = sweepColumn(x, events, weights);
    if (best.heat > worst) kept = [...kept, best].sort((a, b) => b.heat - a.heat).slice(0, keep);
  }
  return kept;
}

/** Heat of each box per metre of height, as far as the column at x takes it in. */
function weigher(boxes: readonly Box[]): (x: number, weights: Float64Array) => void {
  const from = Float64Array.from(boxes, ({ x0 }) => x0);
  const to = Float64Array.from(boxes, ({ x1 }) => x1);
  const perArea = Float64Array.from(boxes, ({ heat, x0, x1, y0, y1 }) => heat / ((x1 - x0) * (y1 - y0)));
  return (x, weights) => {
    for (let i = 0; i < weights.length; i += 1) {
      const across = Math.min(to[i]!, x + SIDE_M) - Math.max(from[i]!, x);
      weights[i] = across > 0 ? across * perArea[i]! : 0;
    }
  };
}

interface Events {
  readonly at: Float64Array;
  readonly box: Int32Array;
  readonly sign: Int8Array;
}

/** Where the slope of a box's share in a window changes as the window moves up: rises, flat, falls. */
function yEvents(boxes: readonly Box[]): Events {
  const at = new Float64Array(boxes.length * 4);
  boxes.forEach(({ y0, y1 }, box) => {
    at[4 * box] = y0 - SIDE_M;
    at[4 * box + 1] = Math.min(y0, y1 - SIDE_M);
    at[4 * box + 2] = Math.max(y0, y1 - SIDE_M);
    at[4 * box + 3] = y1;
  });
  const order = Int32Array.from(at, (_, event) => event).sort((a, b) => at[a]! - at[b]!);
  return {
    at: Float64Array.from(order, (event) => at[event]!),
    box: Int32Array.from(order, (event) => event >> 2),
    sign: Int8Array.from(order, (event) => (event % 4 === 0 || event % 4 === 3 ? 1 : -1)),
  };
}

function sweepColumn(x: number, { at, box, sign }: Events, weights: Float64Array): Position {
  let best: Position = { heat: 0, x, y: at[0] ?? 0 };
  let bestHeat = 0;
  let bestAt = -1;
  let heat = 0;
  let slope = 0;
  let previous = 0;
  for (let i = 0; i < at.length; i += 1) {
    const weight = weights[box[i]!]!;
    if (weight === 0) continue;
    const y = at[i]!;
    if (slope !== 0) heat += slope * (y - previous);
    previous = y;
    slope += sign[i]! * weight;
    if (heat > bestHeat) {
      bestHeat = heat;
      bestAt = i;
    }
  }
  if (bestAt >= 0) best = { heat: bestHeat, x, y: at[bestAt]! };
  return best;
}

/** Heat inside the window at a position, turned footprints by their true outline. */
function heatInside(boxes: readonly Box[], x: number, y: number): number {
  let sum = 0;
  for (const { heat, x0, x1, y0, y1, area, ring } of boxes) {
    const across = Math.min(x1, x + SIDE_M) - Math.max(x0, x);
    const along = Math.min(y1, y + SIDE_M) - Math.max(y0, y);
    if (across <= 0 || along <= 0) continue;
    const whole = across >= x1 - x0 && along >= y1 - y0;
    const inside = whole ? area : ring === undefined ? across * along : overlapArea(ring, x, y, x + SIDE_M, y + SIDE_M);
    sum += heat * Math.min(1, inside / area);
  }
  return sum;
}

function climb(all: readonly Box[], start: Position): Position {
  const [x, y] = [start.x - REACH_M, start.y - REACH_M];
  const span = SIDE_M + 2 * REACH_M;
  const boxes = all.filter(({ x0, x1, y0, y1 }) => x1 > x && x0 < x + span && y1 > y && y0 < y + span);
  let best: Position = { ...start, heat: heatInside(boxes, start.x, start.y) };
  for (let step = FIRST_STEP_M; step > FINEST_STEP_M;) {
    const next = [
      [step, 0],
      [-step, 0],
      [0, step],
      [0, -step],
      [step, step],
      [step, -step],
      [-step, step],
      [-step, -step],
    ]
      .map(([dx, dy]) => ({ x: best.x + dx!, y: best.y + dy! }))
      .map(({ x, y }) => ({ x, y, heat: heatInside(boxes, x, y) }))
      .reduce(hotter);
    const near = Math.abs(next.x - start.x) <= REACH_M && Math.abs(next.y - start.y) <= REACH_M;
    if (near && next.heat > best.heat) best = next;
    else step /= 2;
  }
  return best;
}
