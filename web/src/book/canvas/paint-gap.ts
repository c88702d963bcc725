import { footprint } from '@embertally/shared/geometry/footprint';
import { nearestBetween } from '@embertally/shared/geometry/nearest-between';
import type { Entry } from '@embertally/shared/survey/survey-document';
import { enoughPlace } from '../spread/enough-place.ts';
import { paintText } from './paint-text.ts';
import { at, CASING_PX, SANS, traceLine, traceRing, type Pen } from './pen.ts';

const FONT = `700 13px ${SANS}`;
/** How far the words stand from the line they belong to. */
const AWAY_PX = 14;

export interface GapLook {
  readonly from: Entry;
  readonly to: Entry;
  /** Null where no gap is enough. */
  readonly enough_m: number | null;
  /** As it stands, m. */
  readonly gap_m: number;
  readonly lengthText: (length_m: number) => string;
}

/** Two entries with the clear distance between them, and where the second would stand if the gap were enough. */
export function paintGap(pen: Pen, { from, to, enough_m, gap_m, lengthText }: GapLook): void {
  const { palette } = pen;
  outline(pen, from, palette.madder, []);
  outline(pen, to, palette.indigo, []);
  if (gap_m > 0) measure(pen, from, to, palette.indigo, `gap ${lengthText(gap_m)}`, -1);
  const place = enough_m === null ? null : enoughPlace(from, to, enough_m);
  if (place === null || enough_m === null) return;
  const moved = { ...to, ...place };
  outline(pen, moved, palette.madder, [6, 4]);
  measure(pen, from, moved, palette.madder, `enough ${lengthText(enough_m)}`, 1);
}

function outline(pen: Pen, entry: Entry, colour: string, dash: readonly number[]): void {
  const { context, palette } = pen;
  context.beginPath();
  traceRing(pen, footprint(entry));
  context.strokeStyle = palette.page;
  context.lineWidth = 2.5 + 2 * CASING_PX;
  context.stroke();
  context.setLineDash([...dash]);
  context.strokeStyle = colour;
  context.lineWidth = 2.5;
  context.stroke();
  context.setLineDash([]);
}

/** A line between the places where two footprints come nearest, with a stroke at either end and its words beside it. */
function measure(pen: Pen, from: Entry, to: Entry, colour: string, words: string, side: 1 | -1): void {
  const { context, palette } = pen;
  const { a, b } = nearestBetween(footprint(from), footprint(to));
  const [start, end] = [at(pen, a), at(pen, b)];
  const span = Math.hypot(end.x - start.x, end.y - start.y);
  const [nx, ny] = span < 1 ? [0, 1] : [-(end.y - start.y) / span, (end.x - start.x) / span];
  for (const [line, width] of [
    [palette.page, 2 + 2 * CASING_PX],
    [colour, 2],
  ] as const) {
    context.beginPath();
    traceLine(pen, a, b);
    for (const { x, y } of [start, end]) {
      context.moveTo(x - nx * 5, y - ny * 5);
      context.lineTo(x + nx * 5, y + ny * 5);
    }
    context.strokeStyle = line;
    context.lineWidth = width;
    context.stroke();
  }
  context.font = FONT;
  const half = context.measureText(words).width / 2;
  const away = AWAY_PX + half * Math.abs(nx);
  const middle = { x: (start.x + end.x) / 2, y: (start.y + end.y) / 2 };
  const beside = (way: number) => ({ x: middle.x + way * nx * away, y: middle.y + way * ny * away });
  const fits = ({ x }: { readonly x: number }) => x - half > 0 && x + half < pen.view.width;
  const place = [side, -side].map(beside).find(fits) ?? beside(side);
  paintText(pen, words, place, FONT, colour);
}
