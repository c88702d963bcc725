import type { FontBook } from '../pdf/font-book.ts';
import type { Colour, Point, Sheet } from '../pdf/sheet.ts';
import { axisTicks } from './axis-ticks.ts';
import { HAIRLINE, INK, PAGE, RULE, SIZE, SOFT } from './theme.ts';

export interface ChartSeries {
  readonly label: string;
  /** Where the label stands: beside the falling half of the line, or at its end; default end. */
  readonly side?: 'left' | 'right' | 'end';
  readonly points: readonly Point[];
  readonly colour: Colour;
  readonly width?: number;
  readonly dash?: readonly number[];
  readonly fill?: Colour;
}

export interface ChartThreshold {
  readonly label: string;
  readonly value: number;
  readonly colour: Colour;
  readonly dash: readonly number[];
}

export interface ChartFrame {
  readonly x: number;
  readonly y: number;
  readonly width: number;
  readonly height: number;
  readonly xTitle: string;
  readonly yTitle: string;
  readonly figure: (value: number) => string;
}

const AXIS_LEFT = 40;
const AXIS_BELOW = 26;
const TITLE_ABOVE = 14;
const LABEL = SIZE.note;

/**
 * A line chart in vectors: thin ink lines, dash patterns beside colours, labels at the lines, units on the axes. Both
 * axes start at 0. Thresholds above the highest line stretch the axis, so none is left out.
 */
export function drawChart(
  sheet: Sheet,
  book: FontBook,
  frame: ChartFrame,
  series: readonly ChartSeries[],
  thresholds: readonly ChartThreshold[] = [],
): void {
  const points = series.flatMap((one) => one.points);
  const mostX = points.reduce((most, [x]) => Math.max(most, x), 0);
  const mostY = [...points.map(([, y]) => y), ...thresholds.map(({ value }) => value)].reduce(
    (most, y) => Math.max(most, y),
    0,
  );
  const xTicks = axisTicks(mostX, 6);
  const yTicks = axisTicks(mostY * 1.06, 5);
  const [endX, endY] = [Math.max(mostX, 1e-9), yTicks.at(-1) ?? 1];
  const left = frame.x + AXIS_LEFT;
  const top = frame.y + TITLE_ABOVE;
  const right = frame.x + frame.width;
  const bottom = frame.y + frame.height - AXIS_BELOW;
  const atX = (value: number) => left + (value / endX) * (right - left);
  const atY = (value: number) => bottom - (value / endY) * (bottom - top);

  sheet.text(frame.yTitle, frame.x, frame.y + LABEL, { size: LABEL, colour: SOFT });
  for (const tick of yTicks) {
    const y = atY(tick);
    sheet.line(
      [
        [left, y],
        [right, y],
      ],
      { colour: RULE, width: HAIRLINE },
    );
    sheet.text(frame.figure(tick), left - 5, y + LABEL * 0.34, { size: LABEL, colour: SOFT, align: 'right' });
  }
  for (const { points: line, fill } of series) {
    const [first, last] = [line[0], line.at(-1)];
    if (fill === undefined || first === undefined || last === undefined) continue;
    const area: Point[] = [[first[0], 0], ...line, [last[0], 0]];
    sheet.polygon([area.map(([x, y]) => [atX(x), atY(y)])], { fill });
  }
  for (const threshold of thresholds) {
    const y = atY(threshold.value);
    sheet.line(
      [
        [left, y],
        [right, y],
      ],
      { colour: threshold.colour, width: 0.9, dash: threshold.dash },
    );
  }
  for (const { points: line, colour, width, dash } of series) {
    if (line.length < 2) continue;
    const stroke = { colour, width: width ?? 1.2, ...(dash === undefined ? {} : { dash }) };
    sheet.line(
      line.map(([x, y]) => [atX(x), atY(y)] as const),
      stroke,
    );
  }
  sheet.line(
    [
      [left, top],
      [left, bottom],
      [right, bottom],
    ],
    { colour: INK, width: 0.8 },
  );
  for (const tick of xTicks) {
    if (tick > endX * (1 + 1e-9)) continue;
    const x = atX(tick);
    sheet.line(
      [
        [x, bottom],
        [x, bottom + 3],
      ],
      { colour: INK, width: 0.8 },
    );
    sheet.text(frame.figure(tick), x, bottom + LABEL + 5, { size: LABEL, colour: SOFT, align: 'centre' });
  }
  sheet.text(frame.xTitle, right, bottom + LABEL * 2 + 8, { size: LABEL, colour: SOFT, align: 'right' });
  labelLines(sheet, book, { left, right, top, bottom, atX, atY }, series, thresholds);
}

interface Plot {
  readonly left: number;
  readonly right: number;
  readonly top: number;
  readonly bottom: number;
  readonly atX: (value: number) => number;
  readonly atY: (value: number) => number;
}

/** Labels stand above their threshold at the right, or below when another threshold's label is there already. */
function labelLines(
  sheet: Sheet,
  book: FontBook,
  plot: Plot,
  series: readonly ChartSeries[],
  thresholds: readonly ChartThreshold[],
): void {
  const taken: { top: number; bottom: number; left: number }[] = [];
  const put = (label: string, colour: Colour, right: number, y: number) => {
    const wide = book.width(label, LABEL, 'regular');
    const free = (base: number) =>
      base - LABEL >= plot.top - LABEL - 3 &&
      base <= plot.bottom - 1 &&
      taken.every((box) => base - LABEL > box.bottom || base + 1.5 < box.top || right < box.left);
    const rows = [-3, LABEL + 3, -3 - LABEL * 1.4, LABEL * 2.4 + 3, -3 - LABEL * 2.8, LABEL * 3.8 + 3];
    const base = y + (rows.find((row) => free(y + row)) ?? -3);
    sheet.rect(right - wide - 1.5, base - LABEL + 0.5, wide + 3, LABEL + 1.5, { fill: PAGE });
    sheet.text(label, right, base, { size: LABEL, colour, align: 'right' });
    taken.push({ top: base - LABEL, bottom: base + 1.5, left: right - wide });
  };
  for (const { label, value, colour } of [...thresholds].sort((a, b) => b.value - a.value)) {
    put(label, colour, plot.right - 2, plot.atY(value));
  }
  for (const { label, points, colour, side = 'end' } of series) {
    const at = side === 'end' ? points.at(-1) : halfway(points);
    if (label === '' || at === undefined) continue;
    const wide = book.width(label, LABEL, 'regular');
    const [x, y] = [plot.atX(at[0]), plot.atY(at[1])];
    if (side === 'end') put(label, colour, Math.min(plot.right - 2, Math.max(x, plot.left + wide + 4)), y);
    else if (side === 'left') sheet.text(label, x - 5, y + LABEL + 2, { size: LABEL, colour, align: 'right' });
    else sheet.text(label, Math.min(x + 6, plot.right - wide), y - 2, { size: LABEL, colour });
  }
}

/** The place on the falling side of a line where it has come down to half its highest value. */
function halfway(points: readonly Point[]): Point | undefined {
  const most = points.reduce((highest, [, y]) => Math.max(highest, y), 0);
  const top = points.findIndex(([, y]) => y === most);
  const below = points.findIndex(([, y], index) => index > top && y <= most / 2);
  const [a, b] = [points[below - 1], points[below]];
  if (a === undefined || b === undefined || a[1] === b[1]) return points.at(-1);
  const share = (a[1] - most / 2) / (a[1] - b[1]);
  return [a[0] + (b[0] - a[0]) * share, most / 2];
}
