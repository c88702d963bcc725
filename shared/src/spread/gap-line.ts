import { clearDistance, type PlacedRectangle } from './placed-rectangle.ts';
import { viewFactor, type RadiatingFootprint } from './radiation.ts';

/** m */
const FINE = 0.001;
const GRID = 10;
const MOST_TRIES = 60;

/** A distance, or why none keeps the fire away. */
export type Gap =
  { readonly metres: number; readonly never?: undefined } | { readonly metres: null; readonly never: string };

export const LAYER_ALONE = 'The hot layer alone would light it.';

export interface GapLine {
  /** The clear gap, m, from which on the first entry is seen by no more than a view, 1/m²; 0 when contact is no more. */
  gapFor(view: number): Gap;
}

/**
 * The second entry moved straight away along the line of centres (along the first one's depth where the centres are one),
 * seen from the first.
 * @param smallest the smallest view above 0 that will be asked for, 1/m²; Infinity when there is none
 */
export function gapLine(
  source: RadiatingFootprint,
  here: PlacedRectangle,
  there: PlacedRectangle,
  smallest: number,
): GapLine {
  const apart = Math.hypot(there.x - here.x, there.y - here.y);
  const [x, y] = apart > FINE ? [(there.x - here.x) / apart, (there.y - here.y) / apart] : [-here.sin, here.cos];
  const moved = { ...there };
  const moveTo = (centres: number): PlacedRectangle => {
    moved.x = here.x + x * centres;
    moved.y = here.y + y * centres;
    return moved;
  };
  /** Distance of a single point with the same view: nearly a straight line over the distance of centres. */
  const distanceAt = (centres: number) => distanceOf(viewFactor(source, moveTo(centres)));
  const reach = Math.hypot(here.halfWidth, here.halfDepth) + Math.hypot(there.halfWidth, there.halfDepth);
  const farthest = Number.isFinite(smallest) ? distanceOf(smallest) + reach + FINE : 0;
  const grid = source.cells.length === 1 ? 1 : GRID;
  const seen = Array.from({ length: farthest > 0 ? grid + 1 : 0 }, (_, k) => distanceAt((farthest * k) / grid));

  /** The outermost place from which on the view is less; past a long source the view may rise before it falls. */
  function gapFor(view: number): Gap {
    if (view === 0) return { metres: null, never: LAYER_ALONE };
    const wanted = distanceOf(view);
    const inside = seen.findLastIndex((at) => at <= wanted);
    if (inside < 0 || inside === grid) return { metres: 0 };
    const [low, high] = [(farthest * inside) / grid, (farthest * (inside + 1)) / grid];
    const off = [seen[inside]! - wanted, seen[inside + 1]! - wanted] as const;
    return { metres: clearDistance(here, moveTo(rootBetween((c) => distanceAt(c) - wanted, low, high, ...off))) };
  }
  return { gapFor };
}

/** Distance at which a single point is seen by a view, m. */
export function distanceOf(view: number): number {
  return 1 / Math.sqrt(4 * Math.PI * view);
}

/** Where a rising function passes 0, from its values at both ends; regula falsi after Dowell & Jarratt (Illinois). */
function rootBetween(f: (x: number) => number, low: number, high: number, atLow: number, atHigh: number): number {
  let side = 0;
  for (let i = 0; i < MOST_TRIES && high - low > FINE / 2; i += 1) {
    const x = (low * atHigh - high * atLow) / (atHigh - atLow);
    const value = f(x);
    if (Math.abs(value) < FINE / 10) return x;
    if (value > 0) {
      [high, atHigh] = [x, value];
      if (side === 1) atLow /= 2;
      side = 1;
    } else {
      [low, atLow] = [x, value];
      if (side === -1) atHigh /= 2;
      side = -1;
    }
  }
  return high;
}
