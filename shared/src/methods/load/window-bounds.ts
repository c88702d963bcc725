/** A footprint's bounding box with its heat, MJ. */
export interface HeatBox {
  readonly heat: number;
  readonly x0: number;
  readonly x1: number;
  readonly y0: number;
  readonly y1: number;
}

export interface WindowBounds {
  /** A window on the grid with much heat in it: a start that is never better than the best. */
  readonly start: { readonly heat: number; readonly x: number; readonly y: number };
  /** No window with its left edge at x holds more than this, MJ. */
  most(x: number): number;
}

const CELLS_PER_SIDE = 8;
const LARGEST_GRID = 100_000;
/** With so few boxes every column is swept sooner than the grid is filled. */
const FEW_BOXES = 100;

/**
 * Bounds for the search of the densest window: the heat is put on a grid of an eighth of the window's side, so a window
 * anywhere lies inside a block of nine by nine cells.
 */
export function windowBounds(boxes: readonly HeatBox[], side: number): WindowBounds {
  const left = boxes.reduce((least, { x0 }) => Math.min(least, x0), Infinity) - side;
  const low = boxes.reduce((least, { y0 }) => Math.min(least, y0), Infinity) - side;
  const right = boxes.reduce((most, { x1 }) => Math.max(most, x1), -Infinity);
  const top = boxes.reduce((most, { y1 }) => Math.max(most, y1), -Infinity);
  const cell = side / CELLS_PER_SIDE;
  const [columns, rows] = [Math.ceil((right - left) / cell) + 1, Math.ceil((top - low) / cell) + 1];
  if (boxes.length <= FEW_BOXES || !(columns * rows <= LARGEST_GRID)) {
    return { start: { heat: 0, x: left, y: low }, most: () => Infinity };
  }
  const sums = summedHeat(boxes, left, low, cell, columns, rows);
  const bounds = new Float64Array(columns);
  let start = { heat: 0, x: left, y: low };
  const width = columns + 1;
  for (let j = 0; j < rows; j += 1) {
    const below = j * width;
    const above = Math.min(rows, j + CELLS_PER_SIDE) * width;
    const further = Math.min(rows, j + CELLS_PER_SIDE + 1) * width;
    for (let i = 0; i < columns; i += 1) {
      const to = Math.min(columns, i + CELLS_PER_SIDE);
      const beyond = Math.min(columns, to + 1);
      const around = sums[further + beyond]! - sums[below + beyond]! - sums[further + i]! + sums[below + i]!;
      if (around > bounds[i]!) bounds[i] = around;
      const aligned = sums[above + to]! - sums[below + to]! - sums[above + i]! + sums[below + i]!;
      if (aligned > start.heat) start = { heat: aligned, x: left + i * cell, y: low + j * cell };
    }
  }
  return { start, most: (x) => bounds[Math.min(columns - 1, Math.max(0, Math.floor((x - left) / cell)))]! };
}

/** Sums of heat over all cells left of and below each grid point, each box spread evenly. */
function summedHeat(
  boxes: readonly HeatBox[],
  left: number,
  low: number,
  cell: number,
  columns: number,
  rows: number,
): Float64Array {
  const width = columns + 1;
  const sums = new Float64Array(width * (rows + 1));
  for (const { heat, x0, x1, y0, y1 } of boxes) {
    const perArea = heat / ((x1 - x0) * (y1 - y0));
    for (let i = Math.floor((x0 - left) / cell); i < columns && left + i * cell < x1; i += 1) {
      const across = Math.min(x1, left + (i + 1) * cell) - Math.max(x0, left + i * cell);
      for (let j = Math.floor((y0 - low) / cell); j < rows && low + j * cell < y1; j += 1) {
        const along = Math.min(y1, low + (j + 1) * cell) - Math.max(y0, low + j * cell);
        if (across > 0 && along > 0) sums[(j + 1) * width + i + 1]! += perArea * across * along;
      }
    }
  }
  for (let j = 1; j <= rows; j += 1) {
    let row = 0;
    for (let i = 1; i < width; i += 1) {
      row += sums[j * width + i]!;
      sums[j * width + i] = row + sums[(j - 1) * width + i]!;
    }
  }
  return sums;
}
