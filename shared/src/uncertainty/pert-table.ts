import { incompleteBeta } from '../methods/statistics/incomplete-beta.ts';

const CELLS = 512;

/**
 * Inverse of the PERT distribution on 0 to 1 whose mode is `lean`, straight between 513 tabled points: within 0.002 of
 * the exact one at the ends and within 0.00001 elsewhere. The exact inverse needs sixty steps a sample.
 */
export function pertTable(lean: number): (p: number) => number {
  const below = Float64Array.from({ length: CELLS + 1 }, (_, cell) =>
    incompleteBeta(cell / CELLS, 1 + 4 * lean, 5 - 4 * lean),
  );
  return (p) => {
    let low = 0;
    let high = CELLS;
    while (high - low > 1) {
      const middle = (low + high) >> 1;
      if (below[middle]! <= p) low = middle;
      else high = middle;
    }
    const rise = below[high]! - below[low]!;
    return (low + (rise > 0 ? (p - below[low]!) / rise : 0.5)) / CELLS;
  };
}
