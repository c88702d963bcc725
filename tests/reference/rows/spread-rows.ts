import type { IgnitionClass } from '@embertally/shared/spread/ignition-class';

/** A rectangular room with one door. */
export interface SpreadRowRoom {
  readonly width_m: number;
  readonly depth_m: number;
  readonly height_m: number;
  readonly door_m: readonly [number, number];
  /** One layer all round: W/mK, kg/m³, J/kgK, m. */
  readonly lining: readonly [number, number, number, number];
  readonly exposure_s: number;
}

export interface SpreadRowEntry {
  readonly id: string;
  /** Centre on the plan, m. */
  readonly at: readonly [number, number];
  readonly size: readonly [number, number];
  /** MJ, factors in it */
  readonly E: number;
  /** kW */
  readonly peak: number;
  /** EN: 1000 kW at 600, 300, 150, 75 s. */
  readonly growth: 'slow' | 'medium' | 'fast' | 'ultra-fast';
  readonly lights: IgnitionClass;
  readonly enclosure?: 'cabinet' | 'sealed';
  readonly base_m?: number;
  readonly height_m?: number;
}

/** One fire worked out outside this book, radiative fraction 0.35 throughout. Times within 1 s unless the row says otherwise. */
export interface SpreadRow {
  readonly id: string;
  readonly method: 'spread.simulation';
  /** null: a hall without hot layer, flashover or a cap that is reached */
  readonly room: SpreadRowRoom | null;
  readonly first: string;
  readonly entries: readonly SpreadRowEntry[];
  readonly expected: {
    /** Seconds at which each entry lights; null: never. */
    readonly lights: Readonly<Record<string, number | null>>;
    readonly causes?: Readonly<Record<string, string>>;
    /** Highest flux onto an unlit entry, kW/m². */
    readonly highestFlux?: Readonly<Record<string, number>>;
    readonly dose?: Readonly<Record<string, number>>;
    readonly flashover: number | null;
    readonly released: number;
    readonly peak?: number;
    readonly end?: number;
    readonly atCap?: number;
    /** Flashover with other first entries, s. */
    readonly flashoverFrom?: Readonly<Record<string, number>>;
    readonly worstFirst?: string;
  };
  /** s; 1 where nothing is said. */
  readonly tolerance_s?: number;
  readonly doseTolerance?: number;
  readonly origin: 'independent';
  readonly source: string;
}

const PLASTER_ROOM: SpreadRowRoom = {
  width_m: 5,
  depth_m: 4,
  height_m: 2.7,
  door_m: [0.9, 2],
  lining: [0.48, 1440, 840, 0.016],
  exposure_s: 600,
};

const CHAIN = {
  method: 'spread.simulation',
  room: null,
  first: 'A',
  tolerance_s: 2,
  origin: 'independent',
  source: 'stepping with two step sizes by another implementation',
} as const;
const CHAIN_A = { id: 'A', at: [0, 0], size: [1, 1], E: 3000, peak: 3000, growth: 'slow', lights: 'normal' } as const;
const CHAIN_C = {
  id: 'C',
  at: [3.2, 0],
  size: [0.6, 0.6],
  E: 100,
  peak: 500,
  growth: 'medium',
  lights: 'normal',
} as const;
const CHAIN_B = { id: 'B', size: [0.6, 0.6], E: 40, peak: 300, growth: 'ultra-fast', lights: 'easy' } as const;

export const SPREAD_ROWS: readonly SpreadRow[] = [
  {
    id: 'S2-pair-ignites',
    method: 'spread.simulation',
    room: null,
    first: 'A',
    entries: [
      { id: 'A', at: [0, 0], size: [1.4, 1.4], E: 800, peak: 2500, growth: 'fast', lights: 'normal' },
      { id: 'B', at: [2.5, 0], size: [1, 1], E: 300, peak: 1500, growth: 'fast', lights: 'normal' },
    ],
    expected: {
      lights: { A: 0, B: 328.66 },
      highestFlux: { B: 17.408 },
      causes: { A: 'first', B: 'radiation' },
      flashover: null,
      released: 1100,
      end: 711.3,
    },
    origin: 'independent',
    source: 'quadrature and root finding, no stepping',
  },
  {
    id: 'S3-too-far-no-ignition',
    method: 'spread.simulation',
    room: null,
    first: 'A',
    entries: [
      { id: 'A', at: [0, 0], size: [1.4, 1.4], E: 800, peak: 2500, growth: 'fast', lights: 'normal' },
      { id: 'B', at: [3.5, 0], size: [1, 1], E: 300, peak: 1500, growth: 'fast', lights: 'normal' },
    ],
    expected: {
      lights: { B: null },
      highestFlux: { B: 7.737 },
      dose: { B: 0 },
      flashover: null,
      released: 800,
    },
    origin: 'independent',
    source: 'closed form',
  },
  {
    id: 'S4-too-short-no-ignition',
    method: 'spread.simulation',
    room: null,
    first: 'A',
    entries: [
      { id: 'A', at: [0, 0], size: [1, 1], E: 60, peak: 1000, growth: 'ultra-fast', lights: 'normal' },
      { id: 'B', at: [1.7, 0], size: [1, 1], E: 300, peak: 1500, growth: 'medium', lights: 'hard' },
    ],
    expected: {
      lights: { B: null },
      highestFlux: { B: 19.342 },
      dose: { B: 1211.7 },
      flashover: null,
      released: 60,
    },
    doseTolerance: 0.01,
    origin: 'independent',
    source: 'quadrature',
  },
  {
    id: 'S5-hot-layer-easy-yes-normal-no',
    method: 'spread.simulation',
    room: PLASTER_ROOM,
    first: 'A',
    entries: [
      { id: 'A', at: [0.6, 2], size: [1, 1], E: 500, peak: 1000, growth: 'medium', lights: 'normal' },
      { id: 'B', at: [4.5, 2], size: [0.8, 0.8], E: 200, peak: 800, growth: 'medium', lights: 'normal' },
      { id: 'C', at: [4.5, 3.6], size: [0.5, 0.2], E: 5, peak: 100, growth: 'fast', lights: 'easy' },
    ],
    expected: {
      lights: { B: null, C: 318.68 },
      causes: { C: 'layer' },
      dose: { B: 3024 },
      flashover: null,
      released: 505,
    },
    doseTolerance: 0.02,
    origin: 'independent',
    source: 'ordinary differential equations with an adaptive solver',
  },
  {
    id: 'S6-chain-to-flashover',
    method: 'spread.simulation',
    room: PLASTER_ROOM,
    first: 'A',
    entries: [
      { id: 'A', at: [0.6, 0.6], size: [0.9, 0.9], E: 300, peak: 1500, growth: 'fast', lights: 'normal' },
      { id: 'B', at: [2.6, 0.6], size: [2, 0.9], E: 800, peak: 2500, growth: 'fast', lights: 'normal' },
      { id: 'C', at: [4.7, 3], size: [0.4, 1.8], E: 1500, peak: 1200, growth: 'medium', lights: 'hard' },
      {
        id: 'D',
        at: [0.5, 3.6],
        size: [0.8, 0.6],
        E: 900,
        peak: 800,
        growth: 'medium',
        lights: 'normal',
        enclosure: 'sealed',
      },
      {
        id: 'E',
        at: [2, 3.7],
        size: [1, 0.5],
        E: 600,
        peak: 900,
        growth: 'medium',
        lights: 'normal',
        enclosure: 'cabinet',
      },
    ],
    expected: {
      lights: { A: 0, B: 140.57, C: 183.1, D: null, E: 183.1 },
      causes: { B: 'radiation', C: 'flashover', E: 'flashover' },
      flashover: 183.1,
      released: 3200,
      peak: 3818.4,
      worstFirst: 'A',
      flashoverFrom: { B: 186.75, C: 444.36 },
    },
    origin: 'independent',
    source: 'ordinary differential equations with an adaptive solver, root finding',
  },
  {
    id: 'S7-openings-cap',
    method: 'spread.simulation',
    room: PLASTER_ROOM,
    first: 'X0',
    entries: [0, 1, 2, 3].map((k) => ({
      id: `X${k}`,
      at: [0.5 + k, 2],
      size: [0.9, 0.9],
      E: 1500,
      peak: 3000,
      growth: 'ultra-fast',
      lights: 'normal',
    })),
    expected: {
      lights: { X1: 48.4, X2: 82.11, X3: 86.04 },
      flashover: 86.04,
      released: 6000,
      peak: 3818.4,
      atCap: 1484.7,
      end: 1731,
    },
    origin: 'independent',
    source: 'energy: the area under the room curve is 6000 MJ',
  },
  {
    id: 'S8-long-source-needs-cells',
    method: 'spread.simulation',
    room: null,
    first: 'S',
    entries: [
      { id: 'S', at: [0, 0], size: [6, 0.4], E: 2000, peak: 3000, growth: 'fast', lights: 'normal' },
      { id: 'T', at: [2.5, 1.5], size: [0.6, 0.6], E: 100, peak: 500, growth: 'medium', lights: 'hard' },
    ],
    expected: { lights: { T: 407.85 }, highestFlux: { T: 23.36 }, flashover: null, released: 2100 },
    origin: 'independent',
    source: 'sum over the cells by hand',
  },
  {
    id: 'S9-flame-reaches-overhead',
    method: 'spread.simulation',
    room: null,
    first: 'P',
    entries: [
      { id: 'P', at: [0, 0], size: [1.2, 1.2], E: 400, peak: 2000, growth: 'fast', lights: 'normal', height_m: 1 },
      { id: 'Q', at: [0, 0], size: [1, 1], E: 100, peak: 300, growth: 'medium', lights: 'resistant', base_m: 3 },
    ],
    expected: { lights: { Q: 183.76 }, causes: { Q: 'flame' }, flashover: null, released: 500 },
    origin: 'independent',
    source: 'closed form',
  },
  {
    ...CHAIN,
    id: 'S11-three-entries-near',
    entries: [CHAIN_A, CHAIN_C, { ...CHAIN_B, at: [2, 0] }],
    expected: { lights: { B: 645, C: null }, flashover: null, released: 3040 },
  },
  {
    ...CHAIN,
    id: 'S11-three-entries-farther-and-sooner',
    entries: [CHAIN_A, CHAIN_C, { ...CHAIN_B, at: [2.3515, 0.8485] }],
    expected: { lights: { B: 793, C: 882 }, flashover: null, released: 3140 },
  },
];

/** Gaps of a pair of one of the fires above, m: just not lit, enough, and both of them held for ever; within 1 cm. */
export const GAP_ROWS = [
  {
    id: 'S10-gaps-of-a-pair',
    method: 'spread.gap',
    fire: 'S2-pair-ignites',
    from: 'A',
    expected: { justNot: 1.405, enough: 2.277, longExposureJustNot: 1.939, longExposureEnough: 3.032 },
    origin: 'independent',
    source: 'bisection and closed form',
  },
] as const;
