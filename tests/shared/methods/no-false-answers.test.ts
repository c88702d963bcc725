import { describe, expect, it } from 'vitest';
import { OutOfRangeError } from '@embertally/shared/methods/estimate';
import { fuelCorrection, parametricCurve } from '@embertally/shared/methods/burnout/parametric-curve';
import { bombGross } from '@embertally/shared/methods/calorimetry/bomb-gross';
import { bombRun } from '@embertally/shared/methods/calorimetry/bomb-run';
import { oxygenCarbon } from '@embertally/shared/methods/calorimetry/oxygen-carbon';
import { heatFromEquation } from '@embertally/shared/methods/chemistry/heat-from-equation';
import { netOfFormula } from '@embertally/shared/methods/chemistry/net-of-formula';
import { netFromGross } from '@embertally/shared/methods/heat/net-from-gross';
import { inverseOpeningFactor } from '@embertally/shared/methods/room/inverse-opening-factor';
import { gumbelFractile } from '@embertally/shared/methods/statistics/gumbel-fractile';
import { lognormalPlace } from '@embertally/shared/methods/statistics/lognormal-place';
import { bandFractile } from '@embertally/shared/methods/uncertainty/band-fractile';
import { estimateRoom } from '@embertally/shared/tally/estimate-room';
import type { RoomInput } from '@embertally/shared/tally/room-input';
import { atoms } from '../../reference/atoms.ts';

/** 6 × 6 × 3 m with one wall of glass, insulation of b = 101 on every side and little in it. */
const WARM_AND_OPEN: RoomInput = {
  room: {
    name: 'Pavilion',
    ring_m: [
      [0, 0],
      [6, 0],
      [6, 6],
      [0, 6],
    ],
    height_m: 3,
    lining: Object.fromEntries(
      ['walls', 'ceiling', 'floor'].map((side) => [
        side,
        { layers: [{ thickness_m: 0.2, conductivity_W_mK: 0.102, density_kg_m3: 100, specific_heat_J_kgK: 1000 }] },
      ]),
    ),
    openings: [{ width_m: 5.7, height_m: 2.92, sill_m: 0, state: 'open', leads_to: 'outside' }],
  },
  contents: [{ id: 'a', count: 1, parts: [{ net_heat_MJ_kg: 16, mass_kg: 565 }] }],
};

describe('inputs that are each in range and together make no sense', () => {
  it('get no parametric curve where the printed k falls below 0 (by hand: 1 − 4 · ⅓ · 0.9138 = −0.2184)', () => {
    expect(fuelCorrection(0.2, 100, 50)).toBeCloseTo(-0.2184, 4);
    expect(() => parametricCurve.run({ O: 0.2, b: 100, q_td: 50, t_lim: 1 / 3 })).toThrow(OutOfRangeError);
    const { peak } = parametricCurve.run({ O: 0.2, b: 100, q_td: 60, t_lim: 1 / 3 });
    expect(peak).toBeGreaterThan(20);
  });

  it('get a room without a curve and the reason for it', () => {
    const { burnout, missing } = estimateRoom(WARM_AND_OPEN);
    expect(burnout.asKept?.parametric).toBeUndefined();
    const reason = missing.find(({ path }) => path === 'burnout.asKept.parametric');
    expect(reason?.why).toContain('The factor k');
  });

  it.each<[string, () => unknown, RegExp]>([
    [
      'a bomb whose fuse and aid give more than was measured',
      () => bombGross.run({ E: 0.01, T_i: 25, T_m: 25.5, c: 0, b: 0, m_aid: 5e-4, H_aid: 26.434, m: 5e-4 }),
      /check E, b and m_ba/,
    ],
    [
      'the same with the rise already corrected',
      () => bombRun.run({ E: 0.01, dT: 0.5, b: 0, a: 0, m_aid: 5e-4, H_aid: 26.434, m: 5e-4 }),
      /check E, ΔT/,
    ],
    [
      'more carbon monoxide than oxygen was used up',
      () =>
        oxygenCarbon.run({
          m_e: 2.5,
          X0_O2: 0.2095,
          X0_CO2: 0.0004,
          X0_H2O: 0.01,
          X_O2: 0.2,
          X_CO2: 0,
          X_CO: 0.05,
          E: 13_100,
          E_CO: 17_600,
        }),
      /check both analysers/,
    ],
    [
      'water of an equation that outweighs its heat',
      () => heatFromEquation.run({ ...atoms({ C: 1, H: 4 }), n: 1000, dH: -890.6, water: 'liquid' }),
      /check ΔH, n/,
    ],
    ['more hydrogen than heat', () => netFromGross.run({ H_gross: 4, w_H: 0.5 }), /check both/],
    ['the same by formula', () => netOfFormula.run({ ...atoms({ C: 1, H: 4 }), gross: 1 }), /check both/],
    ['openings larger than the room', () => inverseOpeningFactor.run({ A_t: 10, A_v: 12, H: 2 }), /A_t/],
    ['a Gumbel distribution below zero', () => gumbelFractile.run({ mean: 100, V: 2, p: 0.1 }), /lognormal/],
    [
      'a load that is nothing beside its doubt',
      () => bandFractile.run({ q: 5e-324, u: 1, o: 0, p: 0.5 }),
      /check both/,
    ],
  ])('are refused: %s', (_name, run, message) => {
    expect(run).toThrow(OutOfRangeError);
    expect(run).toThrow(message);
  });

  it('a distribution of almost no spread has half its rooms on either side of its mean', () => {
    expect(lognormalPlace.run({ q: 1e6, mean: 1e6, V: 1e-9 })).toBeCloseTo(50, 6);
  });
});
