import type { Point } from '@embertally/shared/geometry/point';
import { at, CASING_PX, SANS, traceLine, type Pen } from './pen.ts';
import { LINE_PX, type PlateLine, type PlateSize, type RoomPlate } from './room-plates.ts';

export const PLATE_FONTS: Readonly<Record<PlateSize, Readonly<Record<PlateLine['of'], string>>>> = {
  usual: { name: `700 14px ${SANS}`, figure: `13px ${SANS}` },
  small: { name: `700 12px ${SANS}`, figure: `12px ${SANS}` },
};
const RADIUS_PX = 3;
const LINE_END_PX = 2.5;

/** Plates with a room's name and figure. Near a limit: dotted edge; over: double edge; the word stands in the figure. */
export function paintPlates(pen: Pen, plates: readonly RoomPlate[]): void {
  for (const plate of plates) if (plate.leadsTo !== null) paintLeader(pen, plate.centre, plate.leadsTo);
  for (const plate of plates) paintPlate(pen, plate);
}

/** A line from a plate beside the storey to its room, with a dot where it ends. */
function paintLeader(pen: Pen, plate: Point, room: Point): void {
  const { context, palette } = pen;
  const end = at(pen, room);
  context.lineCap = 'round';
  for (const [colour, width, dot] of [
    [palette.page, 1 + 2 * CASING_PX, LINE_END_PX + CASING_PX],
    [palette.ink, 1, LINE_END_PX],
  ] as const) {
    context.beginPath();
    traceLine(pen, plate, room);
    context.strokeStyle = colour;
    context.lineWidth = width;
    context.stroke();
    context.beginPath();
    context.arc(end.x, end.y, dot, 0, 2 * Math.PI);
    context.fillStyle = colour;
    context.fill();
  }
}

function paintPlate(pen: Pen, plate: RoomPlate): void {
  const { context, palette } = pen;
  const centre = at(pen, plate.centre);
  const left = Math.round(centre.x - plate.width_px / 2) + 0.5;
  const top = Math.round(centre.y - plate.height_px / 2) + 0.5;
  const colour = { near: palette.ochre, over: palette.madder, within: palette.ink, 'no limit set': palette.ink }[
    plate.standing
  ];
  box(context, left, top, plate.width_px, plate.height_px);
  context.fillStyle = palette.page;
  context.fill();
  context.strokeStyle = plate.standing === 'over' || plate.standing === 'near' ? colour : palette.ink;
  context.lineWidth = plate.standing === 'near' ? 1.5 : 1;
  if (plate.standing === 'near') context.setLineDash([1.5, 2.5]);
  context.stroke();
  context.setLineDash([]);
  if (plate.standing === 'over') {
    box(context, left + 2.5, top + 2.5, plate.width_px - 5, plate.height_px - 5);
    context.stroke();
  }
  context.textAlign = 'center';
  context.textBaseline = 'middle';
  let y = centre.y - ((plate.lines.length - 1) * LINE_PX[plate.size]) / 2 + 0.5;
  for (const { words, of } of plate.lines) {
    context.font = PLATE_FONTS[plate.size][of];
    const marked = plate.standing === 'near' || plate.standing === 'over';
    context.fillStyle = of === 'name' ? palette.ink : marked ? colour : palette.soft;
    context.fillText(words, centre.x, y);
    y += LINE_PX[plate.size];
  }
}

function box(context: CanvasRenderingContext2D, x: number, y: number, width: number, height: number): void {
  context.beginPath();
  context.roundRect(x, y, width, height, RADIUS_PX);
}
