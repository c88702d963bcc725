/** Times, rising, and the rate at each; straight in between. */
export interface Curve {
  readonly time_s: Float64Array;
  readonly rate: Float64Array;
}
