import type { ReferenceRow } from '../reference-row.ts';

/** Triangular and PERT distributions. */
export const DISTRIBUTION_ROWS: readonly ReferenceRow[] = [
  {
    id: 'triangular',
    method: 'statistics.triangular-fractile',
    inputs: { a: 10, m: 15, b: 25, p: 0.8 },
    expected: { mean: 16.66667, deviation: 3.11805, fractile: 19.52277 },
    tolerance: { rel: 0.0001 },
    origin: 'independent',
    source: 'analytic; @stdlib/jstat agree',
  },
  {
    id: 'triangular-left',
    method: 'statistics.triangular-fractile',
    inputs: { a: 0, m: 10, b: 10, p: 0.25 },
    expected: { fractile: 5, mean: 6.6666667 },
    tolerance: { rel: 1e-6 },
    origin: 'independent',
    source: 'square root of p times the width by hand',
  },
  {
    id: 'triangular-point',
    method: 'statistics.triangular-fractile',
    inputs: { a: 7, m: 7, b: 7, p: 0.3 },
    expected: { mean: 7, deviation: 0, fractile: 7 },
    tolerance: { abs: 1e-12 },
    origin: 'invariant',
    source: 'no spread',
  },
  {
    id: 'pert',
    method: 'statistics.pert-fractile',
    inputs: { a: 10, m: 15, b: 25, p: 0.8 },
    expected: { alpha: 2.33333, beta: 3.66667, mean: 15.83333, deviation: 2.76385, fractile: 18.3123 },
    tolerance: { rel: 0.001 },
    origin: 'independent',
    source: 'Vose/analytic; scipy beta',
  },
  {
    id: 'pert-point',
    method: 'statistics.pert-fractile',
    inputs: { a: 7, m: 7, b: 7, p: 0.3 },
    expected: { mean: 7, deviation: 0, fractile: 7 },
    tolerance: { abs: 1e-12 },
    origin: 'invariant',
    source: 'no spread',
  },
];
