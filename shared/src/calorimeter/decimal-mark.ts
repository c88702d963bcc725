/**
 * Which mark stands before the decimals in cells that are not cut by commas: known as soon as one cell can be read in one
 * way only; null where every cell can be read in two, or where cells disagree.
 */
export function decimalMark(rows: readonly (readonly string[])[]): 'point' | 'comma' | null {
  let point = false;
  let comma = false;
  let doubtful = false;
  for (const cells of rows)
    for (const cell of cells) {
      if (/^[-+]?(?:\d*,\d+)(?:e[-+]?\d+)?$/i.test(cell)) {
        if (/^[-+]?[1-9]\d{0,2},\d{3}$/.test(cell)) doubtful = true;
        else comma = true;
      } else if (/^[-+]?\d*\.\d+(?:e[-+]?\d+)?$/i.test(cell)) point = true;
    }
  if (comma !== point) return comma ? 'comma' : 'point';
  return comma || doubtful ? null : 'point';
}
