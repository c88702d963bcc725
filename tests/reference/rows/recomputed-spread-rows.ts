import type { SpreadRow, SpreadRowRoom } from './spread-rows.ts';

const SOURCE = 'second reader, own simulation with converged steps';
const PLASTER = [0.48, 1440, 840, 0.016] as const;
const LARGER_ROOM: SpreadRowRoom = {
  width_m: 6,
  depth_m: 4,
  height_m: 2.6,
  door_m: [0.8, 2],
  lining: PLASTER,
  exposure_s: 1200,
};
const ROOM: SpreadRowRoom = {
  width_m: 5,
  depth_m: 4,
  height_m: 2.7,
  door_m: [0.9, 2],
  lining: PLASTER,
  exposure_s: 1200,
};

/** Fires worked out by somebody who had the description of the simulation and not its code. */
export const RECOMPUTED_SPREAD_ROWS: readonly SpreadRow[] = [
  {
    id: 'recomputed-pair',
    method: 'spread.simulation',
    room: null,
    first: 'A',
    entries: [
      { id: 'A', at: [0, 0], size: [1.2, 1.2], E: 600, peak: 2000, growth: 'fast', lights: 'normal' },
      { id: 'B', at: [2.2, 0], size: [0.8, 0.8], E: 200, peak: 1000, growth: 'fast', lights: 'normal' },
    ],
    expected: { lights: { B: 312.4257 }, highestFlux: { B: 17.19266 }, flashover: null, released: 800 },
    tolerance_s: 0.2,
    origin: 'independent',
    source: SOURCE,
  },
  {
    id: 'recomputed-layer',
    method: 'spread.simulation',
    room: LARGER_ROOM,
    first: 'A',
    entries: [
      { id: 'A', at: [0.6, 2], size: [1, 1], E: 600, peak: 1050, growth: 'medium', lights: 'normal' },
      { id: 'B', at: [5.4, 2], size: [0.8, 0.8], E: 300, peak: 1500, growth: 'medium', lights: 'normal' },
      { id: 'C', at: [5.4, 3.6], size: [0.5, 0.2], E: 5, peak: 100, growth: 'fast', lights: 'easy' },
    ],
    expected: {
      lights: { B: null, C: 323.3765 },
      causes: { C: 'layer' },
      dose: { B: 3293.81 },
      flashover: null,
      released: 605,
    },
    tolerance_s: 0.2,
    doseTolerance: 0.002,
    origin: 'independent',
    source: SOURCE,
  },
  {
    id: 'recomputed-chain',
    method: 'spread.simulation',
    room: ROOM,
    first: 'A',
    entries: [
      { id: 'A', at: [0.7, 0.7], size: [0.9, 0.9], E: 350, peak: 1400, growth: 'fast', lights: 'normal' },
      { id: 'B', at: [2.9, 0.6], size: [1.8, 0.9], E: 700, peak: 2200, growth: 'fast', lights: 'normal' },
      { id: 'C', at: [4.6, 3], size: [0.5, 1.8], E: 1200, peak: 1100, growth: 'medium', lights: 'hard' },
      {
        id: 'D',
        at: [0.5, 3.6],
        size: [0.8, 0.6],
        E: 400,
        peak: 900,
        growth: 'medium',
        lights: 'normal',
        enclosure: 'sealed',
      },
      {
        id: 'K',
        at: [2.5, 3.6],
        size: [0.8, 0.6],
        E: 500,
        peak: 800,
        growth: 'medium',
        lights: 'normal',
        enclosure: 'cabinet',
      },
    ],
    expected: {
      lights: { B: 164.3056, C: 226.14, K: 226.14, D: null },
      flashover: 226.14,
      flashoverFrom: { B: 187.5413 },
      released: 2750,
    },
    tolerance_s: 0.3,
    origin: 'independent',
    source: SOURCE,
  },
  {
    id: 'recomputed-chain-from-the-shelf',
    method: 'spread.simulation',
    room: ROOM,
    first: 'C',
    entries: [
      { id: 'A', at: [0.7, 0.7], size: [0.9, 0.9], E: 350, peak: 1400, growth: 'fast', lights: 'normal' },
      { id: 'B', at: [2.9, 0.6], size: [1.8, 0.9], E: 700, peak: 2200, growth: 'fast', lights: 'normal' },
      { id: 'C', at: [4.7, 3], size: [0.4, 1.8], E: 1200, peak: 1100, growth: 'medium', lights: 'hard' },
    ],
    expected: { lights: {}, flashover: 463.432, released: 2250 },
    tolerance_s: 0.3,
    origin: 'independent',
    source: `${SOURCE}; 1.8 m over 0.4 m is a tie and rounded up to five cells`,
  },
];
