/**
 * The height of a line at `x`, straight between its points.
 *
 * @param points pairs in rising x
 * @returns null outside the line's ends: a curve says nothing where it was not computed
 */
export function readCurve(points: readonly (readonly [number, number])[], x: number): number | null {
  const first = points[0];
  const last = points.at(-1);
  if (first === undefined || last === undefined || x < first[0] || x > last[0]) return null;
  let low = 0;
  let high = points.length - 1;
  while (high - low > 1) {
    const middle = (low + high) >> 1;
    if ((points[middle]?.[0] ?? 0) <= x) low = middle;
    else high = middle;
  }
  const [x0, y0] = points[low] ?? first;
  const [x1, y1] = points[high] ?? last;
  if (x1 === x0) return y1;
  return y0 + ((x - x0) / (x1 - x0)) * (y1 - y0);
}
