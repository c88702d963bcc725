import { footprint } from '@embertally/shared/geometry/footprint';
import type { Ring } from '@embertally/shared/geometry/point';
import type { Entry } from '@embertally/shared/survey/survey-document';
import type { LitEntry, SpreadMoment } from '../spread/spread-moment.ts';
import { paintText } from './paint-text.ts';
import { at, CASING_PX, SANS, traceRing, type Pen } from './pen.ts';

/** Distance of the hatch's lines, px: what has burned for a while is hatched more closely than what was just lit. */
const HATCH_PX = { 'just lit': 9, burning: 5 } as const;
const NUMBER_PX = 10;
const NUMBER_FONT = `700 12px ${SANS}`;
const WORD_FONT = `700 13px ${SANS}`;
const ARROW_PX = 9;

export interface FireLook {
  readonly entries: ReadonlyMap<string, Entry>;
  readonly moment: SpreadMoment;
  /** Corners of the room, for its edge once it has flashed over. */
  readonly room: Ring;
  /** Said at what lights next: "in 40 s". */
  readonly nextText: string;
}

/** A fire as it stands at one moment: what burns, in which order it was lit and by what, and what lights next. */
export function paintFire(pen: Pen, { entries, moment, room, nextText }: FireLook): void {
  const { palette } = pen;
  if (moment.flashedOver) paintRoomAlight(pen, room);
  for (const lit of moment.lit) paintLit(pen, entries.get(lit.id), lit);
  for (const event of moment.next) {
    const entry = entries.get(event.id ?? '');
    if (entry !== undefined) paintNext(pen, entry);
  }
  const { latest } = moment;
  const from = entries.get(latest?.from ?? '');
  const to = entries.get(latest?.id ?? '');
  if (from !== undefined && to !== undefined) paintArrow(pen, from, to);
  for (const lit of moment.lit) paintNumber(pen, entries.get(lit.id), lit);
  const [first] = moment.next;
  const next = entries.get(first?.id ?? '');
  if (next !== undefined && moment.next.length === 1) {
    const { x, y } = at(pen, next);
    paintText(pen, nextText, { x, y }, WORD_FONT, palette.madder);
  }
}

function paintLit(pen: Pen, entry: Entry | undefined, { stage }: LitEntry): void {
  if (entry === undefined) return;
  const { context, palette } = pen;
  const ring = footprint(entry);
  const colour = stage === 'burning' ? palette.madder : palette.ochre;
  context.save();
  context.beginPath();
  traceRing(pen, ring);
  context.lineJoin = 'miter';
  context.strokeStyle = palette.page;
  context.lineWidth = 3 + 2 * CASING_PX;
  context.stroke();
  context.fillStyle = colour;
  context.fill();
  context.strokeStyle = colour;
  context.lineWidth = 3;
  context.stroke();
  context.clip();
  hatch(pen, ring, HATCH_PX[stage]);
  context.restore();
}

/** Slanted lines in page colour over what the path was clipped to. */
function hatch(pen: Pen, ring: Ring, apart_px: number): void {
  const { context, palette } = pen;
  const corners = ring.map((corner) => at(pen, corner));
  const left = Math.min(...corners.map(({ x }) => x));
  const right = Math.max(...corners.map(({ x }) => x));
  const top = Math.min(...corners.map(({ y }) => y));
  const bottom = Math.max(...corners.map(({ y }) => y));
  context.beginPath();
  for (let x = left - (bottom - top); x < right; x += apart_px) {
    context.moveTo(x, bottom);
    context.lineTo(x + (bottom - top), top);
  }
  context.globalAlpha = 0.5;
  context.strokeStyle = palette.page;
  context.lineWidth = 1.25;
  context.stroke();
  context.globalAlpha = 1;
}

function paintNumber(pen: Pen, entry: Entry | undefined, { order }: LitEntry): void {
  if (entry === undefined) return;
  const { context, palette } = pen;
  const { x, y } = at(pen, entry);
  const words = String(order);
  context.font = NUMBER_FONT;
  const half = Math.max(NUMBER_PX, context.measureText(words).width / 2 + 5);
  context.beginPath();
  context.roundRect(x - half, y - NUMBER_PX, 2 * half, 2 * NUMBER_PX, NUMBER_PX);
  context.fillStyle = palette.page;
  context.fill();
  context.strokeStyle = palette.ink;
  context.lineWidth = 1.5;
  context.stroke();
  context.fillStyle = palette.ink;
  context.textAlign = 'center';
  context.textBaseline = 'middle';
  context.fillText(words, x, y + 0.5);
}

function paintNext(pen: Pen, entry: Entry): void {
  const { context, palette } = pen;
  context.beginPath();
  traceRing(pen, footprint(entry));
  context.strokeStyle = palette.page;
  context.lineWidth = 2 + 2 * CASING_PX;
  context.stroke();
  context.setLineDash([6, 4]);
  context.strokeStyle = palette.madder;
  context.lineWidth = 2;
  context.stroke();
  context.setLineDash([]);
}

/** From what radiates to what it lit. */
function paintArrow(pen: Pen, from: Entry, to: Entry): void {
  const { context, palette } = pen;
  const a = at(pen, from);
  const b = at(pen, to);
  const span = Math.hypot(b.x - a.x, b.y - a.y);
  const gone = NUMBER_PX + 4;
  if (span < 2 * gone + ARROW_PX) return;
  const [ux, uy] = [(b.x - a.x) / span, (b.y - a.y) / span];
  const tip = { x: b.x - ux * gone, y: b.y - uy * gone };
  const back = { x: tip.x - ux * ARROW_PX, y: tip.y - uy * ARROW_PX };
  for (const [colour, width] of [
    [palette.page, 2.5 + 2 * CASING_PX],
    [palette.ink, 2.5],
  ] as const) {
    context.beginPath();
    context.moveTo(a.x + ux * gone, a.y + uy * gone);
    context.lineTo(back.x, back.y);
    context.strokeStyle = colour;
    context.lineWidth = width;
    context.stroke();
    context.beginPath();
    context.moveTo(tip.x, tip.y);
    context.lineTo(back.x - uy * ARROW_PX * 0.6, back.y + ux * ARROW_PX * 0.6);
    context.lineTo(back.x + uy * ARROW_PX * 0.6, back.y - ux * ARROW_PX * 0.6);
    context.closePath();
    context.lineWidth = width - 2.5;
    if (width > 2.5) context.stroke();
    context.fillStyle = colour;
    context.fill();
  }
}

/** The edge of a room that has flashed over: a double line. */
function paintRoomAlight(pen: Pen, room: Ring): void {
  const { context, palette } = pen;
  for (const [colour, width] of [
    [palette.page, 9],
    [palette.madder, 6],
    [palette.page, 2],
  ] as const) {
    context.beginPath();
    traceRing(pen, room);
    context.strokeStyle = colour;
    context.lineWidth = width;
    context.stroke();
  }
}
