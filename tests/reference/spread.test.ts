import { describe, expect, it } from 'vitest';
import { growthCoefficient } from '@embertally/shared/methods/growth/growth-coefficient';
import { flashoverBabrauskas } from '@embertally/shared/methods/room/flashover-babrauskas';
import { flashoverMqh } from '@embertally/shared/methods/room/flashover-mqh';
import { flashoverThomas } from '@embertally/shared/methods/room/flashover-thomas';
import { liningHeatTransfer } from '@embertally/shared/methods/room/lining-heat-transfer';
import { rateForFlame } from '@embertally/shared/methods/plume/flame-length';
import { hotLayer } from '@embertally/shared/spread/hot-layer';
import { ignitionOf, timeToIgnite } from '@embertally/shared/spread/ignition-class';
import { ownCurve, timeToRate } from '@embertally/shared/spread/own-curve';
import { placedRectangle } from '@embertally/shared/spread/placed-rectangle';
import { nearestCell, radiatingFootprint, viewFactor } from '@embertally/shared/spread/radiation';
import { simulateSpread } from '@embertally/shared/spread/simulate-spread';
import { spreadGaps } from '@embertally/shared/spread/spread-gaps';
import type { SpreadEntry } from '@embertally/shared/spread/spread-entry';
import type { SpreadRoom } from '@embertally/shared/spread/spread-room';
import { areaOf, HALL, spreadCase, spreadEntry } from '../support/spread-samples.ts';
import { RECOMPUTED_SPREAD_ROWS } from './rows/recomputed-spread-rows.ts';
import { GAP_ROWS, SPREAD_ROWS, type SpreadRow, type SpreadRowRoom } from './rows/spread-rows.ts';

const ROW_RADIATIVE_FRACTION = 0.35;

function entriesOf(row: SpreadRow): SpreadEntry[] {
  return row.entries.map(({ id, at, size, E, peak, growth, lights, enclosure, base_m, height_m }) =>
    spreadEntry(id, at, {
      size,
      place: { base_m: base_m ?? 0, height_m: height_m ?? 1 },
      heat_MJ: E,
      peak_kW: peak,
      growth: { by: 't-squared', alpha_kW_s2: growthCoefficient.run({ growth, convention: 'EN' }) },
      radiativeFraction: ROW_RADIATIVE_FRACTION,
      ignition: ignitionOf(lights),
      enclosure: enclosure ?? 'open',
    }),
  );
}

/** A rectangular room with one door; the lowest criterion that applies, as the tally has it. */
function roomOf({ width_m, depth_m, height_m, door_m, lining, exposure_s }: SpreadRowRoom): SpreadRoom {
  const [k, rho, c, d] = lining;
  const A_f = width_m * depth_m;
  const A_T = 2 * A_f + 2 * (width_m + depth_m) * height_m - door_m[0] * door_m[1];
  const F = door_m[0] * door_m[1] * Math.sqrt(door_m[1]);
  const { h_k } = liningHeatTransfer.run({ t: exposure_s, k: [k], rho: [rho], c: [c], d: [d] });
  const criteria = [
    flashoverThomas.run({ A_T, F, A_f }),
    flashoverBabrauskas.run({ F, A_T_per_F: A_T / F }),
    flashoverMqh.run({ h_k, A_T, F, A_f, H: height_m }),
  ];
  const layers = [{ conductivity_W_mK: k, density_kg_m3: rho, specific_heat_J_kgK: c, thickness_m: d }];
  return {
    ...HALL,
    surfaces: [{ area_m2: A_T, layers }],
    liningArea_m2: A_T,
    factorBefore: F,
    factorAfter: F,
    flashover_kW: Math.min(...criteria),
  };
}

function run(row: SpreadRow, first: string | null = row.first, layer = true) {
  const room = row.room === null ? HALL : roomOf(row.room);
  const result = simulateSpread(
    spreadCase(entriesOf(row), { room: layer ? room : { ...room, surfaces: null }, first }),
  );
  if (!result) throw new Error(`${row.id} does not burn.`);
  return result;
}

function expectTime(actual: number | null | undefined, expected: number | null, within: number, what: string) {
  if (expected === null) expect(actual, what).toBeNull();
  else expect(Math.abs((actual ?? Infinity) - expected), `${what}: ${actual} against ${expected}`).toBeLessThan(within);
}

function rowById(id: string): SpreadRow {
  const row = SPREAD_ROWS.find((one) => one.id === id);
  if (!row) throw new Error(`No row ${id}.`);
  return row;
}

describe('spread of fire against the outside world', () => {
  it.each(
    [...SPREAD_ROWS, ...RECOMPUTED_SPREAD_ROWS].map(
      (row) => [`${row.id} (${row.origin}: ${row.source})`, row] as const,
    ),
  )('%s', (_title, row) => {
    const { expected, tolerance_s = 1, doseTolerance = 0 } = row;
    const result = run(row);
    const exposure = new Map(result.exposures.map((one) => [one.id, one]));
    for (const [id, time] of Object.entries(expected.lights)) {
      expectTime(exposure.get(id)?.ignited_s, time, tolerance_s, `${id} lights`);
    }
    for (const [id, cause] of Object.entries(expected.causes ?? {})) expect(exposure.get(id)?.cause, id).toBe(cause);
    for (const [id, flux] of Object.entries(expected.highestFlux ?? {})) {
      expect(Math.abs(exposure.get(id)!.highestFlux_kW_m2 / flux - 1), id).toBeLessThan(0.002);
    }
    for (const [id, dose] of Object.entries(expected.dose ?? {})) {
      expect(Math.abs(exposure.get(id)!.dose - dose), id).toBeLessThanOrEqual(doseTolerance * dose);
    }
    expectTime(result.flashover_s, expected.flashover, tolerance_s, 'flashover');
    expect(result.released_MJ).toBeCloseTo(expected.released, 6);
    expect(Math.abs(areaOf(result.curve) / expected.released - 1)).toBeLessThan(0.001);
    if (expected.peak !== undefined) expect(result.peak_kW).toBeCloseTo(expected.peak, 1);
    if (expected.end !== undefined) expectTime(result.end_s, expected.end, tolerance_s, 'end');
    if (expected.atCap !== undefined) expectTime(result.atCap_s, expected.atCap, 3, 'held back by the openings');
    for (const [first, time] of Object.entries(expected.flashoverFrom ?? {})) {
      expectTime(run(row, first).flashover_s, time, tolerance_s, `flashover from ${first}`);
    }
    if (expected.worstFirst !== undefined) expect(run(row, null).first).toBe(expected.worstFirst);
  });

  it('S1: a constant 30 kW/m² lights a hard entry after 65.31 s (independent: closed form)', () => {
    expect(timeToIgnite(ignitionOf('hard'), 30)).toBeCloseTo(65.31, 1);
  });

  it.each([
    ['easy', [12.5, 6.8, 4.7, 3.6]],
    ['normal', [60, 15, 6.7, 3.8]],
    ['hard', [356, 65, 26, 14]],
    ['resistant', [Infinity, 400, 100, 44]],
  ] as const)(
    'the printed times of the class %s at 20, 30, 40 and 50 kW/m² (independent: rounded table)',
    (key, times) => {
      const computed = [20, 30, 40, 50].map((flux) => timeToIgnite(ignitionOf(key), flux));
      for (const [index, time] of times.entries()) {
        if (time === Infinity) expect(computed[index]).toBe(Infinity);
        else expect(Math.abs(computed[index]! / time - 1)).toBeLessThan(0.025);
      }
    },
  );

  it('S2: R is 2.0 m and the flux passes 10 kW/m² at 179.76 s (independent: closed form)', () => {
    const [a, b] = entriesOf(rowById('S2-pair-ignites')) as [SpreadEntry, SpreadEntry];
    const source = radiatingFootprint(placedRectangle(a.place!));
    const target = placedRectangle(b.place!);
    expect(nearestCell(source, target)).toBeCloseTo(2, 9);
    const rate = 10 / (ROW_RADIATIVE_FRACTION * viewFactor(source, target));
    expect(timeToRate(ownCurve(a), rate)).toBeCloseTo(179.76, 1);
  });

  it('S5: without the hot layer neither lights (independent: closed form)', () => {
    expect(run(rowById('S5-hot-layer-easy-yes-normal-no'), 'A', false).events.map(({ id }) => id)).toEqual(['A']);
  });

  it('S6: the criterion of the room is 1570.5 kW (independent)', () => {
    expect(roomOf(rowById('S6-chain-to-flashover').room!).flashover_kW).toBeCloseTo(1570.5, 1);
  });

  it('S8: ten cells; the single centre would give 13.31 kW/m² (independent: by hand)', () => {
    const [s, t] = entriesOf(rowById('S8-long-source-needs-cells')) as [SpreadEntry, SpreadEntry];
    const source = radiatingFootprint(placedRectangle(s.place!));
    expect(source.cells).toHaveLength(10);
    const centre = { ...source, cells: [{ x: 0, y: 0 }] };
    const flux = ROW_RADIATIVE_FRACTION * s.peak_kW * viewFactor(centre, placedRectangle(t.place!));
    expect(flux).toBeCloseTo(13.31, 2);
  });

  it('S9: the flame is 3 m high at 1500.7 kW (independent: closed form)', () => {
    expect(rateForFlame(3, Math.sqrt((4 * 1.2 * 1.2) / Math.PI))).toBeCloseTo(1500.7, 0);
  });

  it.each(GAP_ROWS)('$id ($origin: $source)', ({ fire, from, expected }) => {
    const gaps = spreadGaps({ room: HALL, entries: entriesOf(rowById(fire)), ignition: 'dose' });
    const gap = gaps.find((one) => one.from === from)!;
    for (const answer of ['justNot', 'enough', 'longExposureJustNot', 'longExposureEnough'] as const) {
      expect(Math.abs((gap[answer].metres ?? Infinity) - expected[answer]), answer).toBeLessThan(0.01);
    }
  });

  it('a layer of 500 °C gives 19.8 kW/m² (independent)', () => {
    const room = roomOf(rowById('S6-chain-to-flashover').room!);
    const late = 3600;
    const h_k = 0.48 / 0.016 / 1000;
    const rate = Math.sqrt((480 / 6.85) ** 3 * h_k * room.liningArea_m2 * room.factorBefore);
    expect(hotLayer(room)?.(rate, late)).toBeCloseTo(19.8, 1);
  });

  it('718 and 1616 kW give 20 kW/m² at 0.5 and 1.0 m from a source 1 m wide (independent)', () => {
    const source = radiatingFootprint(placedRectangle(spreadEntry('a', [0, 0]).place!));
    for (const [gap, rate] of [
      [0.5, 718],
      [1, 1616],
    ] as const) {
      const target = placedRectangle(spreadEntry('b', [1 + gap, 0]).place!);
      expect(Math.round(20 / (ROW_RADIATIVE_FRACTION * viewFactor(source, target)))).toBe(rate);
    }
  });
});
