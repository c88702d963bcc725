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

export interface LengthPlace {
  readonly at: ViewPoint;
  /** Radians; never upside down. */
  readonly angle: number;
}

/** Where the length of a line stands: beside its middle, on its left seen from a to b. Null for a line too short for it. */
export function lengthPlace(a: ViewPoint, b: ViewPoint, away_px: number): LengthPlace | null {
  const dx = b.x - a.x;
  const dy = b.y - a.y;
  const span = Math.hypot(dx, dy);
  if (span < 24) return null;
  const at = { x: (a.x + b.x) / 2 + (dy / span) * away_px, y: (a.y + b.y) / 2 - (dx / span) * away_px };
  let angle = Math.atan2(dy, dx);
  if (angle > Math.PI / 2 + 0.01 || angle <= -Math.PI / 2 + 0.01) angle += Math.PI;
  return { at, angle };
}
