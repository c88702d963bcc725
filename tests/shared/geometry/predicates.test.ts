import fc from 'fast-check';
import { expect, test } from 'vitest';
import { footprint } from '@embertally/shared/geometry/footprint';
import { interiorPoint } from '@embertally/shared/geometry/interior-point';
import { nearestOnSegment } from '@embertally/shared/geometry/nearest-on-segment';
import { onSegment } from '@embertally/shared/geometry/on-segment';
import { orientation } from '@embertally/shared/geometry/orientation';
import { pointInRegion } from '@embertally/shared/geometry/point-in-region';
import { pointInRing } from '@embertally/shared/geometry/point-in-ring';
import { regionRelation } from '@embertally/shared/geometry/region-relation';
import { ringInRegion } from '@embertally/shared/geometry/ring-in-region';
import { roundToMillimetre } from '@embertally/shared/geometry/round-to-millimetre';
import { segmentsCross } from '@embertally/shared/geometry/segments-cross';
import { selfCrossing } from '@embertally/shared/geometry/self-crossing';
import { starRing } from './rings.ts';
import { ringOf, stepsToEdge, windsRound } from './winding.ts';

const millimetres = fc.integer({ min: -10_000_000, max: 10_000_000 });

test('the turn of three places on the grid is exact, whole numbers being the judge', () => {
  const near = fc.integer({ min: -3, max: 3 });
  const offset = fc.oneof(near, millimetres);
  const toPoint = (x: bigint, y: bigint) => ({ x_m: Number(x) / 1000, y_m: Number(y) / 1000 });
  fc.assert(
    fc.property(millimetres, millimetres, offset, offset, offset, offset, (x, y, dx, dy, ex, ey) => {
      const within = (value: number) => BigInt(Math.max(-10_000_000, Math.min(10_000_000, value)));
      const a = [within(x), within(y)] as const;
      const b = [within(x + dx), within(y + dy)] as const;
      const c = [within(x + 2 * dx + ex), within(y + 2 * dy + ey)] as const;
      const exact = (b[0] - a[0]) * (c[1] - a[1]) - (b[1] - a[1]) * (c[0] - a[0]);
      expect(orientation(toPoint(...a), toPoint(...b), toPoint(...c))).toBe(exact > 0n ? 1 : exact < 0n ? -1 : 0);
    }),
    { numRuns: 5000, seed: 1 },
  );
});

test('exactly 1 mm beside a wall is on it, 2 mm is not', () => {
  const [a, b] = ringOf([0, 0], [10, 0]);
  if (a === undefined || b === undefined) throw new Error();
  expect(onSegment({ x_m: 5, y_m: 0.001 }, a, b)).toBe(true);
  expect(onSegment({ x_m: 5, y_m: 0.002 }, a, b)).toBe(false);
  expect(onSegment({ x_m: 10.001, y_m: 0 }, a, b)).toBe(true);
  expect(nearestOnSegment({ x_m: 3, y_m: 4 }, a, b)).toEqual({ point: { x_m: 3, y_m: 0 }, t: 0.3, distance_m: 4 });
  expect(nearestOnSegment({ x_m: -3, y_m: 4 }, a, b).distance_m).toBe(5);
  expect(nearestOnSegment({ x_m: 3, y_m: 4 }, a, a).distance_m).toBe(5);
});

test('segments cross only in a place that is an end of neither', () => {
  const [o, e, n, ne, half] = ringOf([0, 0], [2, 0], [0, 2], [2, 2], [1, 0]) as [P, P, P, P, P];
  expect(segmentsCross(o, ne, e, n)).toBe(true);
  expect(segmentsCross(o, e, half, n)).toBe(false);
  expect(segmentsCross(o, e, o, n)).toBe(false);
  expect(segmentsCross(o, e, half, e)).toBe(false);
});
type P = { x_m: number; y_m: number };

test('inside and outside agree with the winding number', () => {
  const spot = fc.double({ min: -9, max: 9, noNaN: true });
  fc.assert(
    fc.property(starRing, spot, spot, (ring, dx, dy) => {
      const [first] = ring as [P];
      const point = { x_m: first.x_m + dx, y_m: first.y_m + dy };
      if (stepsToEdge(point, ring) < 0.05) return;
      expect(pointInRing(point, ring)).toBe(windsRound(point, ring) ? 'inside' : 'outside');
    }),
    { numRuns: 400, seed: 2 },
  );
});

test('the edge of a hole is on, its inside is outside', () => {
  const region = { ring: ringOf([0, 0], [6, 0], [6, 4], [0, 4]), holes: [ringOf([2, 1], [4, 1], [4, 3], [2, 3])] };
  expect(pointInRegion({ x_m: 1, y_m: 2 }, region)).toBe('inside');
  expect(pointInRegion({ x_m: 2, y_m: 2 }, region)).toBe('on');
  expect(pointInRegion({ x_m: 3, y_m: 2 }, region)).toBe('outside');
  expect(pointInRegion({ x_m: 6, y_m: 4 }, region)).toBe('on');
});

test.each([
  [
    'bow tie',
    [
      [0, 0],
      [4, 4],
      [4, 0],
      [0, 4],
    ],
    { edges: [0, 2] },
  ],
  [
    'touches its own wall',
    [
      [0, 0],
      [4, 0],
      [4, 4],
      [2, 0],
      [0, 4],
    ],
    { edges: [0, 2], touchAt: { x_m: 2, y_m: 0 } },
  ],
  [
    'folds back',
    [
      [0, 0],
      [4, 0],
      [2, 0],
      [2, 3],
    ],
    { edges: [0, 1] },
  ],
  [
    'the same corner twice running',
    [
      [0, 0],
      [4, 0],
      [4, 0],
      [0, 4],
    ],
    { edges: [0, 1] },
  ],
] as const)('a ring that meets itself is found: %s', (_, corners, found) => {
  expect(selfCrossing(ringOf(...corners))).toMatchObject(found);
});

test('a ring with corners on a straight wall meets itself nowhere', () => {
  expect(selfCrossing(ringOf([0, 0], [2, 0], [4, 0], [4, 4], [0, 4]))).toBeNull();
});

test('how regions lie: neighbours, one in another, over one another', () => {
  const of = (...corners: readonly (readonly [number, number])[]) => ({ ring: ringOf(...corners), holes: [] });
  const room = of([0, 0], [6, 0], [6, 4], [0, 4]);
  expect(regionRelation(room, of([6, 0], [9, 0], [9, 4], [6, 4]))).toBe('apart');
  expect(regionRelation(of([1, 1], [2, 1], [2, 2], [1, 2]), room)).toBe('inside');
  expect(regionRelation(room, of([1, 1], [2, 1], [2, 2], [1, 2]))).toBe('around');
  expect(regionRelation(room, of([5, 1], [9, 1], [9, 3], [5, 3]))).toBe('overlap');
  expect(regionRelation(room, { ...room, ring: [...room.ring].reverse() })).toBe('overlap');
  const withHole = { ...room, holes: [ringOf([1, 1], [3, 1], [3, 3], [1, 3])] };
  expect(regionRelation(of([1, 1], [3, 1], [3, 3], [1, 3]), withHole)).toBe('apart');
  expect(regionRelation(of([0.5, 0.5], [3.5, 0.5], [3.5, 3.5], [0.5, 3.5]), withHole)).toBe('overlap');
});

test('a footprint turned by 45° fits where its corners fit, and not through a pillar', () => {
  const region = {
    ring: ringOf([0, 0], [6, 0], [6, 4], [0, 4]),
    holes: [ringOf([2.9, 1.9], [3.1, 1.9], [3.1, 2.1], [2.9, 2.1])],
  };
  const square = { x_m: 1, y_m: 1, width_m: Math.SQRT2, depth_m: Math.SQRT2, rotation_deg: 45 };
  expect(footprint(square).map(({ x_m, y_m }) => [roundToMillimetre(x_m), roundToMillimetre(y_m)])).toEqual([
    [1, 0],
    [2, 1],
    [1, 2],
    [0, 1],
  ]);
  expect(ringInRegion(footprint(square), region)).toBe(true);
  expect(ringInRegion(footprint({ ...square, x_m: 0.9 }), region)).toBe(false);
  expect(ringInRegion(footprint({ ...square, x_m: 3, y_m: 2 }), region)).toBe(false);
});

test('a place inside is inside, for any room and with a hole in its middle', () => {
  fc.assert(
    fc.property(starRing, (ring) => {
      const place = interiorPoint({ ring, holes: [] });
      expect(place && windsRound(place, ring)).toBe(true);
    }),
    { numRuns: 300, seed: 4 },
  );
  const region = { ring: ringOf([0, 0], [6, 0], [6, 4], [0, 4]), holes: [ringOf([1, 1], [5, 1], [5, 3], [1, 3])] };
  expect(pointInRegion(interiorPoint(region) as P, region)).toBe('inside');
});
