import type { View, ViewPoint } from '../interaction/camera.ts';

const AWAY_PX = 44;
const EDGE_PX = 10;

/**
 * Where the strip stands: above or below what is picked, on the side nearer to the view's edge where it fits there, and
 * always whole within the view.
 * @param points Outline of what is picked, px in the view
 * @param strip Its size, px
 */
export function placeStrip(points: readonly ViewPoint[], strip: View, view: View): { left: number; top: number } {
  const left = Math.min(...points.map((point) => point.x));
  const right = Math.max(...points.map((point) => point.x));
  const top = Math.min(...points.map((point) => point.y));
  const bottom = Math.max(...points.map((point) => point.y));
  const above = top - AWAY_PX - strip.height;
  const below = bottom + AWAY_PX;
  const fitsAbove = above >= EDGE_PX;
  const fitsBelow = below + strip.height <= view.height - EDGE_PX;
  // Towards the nearer edge of the view, so that the strip covers the outside rather than the plan.
  const upper = (top + bottom) / 2 <= view.height / 2;
  const wished = fitsAbove && (upper || !fitsBelow) ? above : fitsBelow ? below : EDGE_PX;
  return {
    left: clamp((left + right) / 2 - strip.width / 2, EDGE_PX, view.width - strip.width - EDGE_PX),
    top: clamp(wished, EDGE_PX, view.height - strip.height - EDGE_PX),
  };
}

function clamp(value: number, low: number, high: number): number {
  return Math.max(low, Math.min(Math.max(low, high), value));
}
