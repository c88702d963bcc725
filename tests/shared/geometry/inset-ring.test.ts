import fc from 'fast-check';
import { expect, test } from 'vitest';
import { insetRing } from '@embertally/shared/geometry/inset-ring';
import { signedArea } from '@embertally/shared/geometry/signed-area';
import { skyline, starRing } from './rings.ts';
import { ringOf, stepsToEdge, windsRound } from './winding.ts';

const areaOf = (corners: Parameters<typeof signedArea>[0] | null) =>
  corners === null ? null : Math.abs(signedArea(corners));

test('a rectangle loses half the wall on every side', () => {
  const clear = insetRing(ringOf([0, 0], [6, 0], [6, 4], [0, 4]), 0.1) ?? [];
  const expected = ringOf([0.1, 0.1], [5.9, 0.1], [5.9, 3.9], [0.1, 3.9]);
  expect(clear).toHaveLength(4);
  for (const [index, corner] of clear.entries()) {
    expect(corner.x_m).toBeCloseTo(expected[index]?.x_m ?? Number.NaN, 12);
    expect(corner.y_m).toBeCloseTo(expected[index]?.y_m ?? Number.NaN, 12);
  }
});

//  ┌────┐
//  │    └────┐   L-shape: 6×4 less 3×2; by hand 5.8·3.8 − 3·2 … the inner corner moves too:
//  │         │   area = 5.8×3.8 − 3×2 = 16.04
//  └─────────┘
test('at an inner corner the face moves into the room', () => {
  const ring = ringOf([0, 0], [6, 0], [6, 2], [3, 2], [3, 4], [0, 4]);
  expect(areaOf(insetRing(ring, 0.1))).toBeCloseTo(5.8 * 3.8 - 3 * 2, 9);
});

test('outwards, a pillar grows', () => {
  expect(areaOf(insetRing(ringOf([0, 0], [1, 0], [1, 1], [0, 1]), -0.1))).toBeCloseTo(1.44, 9);
});

test('a triangle keeps its angles: the inner radius falls by the shift', () => {
  // 3-4-5 triangle, inner radius 1: similar triangle with radius 0.75.
  expect(areaOf(insetRing(ringOf([0, 0], [4, 0], [0, 3]), 0.25))).toBeCloseTo(6 * 0.75 ** 2, 9);
});

test('corners on a straight wall do not count', () => {
  const ring = ringOf([0, 0], [2, 0], [4, 0], [6, 0], [6, 4], [3, 4], [0, 4]);
  expect(areaOf(insetRing(ring, 0.1))).toBeCloseTo(5.8 * 3.8, 9);
});

//  ┌──┐ ┌──┐
//  │  └─┘  │    a nib 0.2 m wide between two recesses, and a recess 0.2 m wide
test('a recess narrower than the wall closes, a nib in the wall stays', () => {
  const recess = ringOf([0, 0], [6, 0], [6, 4], [3.2, 4], [3.2, 5], [3, 5], [3, 4], [0, 4]);
  expect(areaOf(insetRing(recess, 0.15))).toBeCloseTo(5.7 * 3.7, 9);
  const nib = ringOf([0, 0], [6, 0], [6, 4], [3.2, 4], [3.2, 3], [3, 3], [3, 4], [0, 4]);
  expect(areaOf(insetRing(nib, 0.15))).toBeCloseTo(5.7 * 3.7 - 0.5 * 1, 9);
});

test('where nothing is left, or the room falls in two, there is no clear ring', () => {
  expect(insetRing(ringOf([0, 0], [6, 0], [6, 0.3], [0, 0.3]), 0.15)).toBeNull();
  expect(insetRing(ringOf([0, 0], [6, 0], [6, 0.2], [0, 0.2]), 0.15)).toBeNull();
  const dumbbell = ringOf(
    [0, 0],
    [2, 0],
    [2, 0.9],
    [4, 0.9],
    [4, 0],
    [6, 0],
    [6, 2],
    [4, 2],
    [4, 1.1],
    [2, 1.1],
    [2, 2],
    [0, 2],
  );
  expect(insetRing(dumbbell, 0.05)).not.toBeNull();
  expect(insetRing(dumbbell, 0.15)).toBeNull();
});

test('upright rooms: what is left are the places further than the shift from every wall, left–right and up–down', () => {
  let compared = 0;
  fc.assert(
    fc.property(skyline, fc.integer({ min: 1, max: 9 }), (ring, shift) => {
      const half = shift / 20 + 0.003;
      const inset = insetRing(ring, half);
      let floor = 0;
      const step = 0.05;
      for (let x_m = 0.011; x_m < 27; x_m += step) {
        for (let y_m = 0.013; y_m < 6; y_m += step * 4) {
          // A square of twice the shift around the place fits in the room when its corners and middles do.
          const fits = [-1, -0.5, 0, 0.5, 1].every((u) =>
            [-1, -0.5, 0, 0.5, 1].every((v) => windsRound({ x_m: x_m + u * half, y_m: y_m + v * half }, ring)),
          );
          if (fits) floor += 1;
          if (inset !== null && stepsToEdgeFast(x_m, y_m, inset) > 0.01) {
            compared += 1;
            if (windsRound({ x_m, y_m }, inset) !== fits)
              throw new Error(`${x_m}, ${y_m} at ${half}: ${JSON.stringify(ring)}`);
          }
        }
      }
      if (inset !== null) return;
      // No clear ring: nothing is left, or it is in parts, which the count cannot tell; a whole room of floor is a fault.
      expect(floor * step * step * 4).toBeLessThan(Math.abs(signedArea(ring)));
    }),
    { numRuns: 25, seed: 5 },
  );
  expect(compared).toBeGreaterThan(5000);
}, 120_000);

function stepsToEdgeFast(x_m: number, y_m: number, ring: readonly { x_m: number; y_m: number }[]): number {
  let nearest = Infinity;
  for (const [index, a] of ring.entries()) {
    const b = ring[(index + 1) % ring.length] ?? a;
    const dx = Math.max(Math.min(a.x_m, b.x_m) - x_m, 0, x_m - Math.max(a.x_m, b.x_m));
    const dy = Math.max(Math.min(a.y_m, b.y_m) - y_m, 0, y_m - Math.max(a.y_m, b.y_m));
    nearest = Math.min(nearest, Math.hypot(dx, dy));
  }
  return nearest;
}

test('any room: the clear ring lies inside, no nearer to a wall than the shift, and never meets itself', () => {
  let cleared = 0;
  fc.assert(
    fc.property(starRing, fc.double({ min: 0.01, max: 0.5, noNaN: true }), (ring, shift) => {
      const inset = insetRing(ring, shift);
      if (inset === null) return;
      cleared += 1;
      expect(Math.sign(signedArea(inset))).toBe(Math.sign(signedArea(ring)));
      for (const corner of inset) {
        expect(windsRound(corner, ring)).toBe(true);
        expect(stepsToEdge(corner, ring)).toBeGreaterThan(shift - 0.006);
      }
    }),
    { numRuns: 300, seed: 8 },
  );
  expect(cleared).toBeGreaterThan(200);
});
