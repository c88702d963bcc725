import type { Footprint } from '@embertally/shared/geometry/footprint';
import { clearDistance, placedRectangle } from '@embertally/shared/spread/placed-rectangle';

const HALVINGS = 40;
const SAME_PLACE_M = 0.001;

/**
 * Where an entry would stand with a given clear distance from another one, moved straight away from it along the line of
 * centres (along the first one's depth where the centres are one). Null when it stands that far already.
 */
export function enoughPlace(from: Footprint, to: Footprint, enough_m: number): Footprint | null {
  const flat = { base_m: 0, height_m: 1 };
  const here = placedRectangle({ ...from, ...flat });
  const apart = Math.hypot(to.x_m - from.x_m, to.y_m - from.y_m);
  const [x, y] =
    apart > SAME_PLACE_M ? [(to.x_m - from.x_m) / apart, (to.y_m - from.y_m) / apart] : [-here.sin, here.cos];
  const moved = (by_m: number): Footprint => ({ ...to, x_m: to.x_m + x * by_m, y_m: to.y_m + y * by_m });
  const clear = (by_m: number): number => clearDistance(here, placedRectangle({ ...moved(by_m), ...flat }));
  if (clear(0) >= enough_m) return null;
  let low = 0;
  let high = enough_m + Math.hypot(from.width_m, from.depth_m) + Math.hypot(to.width_m, to.depth_m);
  for (let i = 0; i < HALVINGS; i += 1) {
    const middle = (low + high) / 2;
    if (clear(middle) < enough_m) low = middle;
    else high = middle;
  }
  return moved(high);
}
