import type { Opening } from '@embertally/shared/survey/survey-document';
import type { OpeningShape } from '../interaction/scene.ts';
import { at, CASING_PX, type Pen } from './pen.ts';
import { wallWidth_px } from './paint-walls.ts';

/** Openings cut into their walls: each kind has its own drawing, and a closed one shows a line across. */
export function paintOpenings(pen: Pen, openings: readonly OpeningShape[], thickness_m: number): void {
  for (const shape of openings) paintOpening(pen, shape, thickness_m, pen.palette.ink);
}

export function paintOpening(
  pen: Pen,
  { opening, a, b }: Pick<OpeningShape, 'a' | 'b'> & { opening: Pick<Opening, 'kind' | 'state'> },
  thickness_m: number,
  line: string,
): void {
  const { context } = pen;
  const from = at(pen, a);
  const to = at(pen, b);
  const span = Math.hypot(to.x - from.x, to.y - from.y);
  if (span < 1) return;
  const half = wallWidth_px(pen, thickness_m) / 2 + CASING_PX;
  context.save();
  // From here the opening lies along x, its wall around y = 0.
  context.translate(from.x, from.y);
  context.rotate(Math.atan2(to.y - from.y, to.x - from.x));
  context.fillStyle = pen.palette.page;
  context.fillRect(0, -half, span, 2 * half);
  context.strokeStyle = line;
  context.lineWidth = 1.25;
  context.beginPath();
  context.moveTo(0, -half);
  context.lineTo(0, half);
  context.moveTo(span, -half);
  context.lineTo(span, half);
  traceKind(context, opening, span, half);
  context.stroke();
  context.restore();
}

function traceKind(
  context: CanvasRenderingContext2D,
  { kind, state }: Pick<Opening, 'kind' | 'state'>,
  span: number,
  half: number,
): void {
  const across = (y: number) => {
    context.moveTo(0, y);
    context.lineTo(span, y);
  };
  switch (kind) {
    case 'window':
      across(-half * 0.45);
      across(half * 0.45);
      break;
    case 'door':
      if (state === 'open') {
        // The leaf stands open: its swing is only worth drawing when there is room for it.
        const leaf = Math.min(span, 60);
        context.moveTo(0, -half);
        context.lineTo(0, -half - leaf);
      } else across(0);
      break;
    case 'shutter':
      across(-half * 0.5);
      for (let x = 4; x < span; x += 6) {
        context.moveTo(x, -half * 0.5);
        context.lineTo(x, half * 0.5);
      }
      break;
    case 'vent':
      for (let x = 0; x + half <= span; x += half * 2) {
        context.moveTo(x, half * 0.7);
        context.lineTo(Math.min(span, x + half * 1.4), -half * 0.7);
      }
      break;
    case 'gap':
      break;
  }
}
