/** The part of jStat these tests use; the package brings no types. */
declare module 'jstat' {
  export const jStat: {
    readonly lognormal: { inv(p: number, mu: number, sigma: number): number };
    readonly beta: {
      cdf(x: number, alpha: number, beta: number): number;
      inv(p: number, alpha: number, beta: number): number;
    };
    readonly normal: {
      cdf(x: number, mean: number, deviation: number): number;
      inv(p: number, mean: number, deviation: number): number;
    };
    readonly triangular: { inv(p: number, low: number, high: number, mode: number): number };
  };
}
