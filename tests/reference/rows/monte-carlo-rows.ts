import type { Distribution } from '@embertally/shared/uncertainty/distribution';

/** A sum of masses times heats worked out outside this book. */
export interface MonteCarloRow {
  readonly id: string;
  readonly method: 'uncertainty.monte-carlo';
  readonly items: readonly { readonly mass: Distribution; readonly heat: Distribution; readonly material?: string }[];
  readonly expected: {
    readonly mean?: number;
    readonly deviation?: number;
    /** `[probability, value]` */
    readonly fractiles?: readonly (readonly [number, number])[];
  };
  /** For 200,000 samples. */
  readonly tolerance: { readonly rel: number } | { readonly abs: number };
  readonly origin: 'published' | 'independent' | 'invariant';
  readonly source: string;
  readonly fromMemory?: true;
}

const normal = (mean: number, deviation: number) => ({ kind: 'normal', mean, deviation }) as const;
const triangular = (low: number, mode: number, high: number) => ({ kind: 'triangular', low, mode, high }) as const;
const ONE = triangular(1, 1, 1);
const HALF = 2 * Math.sqrt(3);

/** Bands from samples. */
export const MONTE_CARLO_ROWS: readonly MonteCarloRow[] = [
  {
    id: 'montecarlo-two-items',
    method: 'uncertainty.monte-carlo',
    items: [
      { mass: triangular(80, 100, 130), heat: normal(17.5, 1) },
      { mass: triangular(30, 50, 80), heat: normal(20, 2) },
    ],
    expected: {
      mean: 2875,
      deviation: 311.8,
      fractiles: [
        [0.8, 3138.8],
        [0.95, 3409.9],
      ],
    },
    tolerance: { rel: 0.01 },
    origin: 'independent',
    source: 'two million samples drawn with numpy',
  },
  {
    id: 'recomputed-exact-moments',
    method: 'uncertainty.monte-carlo',
    items: [
      { mass: triangular(60, 90, 130), heat: normal(17, 1.1) },
      { mass: triangular(20, 45, 60), heat: normal(24, 2.4) },
    ],
    expected: { mean: 2586.6667, deviation: 346.1022 },
    tolerance: { rel: 0.005 },
    origin: 'independent',
    source: 'second reader, exact variance of products of independent inputs',
  },
  {
    id: 'jcgm-101-four-normal',
    method: 'uncertainty.monte-carlo',
    // Masses about 10 kg of 1 MJ/kg: each deviates as the inputs of the example do.
    items: Array.from({ length: 4 }, () => ({ mass: normal(10, 1), heat: ONE })),
    expected: {
      mean: 40,
      deviation: 2,
      fractiles: [
        [0.025, 40 - 3.92],
        [0.975, 40 + 3.92],
      ],
    },
    tolerance: { abs: 0.03 },
    origin: 'published',
    source: 'JCGM 101:2008, 9.2.2, table 2: four normal inputs, −3.92 to 3.92',
    fromMemory: true,
  },
  {
    id: 'jcgm-101-four-rectangular',
    method: 'uncertainty.monte-carlo',
    // The sum of two rectangles of standard deviation 1 is a triangle of half width 2√3.
    items: Array.from({ length: 2 }, () => ({ mass: triangular(10 - HALF, 10, 10 + HALF), heat: ONE })),
    expected: {
      mean: 20,
      deviation: 2,
      fractiles: [
        [0.025, 20 - 3.88],
        [0.975, 20 + 3.88],
      ],
    },
    tolerance: { abs: 0.03 },
    origin: 'published',
    source: 'JCGM 101:2008, 9.2.3, table 3: four rectangular inputs, −3.88 to 3.88',
    fromMemory: true,
  },
  {
    id: 'gum-shared-heat',
    method: 'uncertainty.monte-carlo',
    items: [
      { mass: normal(100, 10), heat: normal(17.5, 1), material: 'one' },
      { mass: normal(80, 8), heat: normal(17.5, 1), material: 'one' },
    ],
    // 287.446 to first order (GUM 5.2.2); the products of two deviations add 10² + 8² to its square.
    expected: { mean: 3150, deviation: Math.sqrt(287.446 ** 2 + 10 ** 2 + 8 ** 2) },
    tolerance: { rel: 0.005 },
    origin: 'independent',
    source: 'GUM 5.2.2 with the second-order terms of 5.1.2, note, by hand',
  },
  {
    id: 'lognormal-one-item',
    method: 'uncertainty.monte-carlo',
    items: [{ mass: { kind: 'lognormal', mean: 420, deviation: 126 }, heat: ONE }],
    expected: { mean: 420, deviation: 126, fractiles: [[0.95, 651.99]] },
    tolerance: { rel: 0.01 },
    origin: 'independent',
    source: 'lognormal distribution, mean 420, V 0.3',
  },
  {
    id: 'pert-one-item',
    method: 'uncertainty.monte-carlo',
    items: [{ mass: { kind: 'pert', low: 10, mode: 15, high: 25 }, heat: ONE }],
    expected: { mean: 15.83333, deviation: 2.76385, fractiles: [[0.8, 18.3123]] },
    tolerance: { rel: 0.005 },
    origin: 'independent',
    source: 'beta distribution with shapes 2.3333 and 3.6667 on 10 to 25',
  },
];
