import type { Bounds } from '@embertally/shared/geometry/bounds';
import type { Point } from '@embertally/shared/geometry/point';
import type { Camera } from '../session/book-state.ts';

export interface View {
  readonly width: number;
  readonly height: number;
}
/** A place in the view, px from its top left corner. */
export interface ViewPoint {
  readonly x: number;
  readonly y: number;
}
export const MIN_PX_PER_M = 1;
export const MAX_PX_PER_M = 2000;

export function toView(camera: Camera, view: View, point: Point): ViewPoint {
  return {
    x: view.width / 2 + (point.x_m - camera.x_m) * camera.pxPerM,
    y: view.height / 2 - (point.y_m - camera.y_m) * camera.pxPerM,
  };
}

export function toPlan(camera: Camera, view: View, at: ViewPoint): Point {
  return {
    x_m: camera.x_m + (at.x - view.width / 2) / camera.pxPerM,
    y_m: camera.y_m - (at.y - view.height / 2) / camera.pxPerM,
  };
}

/** Moves the plan under the pointer by a number of pixels. */
export function panned(camera: Camera, dx: number, dy: number): Camera {
  return { ...camera, x_m: camera.x_m - dx / camera.pxPerM, y_m: camera.y_m + dy / camera.pxPerM };
}

/** Zooms by a factor; the plan point under `at` stays where it is. Held between 1 and 2,000 px per metre. */
export function zoomed(camera: Camera, view: View, at: ViewPoint, factor: number): Camera {
  const pxPerM = Math.min(MAX_PX_PER_M, Math.max(MIN_PX_PER_M, camera.pxPerM * factor));
  const still = toPlan(camera, view, at);
  return {
    x_m: still.x_m - (at.x - view.width / 2) / pxPerM,
    y_m: still.y_m + (at.y - view.height / 2) / pxPerM,
    pxPerM,
  };
}

/** The camera that shows these bounds whole with a margin in px on every side. */
export function fitted(bounds: Bounds, view: View, marginPx: number): Camera {
  const across = Math.max(0.5, bounds.maxX_m - bounds.minX_m);
  const up = Math.max(0.5, bounds.maxY_m - bounds.minY_m);
  const room = (size: number) => Math.max(40, size - 2 * marginPx);
  const pxPerM = Math.min(room(view.width) / across, room(view.height) / up);
  return {
    x_m: (bounds.minX_m + bounds.maxX_m) / 2,
    y_m: (bounds.minY_m + bounds.maxY_m) / 2,
    pxPerM: Math.min(MAX_PX_PER_M, Math.max(MIN_PX_PER_M, pxPerM)),
  };
}
