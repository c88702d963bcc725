import type { ReferenceRow } from '../reference-row.ts';

const OFFICE_TEST = 'Schaumann & Trautmann, Example to EN 1991 Part 1-2: compartment fire (room and linings read)';

/** Frequency factors of the Gumbel distribution by return period, Chow: mean + K standard deviations. */
const FREQUENCY_FACTORS = [
  [5, 0.719],
  [10, 1.305],
  [20, 1.866],
  [50, 2.592],
  [100, 3.137],
] as const;

/** Conductivity, density, specific heat; kρc as printed, W²s/m⁴K². */
const INERTIAS = [
  ['steel', 45.8, 7850, 460, 1.6e8],
  ['common brick', 0.69, 1600, 840, 9.3e5],
  ['gypsum plaster', 0.48, 1440, 840, 5.8e5],
  ['oak', 0.17, 800, 2380, 3.2e5],
] as const;

/** Openings, linings, nominal and parametric curves, distributions and uncertainty as handbooks and standards print them. */
export const HANDBOOK_ROOM_ROWS: readonly ReferenceRow[] = [
  {
    id: 'office-test-opening-factor',
    method: 'room.opening-factor',
    inputs: { F: 27 * Math.sqrt(1.8), A_t: 474 },
    expected: { value: 0.076 },
    tolerance: { abs: 0.0005 },
    origin: 'published',
    source: `${OFFICE_TEST}; O`,
    fromMemory: true,
  },
  {
    id: 'office-test-inertia',
    method: 'burnout.thermal-inertia-2002',
    inputs: { t_max: 1, s: [0.1], rho: [1900], c: [840], lambda: [1] },
    expected: { b: 1263.3 },
    tolerance: { abs: 0.06 },
    origin: 'published',
    source: `${OFFICE_TEST}; b`,
    fromMemory: true,
  },
  {
    id: 'room-6x4-burning-rate',
    method: 'room.kawagoe',
    inputs: { F: 6 * Math.sqrt(2) },
    expected: { rate: 0.781 },
    tolerance: { rel: 0.025 },
    origin: 'published',
    source: 'Buchanan, Structural Design for Fire Safety, worked example of a room of 6 × 4 m, with 0.092 for 0.09',
    fromMemory: true,
  },
  {
    id: 'room-6x4-ventilation-limit',
    method: 'room.ventilation-limit',
    inputs: { F: 6 * Math.sqrt(2), O: 0.079 },
    expected: { value: 12_500 },
    tolerance: { rel: 0.025 },
    origin: 'published',
    source: 'Buchanan, Structural Design for Fire Safety, worked example of a room of 6 × 4 m, wood of 16 MJ/kg',
    fromMemory: true,
  },
  ...INERTIAS.map(([name, lambda, rho, c, product]): ReferenceRow => ({
    id: `inertia-${name}`,
    method: 'burnout.thermal-inertia-2002',
    inputs: { t_max: 1, s: [0.1], rho: [rho], c: [c], lambda: [lambda] },
    expected: { b: Math.sqrt(product) },
    tolerance: { rel: 0.02 },
    origin: 'published',
    source: 'Drysdale, An Introduction to Fire Dynamics, table of thermal properties: kρc to two figures',
    fromMemory: true,
  })),
  ...(
    [
      [5, 576],
      [10, 678],
      [20, 781],
      [360, 1213],
    ] as const
  ).map(([t, value]): ReferenceRow => ({
    id: `standard-curve-table-${t}`,
    method: 'burnout.standard-curve',
    inputs: { t },
    expected: { value },
    tolerance: { abs: 1.1 },
    origin: 'published',
    source: 'ISO 834 / BS 476-20, tabulated furnace temperature',
    fromMemory: true,
  })),
  ...(
    [
      [30, 100, 842],
      [60, 200, 945],
      [120, 400, 1049],
    ] as const
  ).map(([minutes, q_td, peak]): ReferenceRow => ({
    id: `parametric-as-standard-${minutes}`,
    method: 'burnout.parametric-2002',
    inputs: { O: 0.04, b: 1160, q_td, t_lim: 0.25 },
    expected: { peak, timeOfPeak: minutes },
    tolerance: { rel: 0.002 },
    origin: 'published',
    source: 'Wickström 1985 and EN 1991-1-2 Annex A: with Γ = 1 the heating phase is the standard curve',
    fromMemory: true,
  })),
  ...FREQUENCY_FACTORS.map(([period, K]): ReferenceRow => ({
    id: `frequency-factor-${period}`,
    method: 'statistics.gumbel-fractile',
    inputs: { mean: 100, V: 0.5, p: 1 - 1 / period },
    expected: { value: 100 + 50 * K },
    tolerance: { abs: 0.03 },
    origin: 'published',
    source: 'Chow, Handbook of Applied Hydrology, frequency factors of the Gumbel distribution',
    fromMemory: true,
  })),
  {
    id: 'normal-table-95',
    method: 'statistics.lognormal-fractile',
    // Mean e^½ and V² = e − 1 make ln q a standard normal variable.
    inputs: { mean: Math.exp(0.5), V: Math.sqrt(Math.E - 1), p: 0.95 },
    expected: { value: Math.exp(1.6449) },
    tolerance: { rel: 0.0001 },
    origin: 'published',
    source: 'table of the standard normal distribution, z = 1.6449 at 95 %',
    fromMemory: true,
  },
  {
    id: 'ten-resistors-together',
    method: 'uncertainty.fire-load',
    inputs: {
      M: new Array<number>(10).fill(1),
      H: new Array<number>(10).fill(100),
      u_M: new Array<number>(10).fill(0),
      u_H: new Array<number>(10).fill(0.1),
      entry: [0, 1, 2, 3, 4, 5, 6, 7, 8, 9],
      material: new Array<number>(10).fill(0),
      u_psi: [],
    },
    expected: { value: 1 },
    tolerance: { abs: 0.005 },
    origin: 'published',
    source: 'GUM (JCGM 100:2008) 5.2.2, example of ten resistors calibrated with one standard: 1 Ω',
    fromMemory: true,
  },
  {
    id: 'ten-resistors-apart',
    method: 'uncertainty.fire-load',
    inputs: {
      M: new Array<number>(10).fill(1),
      H: new Array<number>(10).fill(100),
      u_M: new Array<number>(10).fill(0),
      u_H: new Array<number>(10).fill(0.1),
      entry: [0, 1, 2, 3, 4, 5, 6, 7, 8, 9],
      material: [0, 1, 2, 3, 4, 5, 6, 7, 8, 9],
      u_psi: [],
    },
    expected: { value: 0.32 },
    tolerance: { abs: 0.005 },
    origin: 'published',
    source: 'GUM (JCGM 100:2008) 5.2.2, the same taken as independent, which the guide calls wrong: 0.32 Ω',
    fromMemory: true,
  },
  {
    id: 'pert-mean',
    method: 'statistics.pert-fractile',
    inputs: { a: 2, m: 5, b: 14, p: 0.5 },
    expected: { mean: 6 },
    tolerance: { abs: 1e-9 },
    origin: 'published',
    source: 'Malcolm, Roseboom, Clark & Fazar 1959, expected time (a + 4m + b)/6',
    fromMemory: true,
  },
];
