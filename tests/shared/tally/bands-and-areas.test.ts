import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { estimateRoom } from '@embertally/shared/tally/estimate-room';
import type { RoomInput } from '@embertally/shared/tally/room-input';
import { expectFinite } from './expect-finite.ts';

const number = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const key = (name: string) => ({ key: name });

/** Rooms of contents that are spread out, with one door, in which fire can pass from one to another. */
const rooms: fc.Arbitrary<RoomInput> = fc
  .record({
    width: number(3, 12),
    depth: number(3, 9),
    door: number(0.3, 2.5),
    samples: fc.constantFrom(200, 1000),
    seed: fc.integer({ min: 0, max: 1e6 }),
    contents: fc.array(
      fc.record({
        mass: number(1, 400),
        heat: number(10, 45),
        peak: fc.option(number(50, 5000), { nil: null }),
        evidence: fc.constantFrom('weighed' as const, 'counted' as const, 'estimated' as const, 'hearsay' as const),
        enclosure: fc.constantFrom('open' as const, 'open' as const, 'cabinet' as const),
        at: fc.tuple(number(0.1, 0.9), number(0.1, 0.9)),
      }),
      { minLength: 1, maxLength: 5 },
    ),
  })
  .map(({ width, depth, door, samples, seed, contents }) => ({
    room: {
      name: 'Store',
      use: 'office',
      ring_m: [
        [0, 0],
        [width, 0],
        [width, depth],
        [0, depth],
      ],
      height_m: 2.8,
      lining: { walls: key('concrete'), ceiling: key('concrete'), floor: key('concrete') },
      openings: [{ width_m: door, height_m: 2, sill_m: 0, state: 'open', leads_to: 'outside' }],
    },
    contents: contents.map(({ mass, heat, peak, evidence, enclosure, at }, i) => ({
      id: `e${i}`,
      count: 1,
      parts: [{ net_heat_MJ_kg: heat, mass_kg: mass }],
      peak_kW: peak,
      evidence,
      enclosure,
      x_m: at[0] * width,
      y_m: at[1] * depth,
      width_m: 0.8,
      depth_m: 0.6,
      height_m: 1,
    })),
    options: { samples, seed },
  }));

describe('any room', () => {
  it('has bands in order that contain their mean, the same for the same seed', () => {
    fc.assert(
      fc.property(rooms, (input) => {
        const { load, uncertainty } = estimateRoom(input, { spread: false });
        expectFinite(uncertainty);
        const bands = uncertainty!.bands;
        for (const band of [bands.total, bands.perFloor, bands.peak, bands.equivalentTime]) {
          if (!band) continue;
          const [p5, p50, p80, p95, mean] = [band.p5, band.p50, band.p80, band.p95, band.mean].map(
            ({ value }) => value ?? NaN,
          );
          expect(p5).toBeLessThanOrEqual(p50!);
          expect(p50).toBeLessThanOrEqual(p80!);
          expect(p80).toBeLessThanOrEqual(p95!);
          const rounding = 1e-9 * Math.abs(mean!);
          expect(mean).toBeGreaterThanOrEqual(p5! - rounding);
          expect(mean).toBeLessThanOrEqual(p95! + rounding);
        }
        expect(bands.perFloor?.p50.value).toBe(load.band?.p50?.value);
        expect(estimateRoom(input, { spread: false }).uncertainty).toEqual(uncertainty);
        const shares = uncertainty!.shares.reduce((sum, { share }) => sum + (share.value ?? 0), 0);
        expect(shares).toBeLessThanOrEqual(100 + 1e-6);
      }),
      { numRuns: 60 },
    );
  });

  it('burns what its curve of entries holds, and no more than is kept', () => {
    fc.assert(
      fc.property(rooms, (input) => {
        const { spread, growth } = estimateRoom({ ...input, options: null });
        const { curve, heatReleased, unburnt } = spread ?? {};
        if (!curve || !heatReleased) return;
        const area = curve.slice(1).reduce((sum, [t, q], i) => {
          const [t0, q0] = curve[i]!;
          return sum + ((t - t0) * (q + q0)) / 2;
        }, 0);
        const released = heatReleased.value ?? 0;
        expect(Math.abs(area / 1000 / released - 1)).toBeLessThan(1e-3);
        expect(released + (unburnt?.value ?? 0)).toBeCloseTo(growth.heatReleased?.value ?? 0, 4);
      }),
      { numRuns: 40 },
    );
  });
});
