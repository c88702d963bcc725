import type { ViewPoint } from '../interaction/camera.ts';
import type { Pen } from './pen.ts';

/** Words with a halo in page colour, readable on anything. Centred at `at`, turned by `angle` radians. */
export function paintText(pen: Pen, words: string, at: ViewPoint, font: string, colour: string, angle = 0): void {
  const { context, palette } = pen;
  context.save();
  context.translate(at.x, at.y);
  context.rotate(angle);
  context.font = font;
  context.textAlign = 'center';
  context.textBaseline = 'middle';
  context.lineJoin = 'round';
  context.lineWidth = 4;
  context.strokeStyle = palette.page;
  context.strokeText(words, 0, 0);
  context.fillStyle = colour;
  context.fillText(words, 0, 0);
  context.restore();
}

/** Words beside the middle of a line, on its left seen from a to b, never upside down. */
export function paintLength(
  pen: Pen,
  words: string,
  a: ViewPoint,
  b: ViewPoint,
  font: string,
  colour: string,
  away_px: number,
): void {
  const dx = b.x - a.x;
  const dy = b.y - a.y;
  const span = Math.hypot(dx, dy);
  if (span < 24) return;
  const at = { x: (a.x + b.x) / 2 + (dy / span) * away_px, y: (a.y + b.y) / 2 - (dx / span) * away_px };
  let angle = Math.atan2(dy, dx);
  if (angle > Math.PI / 2 + 0.01 || angle <= -Math.PI / 2 + 0.01) angle += Math.PI;
  paintText(pen, words, at, font, colour, angle);
}
