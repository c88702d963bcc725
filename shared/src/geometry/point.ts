/**
 * A place on a storey's plan: x to the right, y up, in metres. A corner row is a point as it stands. The estimate
 * contract writes points as `[x, y]` pairs; the survey converts on the way out.
 */
export interface Point {
  readonly x_m: number;
  readonly y_m: number;
}

/** Corners in order, either way round, not closed by a repeated corner. */
export type Ring = readonly Point[];

/** A ring with rings cut out of it. */
export interface Region {
  readonly ring: Ring;
  readonly holes: readonly Ring[];
}
