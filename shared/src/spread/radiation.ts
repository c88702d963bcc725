import { squaredDistanceTo, type PlacedRectangle } from './placed-rectangle.ts';

/** About the most a flame gives off to what it touches, kW/m²; common practice. */
export const MOST_FLUX_KW_M2 = 120;
/** Nearer than this many diameters the point source has not been tested. */
export const NEAR_FIELD_DIAMETERS = 2.5;
const MOST_CELLS = 10;

/** A footprint that radiates: equal cells along its longer side, power shared equally. */
export interface RadiatingFootprint {
  /** Centres of the cells, m. */
  readonly cells: readonly { readonly x: number; readonly y: number }[];
  /** Half of the shorter side, m: nothing is nearer to a cell than this. */
  readonly halfShort: number;
  /** Of the circle with the same area, m. */
  readonly diameter: number;
}

/** Between 1 and 10 cells; a long item seen from its centre alone would look too far away. */
export function radiatingFootprint(rectangle: PlacedRectangle): RadiatingFootprint {
  const { x, y, cos, sin, halfWidth, halfDepth } = rectangle;
  const wide = halfWidth >= halfDepth;
  const halfLong = wide ? halfWidth : halfDepth;
  const halfShort = wide ? halfDepth : halfWidth;
  const count = Math.min(MOST_CELLS, Math.max(1, Math.round(halfLong / halfShort)));
  const [alongX, alongY] = wide ? [cos, sin] : [-sin, cos];
  const cells = Array.from({ length: count }, (_, k) => {
    const offset = ((2 * k + 1) / count - 1) * halfLong;
    return { x: x + offset * alongX, y: y + offset * alongY };
  });
  return { cells, halfShort, diameter: Math.sqrt((16 * halfWidth * halfDepth) / Math.PI) };
}

/**
 * Share of a source's radiation that meets each square metre of a target, 1/m²: G = (1/N) Σ 1/(4πR²), R from the centre of a
 * cell to the nearest point of the target's footprint, not less than half of the source's shorter side. The target faces
 * the source at the height of the middle of the flame and nothing stands between: all three err to earlier ignition.
 */
export function viewFactor(source: RadiatingFootprint, target: PlacedRectangle): number {
  const least = source.halfShort * source.halfShort;
  let sum = 0;
  for (const { x, y } of source.cells) sum += 1 / Math.max(least, squaredDistanceTo(target, x, y));
  return sum / (4 * Math.PI * source.cells.length);
}

/** Distance from the nearest cell to the target, m, floored as in the view. */
export function nearestCell(source: RadiatingFootprint, target: PlacedRectangle): number {
  let least = Infinity;
  for (const { x, y } of source.cells) least = Math.min(least, squaredDistanceTo(target, x, y));
  return Math.max(source.halfShort, Math.sqrt(least));
}
