import type { Point } from '@embertally/shared/geometry/point';
import { at, type Pen } from './pen.ts';

const ARM_PX = 14;

/** Where the keyboard points. */
export function paintCrosshair(pen: Pen, point: Point): void {
  const { context, palette } = pen;
  const { x, y } = at(pen, point);
  context.beginPath();
  context.moveTo(x - ARM_PX, y);
  context.lineTo(x + ARM_PX, y);
  context.moveTo(x, y - ARM_PX);
  context.lineTo(x, y + ARM_PX);
  for (const [colour, width] of [
    [palette.page, 5],
    [palette.indigo, 2],
  ] as const) {
    context.strokeStyle = colour;
    context.lineWidth = width;
    context.stroke();
  }
}
