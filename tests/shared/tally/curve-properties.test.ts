import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { designFire, designFireCurve } from '@embertally/shared/methods/growth/design-fire';
import { estimateRoom } from '@embertally/shared/tally/estimate-room';
import type { RoomInput } from '@embertally/shared/tally/room-input';
import { expectFinite } from './expect-finite.ts';

function area(curve: readonly (readonly [number, number])[]): number {
  return curve.slice(1).reduce((sum, [t, q], i) => {
    const [t0, q0] = curve[i]!;
    return sum + ((t - t0) * (q + q0)) / 2;
  }, 0);
}

const number = (min: number, max: number) => fc.double({ min, max, noNaN: true });

const roomArbitrary: fc.Arbitrary<RoomInput> = fc.record({
  room: fc.record({
    name: fc.string({ maxLength: 20 }),
    use: fc.constantFrom(null, 'office', 'theatre', 'storage'),
    ring_m: fc.tuple(number(0.5, 60), number(0.5, 60)).map(([w, d]): [number, number][] => [
      [0, 0],
      [w, 0],
      [w, d],
      [0, d],
    ]),
    height_m: number(2, 12),
    lining: fc.constantFrom(null, {
      walls: { key: 'concrete' },
      ceiling: { key: 'concrete' },
      floor: { key: 'concrete' },
    }),
    openings: fc.array(
      fc.record({
        width_m: fc.oneof(number(1e-6, 1e-3), number(0.05, 6)),
        height_m: number(1e-3, 2),
        state: fc.constantFrom(null, 'open' as const, 'fails' as const, 'closed' as const),
        leads_to: fc.constantFrom('inside' as const, 'outside' as const),
      }),
      { maxLength: 6 },
    ),
    roof_vents_m2: fc.constantFrom(0, 2),
  }),
  contents: fc.array(
    fc.record({
      id: fc.uuid(),
      count: fc.integer({ min: 0, max: 500 }),
      parts: fc.array(fc.record({ net_heat_MJ_kg: number(0, 50), mass_kg: number(0, 200) }), { maxLength: 3 }),
      keeping: fc.constantFrom('fixed' as const, 'stored' as const, 'passing' as const),
      enclosure: fc.constantFrom('open' as const, 'cabinet' as const, 'sealed' as const),
      growth: fc.constantFrom(null, 'slow' as const, 'ultra-fast' as const),
      peak_kW: fc.option(number(1, 20_000), { nil: null }),
      x_m: number(0, 10),
      y_m: number(0, 10),
      width_m: number(0.05, 5),
      depth_m: number(0.05, 5),
      rotation_deg: fc.constantFrom(0, 90, 17),
    }),
    { maxLength: 6 },
  ),
  options: fc.constantFrom(
    null,
    { plateau_kW_m2: 250 },
    { load_basis: 'mean' as const, growth_convention: 'NFPA' as const },
  ),
});

describe('the design curve', () => {
  it('holds the heat released within 0.1 %, for any load, plateau and growth', () => {
    fc.assert(
      fc.property(number(1e-3, 1e8), number(0.1, 1e7), number(1e-4, 10), (E, Q_max, alpha) => {
        const fire = designFire.run({ E, Q_max, alpha });
        expect(Math.abs(area(designFireCurve(fire)) / 1000 / E - 1)).toBeLessThan(1e-3);
        expect(fire.peak).toBeLessThanOrEqual(Q_max * (1 + 1e-12));
        expect(fire.growthEnd).toBeLessThanOrEqual(fire.decayStart);
        expect(fire.decayStart).toBeLessThan(fire.end);
      }),
      { numRuns: 500 },
    );
  });
});

describe('any room', () => {
  it('gives finite numbers, a curve that holds its heat, and shares that add up', () => {
    fc.assert(
      fc.property(roomArbitrary, (input) => {
        const tally = estimateRoom(input, { spread: false });
        expectFinite(tally);
        const { curve, heatReleased } = tally.growth;
        if (curve) expect(Math.abs(area(curve) / 1000 / (heatReleased?.value ?? 0) - 1)).toBeLessThan(1e-3);
        const total = tally.load.total.value ?? 0;
        const { fixed, stored, passing } = tally.load;
        expect((fixed.value ?? 0) + (stored.value ?? 0) + (passing.value ?? 0)).toBeCloseTo(total, 4);
        const shares = tally.load.byEntry.reduce((sum, { share }) => sum + share, 0);
        expect(shares).toBeCloseTo(total > 0 ? 1 : 0, 6);
      }),
      { numRuns: 300 },
    );
  });

  it('does not change with the order of its entries', () => {
    fc.assert(
      fc.property(roomArbitrary, (input) => {
        const there = estimateRoom(input, { spread: false });
        const back = estimateRoom({ ...input, contents: [...input.contents].reverse() }, { spread: false });
        expect(back.load.total.value).toBeCloseTo(there.load.total.value ?? 0, 6);
        expect(back.growth.peak?.value ?? 0).toBeCloseTo(there.growth.peak?.value ?? 0, 6);
      }),
      { numRuns: 100 },
    );
  });

  it('weighs twice as much with every mass doubled', () => {
    fc.assert(
      fc.property(roomArbitrary, (input) => {
        const contents = input.contents.map((entry) => ({ ...entry, count: entry.count * 2 }));
        const tallyOf = (given: RoomInput) => estimateRoom(given, { spread: false });
        const [one, two] = [tallyOf(input), tallyOf({ ...input, contents })];
        expect(two.load.total.value).toBeCloseTo(2 * (one.load.total.value ?? 0), 4);
        expect(two.load.standardUncertainty?.value ?? 0).toBeCloseTo(2 * (one.load.standardUncertainty?.value ?? 0), 4);
      }),
      { numRuns: 100 },
    );
  });
});
