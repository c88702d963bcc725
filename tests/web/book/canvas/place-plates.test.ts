import { footprint, type Footprint } from '@embertally/shared/geometry/footprint';
import { pointInRing } from '@embertally/shared/geometry/point-in-ring';
import { segmentsCross } from '@embertally/shared/geometry/segments-cross';
import type { Point } from '@embertally/shared/geometry/point';
import { placePlate, type Plate, type PlateSize } from '@embertally/web/src/book/canvas/place-plates.ts';
import fc from 'fast-check';
import { expect, test } from 'vitest';

const p = (x_m: number, y_m: number): Point => ({ x_m, y_m });
const rectangle = (x: number, y: number, width: number, depth: number) => [
  p(x, y),
  p(x + width, y),
  p(x + width, y + depth),
  p(x, y + depth),
];
const SIZES: readonly PlateSize[] = [
  { width_m: 2, height_m: 0.8 },
  { width_m: 1, height_m: 0.4 },
];

function outlineOf(plate: Plate): readonly Point[] {
  const size = SIZES[plate.size];
  if (size === undefined) throw new Error('a size that was not offered');
  return rectangle(
    plate.centre.x_m - size.width_m / 2,
    plate.centre.y_m - size.height_m / 2,
    size.width_m,
    size.height_m,
  );
}

const edges = (ring: readonly Point[]) => ring.map((a, i) => [a, ring[(i + 1) % ring.length] ?? a] as const);

/** Judged another way than the placing does it: crossing edges, or a corner of one inside the other. */
function meet(a: readonly Point[], b: readonly Point[]): boolean {
  if (edges(a).some(([s, t]) => edges(b).some(([u, v]) => segmentsCross(s, t, u, v)))) return true;
  return a.some((q) => pointInRing(q, b) === 'inside') || b.some((q) => pointInRing(q, a) === 'inside');
}

// A row of rooms, some with a bay, with entries strewn about.
const entries = fc.array(
  fc.record({
    x_m: fc.double({ min: 0, max: 6, noNaN: true }),
    y_m: fc.double({ min: 0, max: 5, noNaN: true }),
    width_m: fc.double({ min: 0.2, max: 3, noNaN: true }),
    depth_m: fc.double({ min: 0.2, max: 3, noNaN: true }),
    rotation_deg: fc.integer({ min: 0, max: 359 }),
  }),
  { maxLength: 12 },
);
const room = fc.record({
  width: fc.double({ min: 0.5, max: 6, noNaN: true }),
  depth: fc.double({ min: 0.5, max: 5, noNaN: true }),
  bay: fc.boolean(),
  entries,
});

test('plates never cover an entry, a wall or each other, wherever they are put', () => {
  fc.assert(
    fc.property(fc.array(room, { minLength: 1, maxLength: 4 }), (rooms) => {
      let x = 0;
      const placed: (readonly Point[])[] = [];
      for (const { width, depth, bay, entries: strewn } of rooms) {
        const ring = bay
          ? [
              p(x, 0),
              p(x + width, 0),
              p(x + width, depth),
              p(x + width / 2, depth),
              p(x + width / 2, depth / 2),
              p(x, depth / 2),
            ]
          : rectangle(x, 0, width, depth);
        const own: Footprint[] = strewn.map((entry) => ({ ...entry, x_m: entry.x_m + x }));
        const plate = placePlate({
          ring,
          holes: [],
          entries: own,
          sizes: SIZES,
          clearance_m: 0.05,
          wish: p(x + width * 0.75, depth * 0.25),
        });
        x += width;
        if (plate === null) continue;
        const outline = outlineOf(plate);
        expect(outline.every((corner) => pointInRing(corner, ring) === 'inside')).toBe(true);
        expect(edges(outline).some(([s, t]) => edges(ring).some(([u, v]) => segmentsCross(s, t, u, v)))).toBe(false);
        for (const entry of own) expect(meet(outline, footprint(entry))).toBe(false);
        for (const other of placed) expect(meet(outline, other)).toBe(false);
        placed.push(outline);
      }
    }),
    { numRuns: 300 },
  );
});

test('an empty room has its plate where it is wished', () => {
  const wish = p(3, 2);
  const asked = { ring: rectangle(0, 0, 6, 4), holes: [], entries: [], sizes: SIZES, clearance_m: 0.05, wish };
  expect(placePlate(asked)).toEqual({ centre: wish, size: 0 });
});

test('where the full wording does not fit a shorter one is taken, and none where none fits', () => {
  const asked = { holes: [], entries: [], sizes: SIZES, clearance_m: 0.05 };
  expect(placePlate({ ...asked, ring: rectangle(0, 0, 1.4, 3), wish: p(0.7, 1.5) })?.size).toBe(1);
  expect(placePlate({ ...asked, ring: rectangle(0, 0, 0.6, 3), wish: p(0.3, 1.5) })).toBeNull();
});

test('a courtyard is kept clear', () => {
  const hole = rectangle(1, 1, 4, 2);
  const plate = placePlate({
    ring: rectangle(0, 0, 6, 5),
    holes: [hole],
    entries: [],
    sizes: SIZES,
    clearance_m: 0.05,
    wish: p(3, 2),
  });
  expect(plate).not.toBeNull();
  if (plate !== null) expect(meet(outlineOf(plate), hole)).toBe(false);
});
