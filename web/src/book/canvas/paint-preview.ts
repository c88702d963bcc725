import { footprint } from '@embertally/shared/geometry/footprint';
import type { Point } from '@embertally/shared/geometry/point';
import type { Preview } from '../interaction/preview.ts';
import { paintEntry } from './paint-entry.ts';
import { paintOpening } from './paint-openings.ts';
import { lengthBeside, paintHandle } from './paint-selection.ts';
import { paintText } from './paint-text.ts';
import { at, FIGURES, SANS, traceLine, traceRing, type Pen } from './pen.ts';

const WORD_FONT = `13px ${SANS}`;
const TYPED_FONT = `700 15px ${FIGURES}`;

export interface PreviewLook {
  readonly wallThickness_m: number;
  readonly lengthText: (length_m: number) => string;
}

/** What a gesture would do: things being moved or placed, guides and why it snapped, lengths. */
export function paintPreview(pen: Pen, preview: Preview, look: PreviewLook): void {
  const { palette } = pen;
  const colour = preview.unfit === true ? palette.madder : palette.indigo;
  for (const entry of preview.entries ?? []) {
    paintEntry(pen, entry);
    line(pen, colour, 2, [], () => {
      traceRing(pen, footprint(entry));
    });
  }
  if (preview.ghost !== undefined) paintGhost(pen, preview.ghost, colour);
  if (preview.openingGhost !== undefined) {
    const { opening, a, b } = preview.openingGhost;
    paintOpening(pen, { opening, a, b }, look.wallThickness_m, colour);
    lengthBeside(pen, a, b, look.lengthText);
  }
  if (preview.drawing !== undefined) paintDrawing(pen, preview.drawing, colour, look);
  if (preview.marquee !== undefined) paintMarquee(pen, preview.marquee);
  for (const { a, b } of preview.lengths ?? []) {
    line(pen, colour, 1.5, [], () => {
      traceLine(pen, a, b);
    });
    lengthBeside(pen, a, b, look.lengthText);
  }
  for (const guide of preview.guides ?? [])
    line(pen, palette.indigo, 1, [4, 4], () => {
      traceLine(pen, guide.a, guide.b);
    });
  if (preview.typed !== undefined) {
    const place = at(pen, preview.typed.at);
    paintText(pen, preview.typed.text, { x: place.x, y: place.y - 24 }, TYPED_FONT, palette.indigo);
  } else if (preview.snap?.why != null) {
    const place = at(pen, preview.snap.at);
    paintText(pen, preview.snap.why, { x: place.x + 26, y: place.y + 20 }, WORD_FONT, palette.indigo);
  }
}

function paintGhost(pen: Pen, ghost: NonNullable<Preview['ghost']>, colour: string): void {
  const { context } = pen;
  context.globalAlpha = 0.75;
  paintEntry(pen, ghost);
  context.globalAlpha = 1;
  line(pen, colour, 2, [6, 4], () => {
    traceRing(pen, footprint(ghost));
  });
}

function paintDrawing(pen: Pen, drawing: NonNullable<Preview['drawing']>, colour: string, look: PreviewLook): void {
  const points = drawing.next === null ? drawing.points : [...drawing.points, drawing.next];
  const { context } = pen;
  if (points.length > 2) {
    context.beginPath();
    traceRing(pen, points);
    context.globalAlpha = 0.08;
    context.fillStyle = colour;
    context.fill();
    context.globalAlpha = 1;
  }
  const edges = points.flatMap((a, index): [Point, Point][] => {
    const b = points[index + 1] ?? (drawing.closes ? points[0] : undefined);
    return b === undefined ? [] : [[a, b]];
  });
  line(pen, colour, 3, [], () => {
    for (const [a, b] of edges) traceLine(pen, a, b);
  });
  for (const [a, b] of edges) lengthBeside(pen, a, b, look.lengthText);
  for (const point of drawing.points) paintHandle(pen, point, 'round');
}

function paintMarquee(pen: Pen, { a, b }: NonNullable<Preview['marquee']>): void {
  const { context, palette } = pen;
  const from = at(pen, a);
  const to = at(pen, b);
  context.beginPath();
  context.rect(from.x, from.y, to.x - from.x, to.y - from.y);
  context.globalAlpha = 0.1;
  context.fillStyle = palette.indigo;
  context.fill();
  context.globalAlpha = 1;
  context.strokeStyle = palette.indigo;
  context.lineWidth = 1;
  context.stroke();
}

function line(pen: Pen, colour: string, width: number, dash: readonly number[], trace: () => void): void {
  const { context } = pen;
  context.beginPath();
  trace();
  context.setLineDash([...dash]);
  context.strokeStyle = colour;
  context.lineWidth = width;
  context.stroke();
  context.setLineDash([]);
}
