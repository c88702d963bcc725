import { INK, PAGE, SIZE } from '../layout/theme.ts';
import type { Point, Sheet } from '../pdf/sheet.ts';

const RADIUS = 13;

/** A north arrow around `x, y`; `north_deg` is clockwise from the plan's y axis. */
export function drawNorth(sheet: Sheet, x: number, y: number, north_deg: number): void {
  const angle = (north_deg * Math.PI) / 180;
  const at = (degrees: number, radius: number): Point => {
    const turned = angle + (degrees * Math.PI) / 180;
    return [x + Math.sin(turned) * radius, y - Math.cos(turned) * radius];
  };
  const [tip, tail, left, right] = [at(0, RADIUS), at(180, RADIUS * 0.45), at(215, RADIUS), at(145, RADIUS)];
  sheet.polygon([[tip, left, tail]], { fill: INK, stroke: { colour: INK, width: 0.6 } });
  sheet.polygon([[tip, right, tail]], { fill: PAGE, stroke: { colour: INK, width: 0.6 } });
  const [letterX, letterY] = at(0, RADIUS + 7);
  sheet.text('N', letterX, letterY + SIZE.note * 0.36, {
    size: SIZE.note,
    weight: 'bold',
    colour: INK,
    align: 'centre',
  });
}
