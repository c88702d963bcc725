import { toPlan } from '../interaction/camera.ts';
import type { Pen } from './pen.ts';

const STEPS_M = [0.1, 0.5, 1, 5, 10, 50, 100, 500];
const CLOSEST_PX = 26;

/** Hairlines behind the plan at a round distance that stays readable at every zoom. */
export function paintGrid(pen: Pen): void {
  const { context, camera, view, palette } = pen;
  const step = STEPS_M.find((candidate) => candidate * camera.pxPerM >= CLOSEST_PX) ?? 1000;
  const topLeft = toPlan(camera, view, { x: 0, y: 0 });
  const bottomRight = toPlan(camera, view, { x: view.width, y: view.height });
  context.beginPath();
  for (let x = Math.ceil(topLeft.x_m / step) * step; x <= bottomRight.x_m; x += step) {
    const px = Math.round(view.width / 2 + (x - camera.x_m) * camera.pxPerM) + 0.5;
    context.moveTo(px, 0);
    context.lineTo(px, view.height);
  }
  for (let y = Math.ceil(bottomRight.y_m / step) * step; y <= topLeft.y_m; y += step) {
    const py = Math.round(view.height / 2 - (y - camera.y_m) * camera.pxPerM) + 0.5;
    context.moveTo(0, py);
    context.lineTo(view.width, py);
  }
  context.lineWidth = 1;
  context.strokeStyle = palette.rule;
  context.globalAlpha = 0.32;
  context.stroke();
  context.globalAlpha = 1;
}
