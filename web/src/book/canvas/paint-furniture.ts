import { paintText } from './paint-text.ts';
import { SANS, type Pen } from './pen.ts';

const NICE = [0.1, 0.2, 0.5, 1, 2, 5, 10, 20, 50, 100, 200, 500, 1000];
const LONGEST_PX = 170;
const MARGIN_PX = 24;
const FONT = `13px ${SANS}`;

/** What the scale bar counts in. */
interface ScaleUnit {
  readonly unit: string;
  readonly unit_m: number;
}

/** The scale bar at the lower right and, where north is known, its arrow at the upper right. */
export function paintFurniture(pen: Pen, north_deg: number | null, scale: ScaleUnit): void {
  paintScaleBar(pen, scale);
  if (north_deg !== null) paintNorth(pen, north_deg);
}

function paintScaleBar(pen: Pen, { unit, unit_m }: ScaleUnit): void {
  const { context, view, camera, palette } = pen;
  const perUnit_px = unit_m * camera.pxPerM;
  const length = NICE.findLast((nice) => nice * perUnit_px <= LONGEST_PX) ?? 0.1;
  const span = length * perUnit_px;
  const right = Math.round(view.width - MARGIN_PX) + 0.5;
  const left = right - span;
  const y = Math.round(view.height - 30) + 0.5;
  const ticks = [left, left + span / 5, right];
  context.beginPath();
  context.moveTo(left, y);
  context.lineTo(right, y);
  for (const x of ticks) {
    context.moveTo(x, y - 5);
    context.lineTo(x, y + 5);
  }
  for (const [colour, width] of [
    [palette.page, 4],
    [palette.ink, 1.25],
  ] as const) {
    context.strokeStyle = colour;
    context.lineWidth = width;
    context.stroke();
  }
  paintText(pen, '0', { x: left, y: y + 16 }, FONT, palette.ink);
  paintText(pen, `${length} ${unit}`, { x: right - 14, y: y + 16 }, FONT, palette.ink);
}

function paintNorth(pen: Pen, north_deg: number): void {
  const { context, view, palette } = pen;
  const x = view.width - 34;
  const y = 40;
  context.save();
  context.translate(x, y);
  context.rotate((north_deg * Math.PI) / 180);
  context.beginPath();
  context.moveTo(0, -18);
  context.lineTo(7, 12);
  context.lineTo(0, 7);
  context.lineTo(-7, 12);
  context.closePath();
  context.fillStyle = palette.page;
  context.fill();
  context.strokeStyle = palette.ink;
  context.lineWidth = 1.25;
  context.stroke();
  context.beginPath();
  context.moveTo(0, -18);
  context.lineTo(0, 7);
  context.lineTo(-7, 12);
  context.closePath();
  context.fillStyle = palette.ink;
  context.fill();
  context.restore();
  const angle = (north_deg * Math.PI) / 180;
  const tip = { x: x + Math.sin(angle) * 28, y: y - Math.cos(angle) * 28 };
  paintText(pen, 'N', tip, `700 13px ${SANS}`, palette.ink);
}
