import { at, SANS, type Pen } from './pen.ts';
import { LINE_PX, type RoomPlate } from './room-plates.ts';

export const NAME_FONT = `700 14px ${SANS}`;
export const FIGURE_FONT = `13px ${SANS}`;
const RADIUS_PX = 3;

/** Plates with a room's name and figure. Near a limit: dotted edge; over: double edge; the word stands in the figure. */
export function paintPlates(pen: Pen, plates: readonly RoomPlate[]): void {
  for (const plate of plates) paintPlate(pen, plate);
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
  context.globalAlpha = 0.95;
  context.fill();
  context.globalAlpha = 1;
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
  let y = centre.y - ((plate.lines.length - 1) * LINE_PX) / 2 + 0.5;
  for (const { words, of } of plate.lines) {
    context.font = of === 'name' ? NAME_FONT : FIGURE_FONT;
    const marked = plate.standing === 'near' || plate.standing === 'over';
    context.fillStyle = of === 'name' ? palette.ink : marked ? colour : palette.soft;
    context.fillText(words, centre.x, y);
    y += LINE_PX;
  }
}

function box(context: CanvasRenderingContext2D, x: number, y: number, width: number, height: number): void {
  context.beginPath();
  context.roundRect(x, y, width, height, RADIUS_PX);
}
