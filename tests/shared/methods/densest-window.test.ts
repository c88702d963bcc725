import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { densestWindow, type PlacedLoad } from '@embertally/shared/methods/load/densest-window';
import { overlapArea } from '@embertally/shared/methods/load/overlap-area';
import { footprint } from '@embertally/shared/geometry/footprint';

const STEP = 0.1;

/** Every window on a fine grid, each entry sampled by the true outline of its footprint: slow and plain. */
function bruteForce(loads: readonly PlacedLoad[]): number {
  const placed = loads.map(({ heat, footprint: rectangle }) => ({
    heat,
    ring: footprint(rectangle),
    area: rectangle.width_m * rectangle.depth_m,
  }));
  let best = 0;
  for (let x = -3; x <= 8; x += STEP) {
    for (let y = -3; y <= 8; y += STEP) {
      let heat = 0;
      for (const { heat: whole, ring, area } of placed) heat += (whole * overlapArea(ring, x, y, x + 2, y + 2)) / area;
      best = Math.max(best, heat / 4);
    }
  }
  return best;
}

const load = (rotation: fc.Arbitrary<number>): fc.Arbitrary<PlacedLoad> =>
  fc.record({
    heat: fc.integer({ min: 1, max: 1000 }),
    footprint: fc.record({
      x_m: fc.integer({ min: 0, max: 50 }).map((n) => n / 10),
      y_m: fc.integer({ min: 0, max: 50 }).map((n) => n / 10),
      width_m: fc.integer({ min: 2, max: 40 }).map((n) => n / 10),
      depth_m: fc.integer({ min: 2, max: 20 }).map((n) => n / 10),
      rotation_deg: rotation,
    }),
  });

describe('the densest window', () => {
  it('is never below any window of a fine grid when footprints stand along the axes', () => {
    fc.assert(
      fc.property(fc.array(load(fc.constantFrom(0, 90, -180)), { minLength: 1, maxLength: 6 }), (loads) => {
        const { density } = densestWindow(loads);
        const grid = bruteForce(loads);
        expect(density).toBeGreaterThanOrEqual(grid * (1 - 1e-9));
        // A grid of 0.1 m misses the best window by at most a tenth of a side on two sides.
        expect(density).toBeLessThanOrEqual(grid * 1.15);
      }),
      { numRuns: 25 },
    );
  });

  it('comes within half a percent of a fine grid for turned footprints', () => {
    fc.assert(
      fc.property(fc.array(load(fc.integer({ min: 1, max: 89 })), { minLength: 1, maxLength: 5 }), (loads) => {
        expect(densestWindow(loads).density).toBeGreaterThanOrEqual(bruteForce(loads) * 0.995);
      }),
      { numRuns: 60 },
    );
  });

  it('never holds more than everything, and is reached by the position it names', () => {
    fc.assert(
      fc.property(fc.array(load(fc.integer({ min: 0, max: 359 })), { maxLength: 8 }), (loads) => {
        const { density, x, y } = densestWindow(loads);
        const all = loads.reduce((sum, { heat }) => sum + heat, 0);
        expect(density).toBeLessThanOrEqual(all / 4 + 1e-9);
        const there = loads.reduce((sum, { heat, footprint: rectangle }) => {
          const inside = overlapArea(footprint(rectangle), x, y, x + 2, y + 2);
          return sum + (heat * inside) / (rectangle.width_m * rectangle.depth_m);
        }, 0);
        expect(density).toBeCloseTo(there / 4, 6);
      }),
      { numRuns: 200 },
    );
  });

  it('finds the tall stack among many shelves', () => {
    const shelves = Array.from({ length: 100 }, (_, i) => ({
      heat: 100,
      footprint: { x_m: (i % 10) * 2, y_m: Math.floor(i / 10) * 2, width_m: 1, depth_m: 0.5, rotation_deg: 0 },
    }));
    const stack = { heat: 5000, footprint: { x_m: 7, y_m: 9, width_m: 1, depth_m: 1, rotation_deg: 45 } };
    const { density, x, y } = densestWindow([...shelves, stack]);
    expect(density).toBeGreaterThan(1250);
    expect(Math.abs(x + 1 - 7)).toBeLessThan(1);
    expect(Math.abs(y + 1 - 9)).toBeLessThan(1);
  });
});
