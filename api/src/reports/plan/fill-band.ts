import type { Colour, Point, Sheet } from '../pdf/sheet.ts';
import { INK, LOAD_COLOURS, PAGE, mixed } from '../layout/theme.ts';

/** Distance between hatch lines per band, in points: denser as the load rises; the two deepest bands are cross-hatched. */
const SPACING: readonly (number | null)[] = [null, 13, 8.5, 5.5, 7, 4.2];
const CROSSED_FROM = 4;
const DARK_FROM = 4;

/**
 * Fills rings (the inner of nested ones is a hole) with the colour **and** the hatch of a load band, so that a copy without
 * colour still tells the bands apart. No band: white.
 */
export function fillBand(sheet: Sheet, rings: readonly (readonly Point[])[], band: number | null): void {
  const colour = band === null ? PAGE : (LOAD_COLOURS[band] ?? PAGE);
  sheet.polygon(rings, { fill: colour });
  const spacing = band === null ? null : (SPACING[band] ?? null);
  if (band === null || spacing === null) return;
  const points = rings.flat();
  const xs = points.map(([x]) => x);
  const ys = points.map(([, y]) => y);
  const box = { left: Math.min(...xs), right: Math.max(...xs), top: Math.min(...ys), bottom: Math.max(...ys) };
  const ink = band >= DARK_FROM ? mixed(PAGE, colour, 0.42) : mixed(INK, colour, 0.34);
  sheet.inside(rings, () => {
    hatch(sheet, box, spacing, ink, 1);
    if (band >= CROSSED_FROM) hatch(sheet, box, spacing, ink, -1);
  });
}

interface Box {
  readonly left: number;
  readonly right: number;
  readonly top: number;
  readonly bottom: number;
}

/** Lines at 45° counted from the sheet's own corner, so that neighbouring rooms of one band continue each other. */
function hatch(sheet: Sheet, { left, right, top, bottom }: Box, spacing: number, colour: Colour, slope: 1 | -1): void {
  const step = spacing * Math.SQRT2;
  const height = bottom - top;
  const from = slope === 1 ? left + top : left - bottom;
  const to = slope === 1 ? right + bottom : right - top;
  for (let sum = Math.ceil(from / step) * step; sum <= to; sum += step) {
    const x = slope === 1 ? sum - bottom : sum + top;
    const ends: readonly [Point, Point] =
      slope === 1
        ? [
            [x, bottom],
            [x + height, top],
          ]
        : [
            [x, top],
            [x + height, bottom],
          ];
    sheet.line(ends, { colour, width: 0.45 });
  }
}
