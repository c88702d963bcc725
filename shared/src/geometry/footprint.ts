import type { Point, Ring } from './point.ts';

export interface Footprint extends Point {
  readonly width_m: number;
  readonly depth_m: number;
  /** Counter-clockwise, degrees. */
  readonly rotation_deg: number;
}

/** The four corners of a rotated rectangle around its centre, counter-clockwise from its own lower left, m. */
export function footprint(rectangle: Footprint): Ring {
  const angle = (rectangle.rotation_deg * Math.PI) / 180;
  const cos = Math.cos(angle);
  const sin = Math.sin(angle);
  const halfWidth = rectangle.width_m / 2;
  const halfDepth = rectangle.depth_m / 2;
  const at = (u: number, v: number): Point => ({
    x_m: rectangle.x_m + u * cos - v * sin,
    y_m: rectangle.y_m + u * sin + v * cos,
  });
  return [at(-halfWidth, -halfDepth), at(halfWidth, -halfDepth), at(halfWidth, halfDepth), at(-halfWidth, halfDepth)];
}
