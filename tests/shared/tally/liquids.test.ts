import { describe, expect, it } from 'vitest';
import { estimateRoom } from '@embertally/shared/tally/estimate-room';
import { parseRoomInput } from '@embertally/shared/tally/parse-room-input';

const CONCRETE = { walls: { key: 'concrete' }, ceiling: { key: 'concrete' }, floor: { key: 'concrete' } };
const DOOR = { width_m: 2, height_m: 2.4, state: 'open', leads_to: 'outside' };
const WINDOW = { width_m: 3, height_m: 1.5, sill_m: 0.9, state: 'fails', leads_to: 'outside' };
const timber = (kg: number) => ({ id: 'timber', count: 1, parts: [{ material: 'timber', mass_kg: kg }] });

function tally(contents: readonly object[], room: object = {}) {
  const result = parseRoomInput({
    room: {
      name: 'Paint store',
      use: 'office',
      ring_m: [
        [0, 0],
        [8, 0],
        [8, 6],
        [0, 6],
      ],
      height_m: 3,
      lining: CONCRETE,
      openings: [DOOR],
      ...room,
    },
    contents,
  });
  if (!result.ok) throw new Error(JSON.stringify(result.errors));
  return estimateRoom(result.value);
}

/** 20 L of petrol in a tray of 1 m across, and timber far from it. */
const TRAY = {
  id: 'petrol',
  count: 1,
  parts: [{ material: 'petrol', net_heat_MJ_kg: 43.7, mass_kg: 14.8 }],
  x_m: 1,
  y_m: 1,
  width_m: Math.sqrt(Math.PI) / 2,
  depth_m: Math.sqrt(Math.PI) / 2,
};

describe('liquids', () => {
  it('burn as a pool of their tray: petrol 1 m across 1656.5 kW for 390 s (independent: Babrauskas 1983)', () => {
    const { spread } = tally([TRAY]);
    expect(Math.abs((spread?.peak?.value ?? 0) - 1656.5)).toBeLessThan(2);
    expect(Math.abs((spread?.end?.value ?? 0) - 390.4)).toBeLessThan(2);
    expect(spread?.defaults?.map(({ code }) => code)).toEqual(
      expect.arrayContaining(['PEAK_FROM_POOL', 'GROWTH_AT_ONCE']),
    );
  });

  it('burn as a pool of alcohol, whose rate does not depend on the diameter (independent: 30 L in 2 m, 1262.9 kW)', () => {
    const side = Math.sqrt(Math.PI);
    const parts = [{ material: 'ethanol', net_heat_MJ_kg: 26.8, mass_kg: 23.82 }];
    const { spread } = tally([{ ...TRAY, parts, width_m: side, depth_m: side }]);
    expect(Math.abs((spread?.peak?.value ?? 0) - 1262.9)).toBeLessThan(2);
  });

  it('keep a peak that is stated', () => {
    expect(tally([{ ...TRAY, peak_kW: 700 }]).spread?.peak?.value).toBeCloseTo(700, 6);
  });

  it('make the room ultra-fast when they hold 5 % of its load, and say that no class fits', () => {
    const { alpha } = tally([TRAY, timber(500)]).growth;
    expect(alpha?.value).toBeCloseTo(1000 / 75 ** 2, 9);
    expect(alpha?.warnings.map(({ code }) => code)).toContain('BURNS_AT_ONCE');
    expect(tally([TRAY, timber(5000)]).growth.alpha?.warnings.map(({ code }) => code)).not.toContain('BURNS_AT_ONCE');
  });

  it('over a fifth of the heat bring the hydrocarbon curve: 1100 °C after an hour (published: EN 1991-1-2 3.2.3)', () => {
    const { hydrocarbon, asKept } = tally([TRAY, timber(20)]).burnout;
    expect(Math.abs((hydrocarbon?.temperature.value ?? 0) - 1100)).toBeLessThan(0.1);
    expect(hydrocarbon).toMatchObject({ after_min: 60 });
    expect(hydrocarbon?.curve.at(-1)).toEqual([60, hydrocarbon?.temperature.value]);
    expect(hydrocarbon?.temperature.warnings.map(({ code }) => code)).toEqual(['VARIANT']);
    expect(asKept?.equivalentTime?.warnings.map(({ code }) => code)).toContain('NOT_CELLULOSIC');
    expect(tally([timber(500)]).burnout.hydrocarbon).toBeUndefined();
    expect(tally([TRAY], { rating_min: 30 }).burnout.hydrocarbon?.after_min).toBe(30);
  });
});

describe('a burn-out before the glass breaks', () => {
  const both = tally([timber(1500)], { openings: [DOOR, WINDOW] }).burnout;

  it('is given beside the one after it, and is the same as with glass that never breaks', () => {
    const closed = tally([timber(1500)], { openings: [DOOR, { ...WINDOW, state: 'closed' }] }).burnout;
    expect(both.beforeGlass?.openingFactor?.value).toBe(closed.openingFactor?.value);
    expect(both.beforeGlass?.asKept?.equivalentTime?.value).toBe(closed.asKept?.equivalentTime?.value);
    expect(both.beforeGlass?.asKept?.parametric?.peak.value).toBe(closed.asKept?.parametric?.peak.value);
    expect(both.beforeGlass?.openingFactor?.value).toBeLessThan(both.openingFactor?.value ?? 0);
    expect(both.beforeGlass?.asKept?.equivalentTime?.value).toBeGreaterThan(both.asKept?.equivalentTime?.value ?? 0);
  });

  it('is left out where nothing would break, or where nothing else is open', () => {
    expect(tally([timber(1500)]).burnout.beforeGlass).toBeUndefined();
    expect(tally([timber(1500)], { openings: [WINDOW] }).burnout.beforeGlass).toBeUndefined();
  });
});
