import { wrapText } from '../pdf/wrap-text.ts';
import type { Weight } from '../pdf/font-book.ts';
import type { Colour, Sheet } from '../pdf/sheet.ts';
import { drawStandingEdge } from './draw-standing.ts';
import type { Flow } from './flow.ts';
import { HAIRLINE, INK, RULE, SIZE, SOFT, VERDIGRIS } from './theme.ts';

export interface Cell {
  readonly text: string;
  readonly weight?: Weight;
  readonly colour?: Colour;
  /** A dotted line under the words, as for amounts that were only estimated. */
  readonly dotted?: boolean;
  /** The edge of a standing around the words. */
  readonly edge?: 'near' | 'over';
  /** Number of the page to turn to, known once all pages are there; pressing it opens that page. */
  readonly page?: () => Sheet | undefined;
}

export interface Column {
  readonly title: string;
  /** Share of the width that is left over by the fixed columns, or a fixed width in points. */
  readonly width: number | { readonly share: number };
  readonly align?: 'left' | 'right';
}

export interface TableRow {
  readonly cells: readonly (string | Cell)[];
  /** `total`: a double rule above and bold figures; `group`: a subheading over the row. */
  readonly kind?: 'plain' | 'total' | 'group';
}

export interface TableOptions {
  readonly size?: number;
  /** Free space between columns, in points. */
  readonly gutter?: number;
}

interface Placed {
  readonly column: Column;
  readonly x: number;
  readonly width: number;
}

const PADDING = 3;

/**
 * A ledger: a head that is repeated on every page it continues on, hairlines between the rows, text wrapped in its
 * column, figures to the right. A row that is taller than a page continues on the next.
 */
export function writeTable(
  flow: Flow,
  columns: readonly Column[],
  rows: Iterable<TableRow>,
  options: TableOptions = {},
): void {
  const size = options.size ?? SIZE.table;
  const leading = size * 1.28;
  const { book } = flow.file;
  const placed = place(columns, flow.left, flow.width, options.gutter ?? 8);
  const titles = placed.map(({ column, width }) => wrapText(book, column.title, SIZE.note, 'regular', width));
  /** A subheading takes the whole row. */
  const whole: Placed = { column: { title: '', width: flow.width }, x: flow.left, width: flow.width };
  const headHeight = Math.max(1, ...titles.map((lines) => lines.length)) * SIZE.note * 1.28 + PADDING;

  const head = () => {
    const base = flow.y + headHeight - PADDING - 2;
    for (const [at, lines] of titles.entries()) {
      const cell = placed[at];
      if (cell === undefined) continue;
      for (const [line, text] of lines.entries()) {
        const y = base - (lines.length - 1 - line) * SIZE.note * 1.28;
        drawLine(flow.sheet, text, cell, y, { size: SIZE.note, colour: SOFT });
      }
    }
    flow.y += headHeight;
    rule(flow, 0.8, INK);
  };

  flow.need(headHeight + leading * 2);
  head();
  for (const row of rows) {
    const cells = row.cells.map((cell) => (typeof cell === 'string' ? { text: cell } : cell));
    const weight = row.kind === 'total' || row.kind === 'group' ? 'bold' : 'regular';
    const lines = cells.map((cell, at) =>
      wrapText(book, cell.text, size, cell.weight ?? weight, (row.kind === 'group' ? whole : placed[at])?.width ?? 0),
    );
    const tall = Math.max(1, ...lines.map((list) => list.length));
    const keep = row.kind === 'group' ? leading * 2 : 0;
    const fits = tall * leading + PADDING * 2 <= flow.fullHeight - headHeight;
    if (flow.need((fits ? tall : 1) * leading + PADDING * 2 + keep)) head();
    if (row.kind === 'total') totalRule(flow);
    for (let from = 0; from < tall;) {
      if (from > 0) {
        flow.startPage();
        head();
      }
      const room = Math.max(1, Math.floor((flow.free - PADDING * 2) / leading));
      const count = Math.min(tall - from, room);
      for (const [at, list] of lines.entries()) {
        const cell = cells[at];
        const where = row.kind === 'group' ? whole : placed[at];
        if (cell === undefined || where === undefined) continue;
        for (const [line, text] of list.slice(from, from + count).entries()) {
          const y = flow.y + PADDING + line * leading + size * 0.86;
          const width = drawLine(flow.sheet, text, where, y, {
            size,
            colour: cell.colour ?? INK,
            weight: cell.weight ?? weight,
          });
          if (cell.edge !== undefined) {
            drawStandingEdge(flow.sheet, cell.edge, where.x - 4, y - size * 0.95, width + 8, size * 1.38);
          }
          if (cell.dotted === true) dottedUnder(flow.sheet, where.x, y + 2, width);
        }
      }
      if (from === 0) for (const [at, cell] of cells.entries()) turnTo(flow, cell, placed[at], flow.y, size, leading);
      from += count;
      flow.y += count * leading + PADDING * 2;
    }
    if (row.kind !== 'total') rule(flow, HAIRLINE, RULE);
  }
}

function place(columns: readonly Column[], left: number, width: number, gutter: number): Placed[] {
  const fixed = columns.reduce((sum, column) => sum + (typeof column.width === 'number' ? column.width : 0), 0);
  const shares = columns.reduce((sum, column) => sum + (typeof column.width === 'number' ? 0 : column.width.share), 0);
  const over = Math.max(0, width - fixed - gutter * (columns.length - 1));
  let x = left;
  return columns.map((column) => {
    const wide = typeof column.width === 'number' ? column.width : (over * column.width.share) / shares;
    const placed = { column, x, width: wide };
    x += wide + gutter;
    return placed;
  });
}

function drawLine(
  sheet: Sheet,
  text: string,
  { column, x, width }: Placed,
  y: number,
  style: { size: number; colour: Colour; weight?: Weight },
): number {
  return column.align === 'right'
    ? sheet.text(text, x + width, y, { ...style, align: 'right' })
    : sheet.text(text, x, y, style);
}

function turnTo(
  flow: Flow,
  { page }: Cell,
  where: Placed | undefined,
  top: number,
  size: number,
  leading: number,
): void {
  if (page === undefined || where === undefined) return;
  const { sheet } = flow;
  flow.later(() => {
    const target = page();
    if (target === undefined) return;
    drawLine(sheet, String(flow.pageOf(target)), where, top + PADDING + size * 0.86, { size, colour: VERDIGRIS });
    sheet.link(where.x, top, where.width, leading + PADDING * 2, target);
  });
}

function rule(flow: Flow, width: number, colour: Colour): void {
  flow.sheet.line(
    [
      [flow.left, flow.y],
      [flow.right, flow.y],
    ],
    { colour, width },
  );
}

function totalRule(flow: Flow): void {
  rule(flow, 0.8, INK);
  flow.y += 2;
  rule(flow, 0.8, INK);
}

function dottedUnder(sheet: Sheet, x: number, y: number, width: number): void {
  sheet.line(
    [
      [x, y],
      [x + width, y],
    ],
    { colour: SOFT, width: 0.7, dash: [0, 1.8], cap: 'round' },
  );
}
