import type { Point } from '@embertally/shared/geometry/point';
import { toView, type View, type ViewPoint } from '../interaction/camera.ts';
import type { Camera } from '../session/book-state.ts';
import type { Palette } from './palette.ts';

/** What every painter needs: where to draw, how the plan lies in the view, and in which colours. */
export interface Pen {
  readonly context: CanvasRenderingContext2D;
  readonly camera: Camera;
  readonly view: View;
  readonly palette: Palette;
}

export const CASING_PX = 1.5;
/** The smallest text on the plan, px. */
export const TEXT_PX = 13;
export const SANS = '"Atkinson Hyperlegible", system-ui, sans-serif';
export const FIGURES = '"Atkinson Hyperlegible Mono", ui-monospace, monospace';

export function at(pen: Pen, point: Point): ViewPoint {
  return toView(pen.camera, pen.view, point);
}

/** Adds a ring to the current path. */
export function traceRing(pen: Pen, ring: readonly Point[]): void {
  for (const [index, point] of ring.entries()) {
    const { x, y } = at(pen, point);
    if (index === 0) pen.context.moveTo(x, y);
    else pen.context.lineTo(x, y);
  }
  pen.context.closePath();
}

export function traceLine(pen: Pen, a: Point, b: Point): void {
  const from = at(pen, a);
  const to = at(pen, b);
  pen.context.moveTo(from.x, from.y);
  pen.context.lineTo(to.x, to.y);
}
