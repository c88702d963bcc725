import type { Point } from '@embertally/shared/geometry/point';

/** Why something snapped; the word shown beside the pointer. */
export type SnapReason = 'corner' | 'wall' | 'in line' | 'grid';

/** A thin line that shows what was snapped to. */
export interface Guide {
  readonly a: Point;
  readonly b: Point;
  readonly why: SnapReason;
}

export interface Snapped {
  readonly point: Point;
  /** Null: snapping was suspended by its key. */
  readonly why: SnapReason | null;
  readonly guides: readonly Guide[];
}

/** Step of the grid, m. */
export const GRID_M = 0.1;

export function toGrid(value: number): number {
  return Math.round(value / GRID_M) * GRID_M;
}
