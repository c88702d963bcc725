import { snapPoint } from '@embertally/web/src/book/interaction/snap-point.ts';
import { expect, test } from 'vitest';

const p = (x_m: number, y_m: number) => ({ x_m, y_m });
const targets = {
  corners: [p(0, 0), p(6, 0), p(6, 4)],
  walls: [
    { a: p(0, 0), b: p(6, 0) },
    { a: p(6, 0), b: p(6, 4) },
  ],
};
const settings = { threshold: 0.2, suspended: false };

test('a corner wins over the wall it ends', () => {
  expect(snapPoint(p(5.9, 0.1), targets, settings)).toEqual({ point: p(6, 0), why: 'corner', guides: [] });
});

test('a wall pulls onto its line, and along it the grid decides', () => {
  const snapped = snapPoint(p(3.04, 0.15), targets, settings);
  expect(snapped.point.x_m).toBeCloseTo(3, 9);
  expect(snapped.point.y_m).toBe(0);
  expect(snapped.why).toBe('wall');
  expect(snapped.guides[0]?.why).toBe('wall');
});

test('in line with a corner the guide runs from that corner', () => {
  const snapped = snapPoint(p(2.03, 4.1), { ...targets, walls: [] }, settings);
  expect(snapped.point.x_m).toBeCloseTo(2, 9);
  expect(snapped.point.y_m).toBe(4);
  expect(snapped.why).toBe('in line');
  expect(snapped.guides).toEqual([{ a: p(6, 4), b: snapped.point, why: 'in line' }]);
});

test('far from everything the grid of 0.1 m takes it', () => {
  const snapped = snapPoint(p(2.04, 2.27), { corners: [], walls: [] }, settings);
  expect(snapped.point.x_m).toBeCloseTo(2, 9);
  expect(snapped.point.y_m).toBeCloseTo(2.3, 9);
  expect(snapped.why).toBe('grid');
});

test('the key lets go of everything', () => {
  expect(snapPoint(p(5.9, 0.1), targets, { ...settings, suspended: true })).toEqual({
    point: p(5.9, 0.1),
    why: null,
    guides: [],
  });
});

test('corners being drawn pull as well', () => {
  const drawn = [p(1.234, 1.5)];
  expect(snapPoint(p(1.3, 1.45), { corners: [], walls: [], drawn }, settings).why).toBe('corner');
  expect(snapPoint(p(1.3, 3.02), { corners: [], walls: [], drawn }, settings).point.x_m).toBe(1.234);
});

test('on an oblique wall the distance from its first corner goes to the grid', () => {
  const walls = [{ a: p(0, 0), b: p(3, 4) }];
  const { point } = snapPoint(p(1.25, 1.6), { corners: [], walls }, settings);
  expect(Math.hypot(point.x_m, point.y_m) * 10).toBeCloseTo(Math.round(Math.hypot(point.x_m, point.y_m) * 10), 9);
  expect(point.x_m * 4 - point.y_m * 3).toBeCloseTo(0, 9);
});
