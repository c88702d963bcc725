/** One figure of `npm run bench`. `bound` null: printed as a figure, held to nothing. */
export interface BenchRow {
  readonly name: string;
  readonly value: number;
  readonly unit: string;
  readonly bound: number | null;
  /** Whether value ≤ bound; true where there is no bound. */
  readonly holds: boolean;
}

export function atMost(name: string, value: number, unit: string, bound: number | null): BenchRow {
  return { name, value, unit, bound, holds: bound === null || value <= bound };
}

export function percentile(values: readonly number[], p: number): number {
  const sorted = [...values].sort((a, b) => a - b);
  return sorted[Math.min(sorted.length - 1, Math.ceil((p / 100) * sorted.length) - 1)] ?? Number.NaN;
}

export function median(values: readonly number[]): number {
  return percentile(values, 50);
}
