import fc from 'fast-check';
import { expect, test } from 'vitest';
import type { Point, Ring } from '@embertally/shared/geometry/point';
import { perimeter } from '@embertally/shared/geometry/perimeter';
import { regionArea } from '@embertally/shared/geometry/region-area';
import { signedArea } from '@embertally/shared/geometry/signed-area';
import { starRing } from './rings.ts';
import { ringOf } from './winding.ts';

/** Area by cutting ears off and adding up triangles by Heron's formula: no shoelace anywhere. */
function areaByTriangles(ring: Ring): number {
  const left = ring.map((point) => ({ ...point }));
  if (turnSum(left) < 0) left.reverse();
  let area = 0;
  while (left.length > 3) {
    const ear = left.findIndex((_, index) => isEar(left, index));
    if (ear < 0) throw new Error('no ear');
    const [a, b, c] = around(left, ear);
    area += heron(a, b, c);
    left.splice(ear, 1);
  }
  const [a, b, c] = left as [Point, Point, Point];
  return area + heron(a, b, c);
}

function around(ring: Ring, index: number): [Point, Point, Point] {
  return [ring.at(index - 1) as Point, ring[index] as Point, ring[(index + 1) % ring.length] as Point];
}

function heron(a: Point, b: Point, c: Point): number {
  const [p, q, r] = [side(a, b), side(b, c), side(c, a)].sort((x, y) => y - x) as [number, number, number];
  // Kahan's arrangement, stable for needles.
  return Math.sqrt(Math.max(0, (p + (q + r)) * (r - (p - q)) * (r + (p - q)) * (p + (q - r)))) / 4;
}

const side = (a: Point, b: Point): number => Math.hypot(a.x_m - b.x_m, a.y_m - b.y_m);

/** Sum of the turning angles: 2π counter-clockwise, −2π clockwise. */
function turnSum(ring: Ring): number {
  return ring.reduce((sum, _, index) => {
    const [a, b, c] = around(ring, index);
    const turn = Math.atan2(c.y_m - b.y_m, c.x_m - b.x_m) - Math.atan2(b.y_m - a.y_m, b.x_m - a.x_m);
    return sum + Math.atan2(Math.sin(turn), Math.cos(turn));
  }, 0);
}

function isEar(ring: Ring, index: number): boolean {
  const [a, b, c] = around(ring, index);
  const cross = (p: Point, q: Point, r: Point) => (q.x_m - p.x_m) * (r.y_m - p.y_m) - (q.y_m - p.y_m) * (r.x_m - p.x_m);
  if (cross(a, b, c) < 0) return false;
  return ring.every(
    (p) => p === a || p === b || p === c || cross(a, b, p) < 0 || cross(b, c, p) < 0 || cross(c, a, p) < 0,
  );
}

test('the shoelace area equals the triangles of an ear cutting, far from the origin as well', () => {
  fc.assert(
    fc.property(starRing, (ring) => {
      expect(Math.abs(signedArea(ring))).toBeCloseTo(areaByTriangles(ring), 4);
      expect(signedArea([...ring].reverse())).toBeCloseTo(-signedArea(ring), 9);
    }),
    { numRuns: 500, seed: 3 },
  );
});

test('a hole is taken off the area whichever way it runs', () => {
  const ring = ringOf([0, 0], [12, 0], [12, 8], [0, 8]);
  const hole = ringOf([2, 2], [4, 2], [4, 5], [2, 5]);
  expect(regionArea({ ring, holes: [hole] })).toBe(90);
  expect(regionArea({ ring, holes: [[...hole].reverse()] })).toBe(90);
  expect(perimeter(ring)).toBe(40);
});
