import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { placeLabels, type LabelRequest } from '../../../../api/src/reports/plan/place-labels.ts';
import { rectMeetsPolygon, rectsOverlap, type Rect } from '../../../../api/src/reports/plan/polygon.ts';
import type { Point } from '../../../../api/src/reports/pdf/sheet.ts';

const square = (x: number, y: number, width: number, height: number): Point[] => [
  [x, y],
  [x + width, y],
  [x + width, y + height],
  [x, y + height],
];
const request = (more: Partial<LabelRequest> = {}): LabelRequest => ({
  id: 'a',
  rings: [square(0, 0, 100, 80)],
  obstacles: [],
  sizes: [
    { width: 50, height: 20 },
    { width: 10, height: 8 },
  ],
  ...more,
});
const PLAN: Rect = { x: 0, y: 0, width: 100, height: 80 };

describe('placeLabels', () => {
  it('stands in the middle of an empty room', () => {
    expect(placeLabels([request()], PLAN)).toMatchObject([{ x: 25, y: 30, size: 0, pointsAt: null }]);
  });

  it('moves aside for what stands in the middle', () => {
    const obstacle = square(40, 30, 20, 20);
    const [label] = placeLabels([request({ obstacles: [obstacle] })], PLAN);
    expect(label).toMatchObject({ size: 0, pointsAt: null });
    expect(label && rectMeetsPolygon(label, obstacle)).toBe(false);
  });

  it('shrinks when only a little floor is free', () => {
    const [label] = placeLabels([request({ obstacles: [square(0, 0, 100, 62)] })], PLAN);
    expect(label).toMatchObject({ size: 1, pointsAt: null });
  });

  it('stays out of a hole', () => {
    const hole = square(20, 15, 60, 50);
    const [label] = placeLabels([request({ rings: [square(0, 0, 100, 80), hole] })], PLAN);
    expect(label && rectMeetsPolygon(label, hole)).toBe(false);
  });

  it('stands outside with a line when the room is full', () => {
    const [label] = placeLabels([request({ obstacles: [square(0, 0, 100, 80)] })], PLAN);
    expect(label?.pointsAt).not.toBeNull();
    expect(label && rectsOverlap(label, PLAN)).toBe(false);
  });

  it('never covers an entry, a wall or another label, whatever stands in the rooms', () => {
    const rect = fc.record({
      x: fc.integer({ min: 0, max: 90 }),
      y: fc.integer({ min: 0, max: 70 }),
      width: fc.integer({ min: 2, max: 60 }),
      height: fc.integer({ min: 2, max: 50 }),
    });
    fc.assert(
      fc.property(fc.array(fc.array(rect, { maxLength: 8 }), { minLength: 1, maxLength: 6 }), (rooms) => {
        const requests = rooms.map((obstacles, index) =>
          request({
            id: String(index),
            rings: [square(index * 100, 0, 100, 80)],
            obstacles: obstacles.map(({ x, y, width, height }) =>
              square(index * 100 + x, y, Math.min(width, 98 - x), Math.min(height, 78 - y)),
            ),
          }),
        );
        const labels = placeLabels(requests, { x: 0, y: 0, width: rooms.length * 100, height: 80 });
        expect(labels).toHaveLength(rooms.length);
        for (const label of labels) {
          for (const other of labels) if (other !== label) expect(rectsOverlap(label, other)).toBe(false);
          for (const { obstacles, rings } of requests) {
            for (const obstacle of obstacles) expect(rectMeetsPolygon(label, obstacle)).toBe(false);
            for (const ring of rings) {
              const walls = ring.map((point, at) => [point, ring[(at + 1) % ring.length] ?? point]);
              for (const wall of walls) expect(rectMeetsPolygon(label, wall)).toBe(false);
            }
          }
        }
      }),
      { numRuns: 60 },
    );
  });
});
