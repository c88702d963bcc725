import { placeStrip } from '@embertally/web/src/book/plan/place-strip.ts';
import { readCount } from '@embertally/web/src/book/plan/read-count.ts';
import { withMass } from '@embertally/web/src/book/plan/with-mass.ts';
import fc from 'fast-check';
import { expect, test } from 'vitest';
import { crate } from '../../../support/survey-builder.ts';

test.each([
  ['3', 3],
  [' 1 200 ', 1200],
  ['2,5', 2.5],
  ['0.25', 0.25],
])('a count %s is read', (typed, value) => {
  expect(readCount(typed)).toEqual({ ok: true, value });
});

test.each(['', '1,234', '1.234', 'three', '-2', 'NaN', '1e3'])('a count %j is refused with what to write', (typed) => {
  const read = readCount(typed);
  expect(read.ok).toBe(false);
});

test('a new mass keeps the shares of the parts', () => {
  const [part] = crate('a', 'x', 0, 0).parts;
  if (part === undefined) throw new Error('no part');
  const parts = withMass(
    [
      { ...part, mass_kg: 30 },
      { ...part, mass_kg: 10 },
    ],
    80,
  );
  expect(parts.map(({ mass_kg }) => mass_kg)).toEqual([60, 20]);
  expect(
    withMass(
      [
        { ...part, mass_kg: 0 },
        { ...part, mass_kg: 0 },
      ],
      80,
    ).map(({ mass_kg }) => mass_kg),
  ).toEqual([40, 40]);
});

test('the strip is always whole within the view when the view can hold it', () => {
  const point = fc.record({ x: fc.integer({ min: -2000, max: 3000 }), y: fc.integer({ min: -2000, max: 3000 }) });
  fc.assert(
    fc.property(fc.array(point, { minLength: 1, maxLength: 6 }), (points) => {
      const view = { width: 900, height: 600 };
      const strip = { width: 480, height: 80 };
      const { left, top } = placeStrip(points, strip, view);
      expect(left).toBeGreaterThanOrEqual(0);
      expect(top).toBeGreaterThanOrEqual(0);
      expect(left + strip.width).toBeLessThanOrEqual(view.width);
      expect(top + strip.height).toBeLessThanOrEqual(view.height);
    }),
  );
});

test('it does not cover what is picked when there is room beside it', () => {
  const view = { width: 900, height: 600 };
  const strip = { width: 300, height: 80 };
  const upper = placeStrip(
    [
      { x: 400, y: 200 },
      { x: 500, y: 260 },
    ],
    strip,
    view,
  );
  expect(upper.top + strip.height).toBeLessThanOrEqual(200);
  const lower = placeStrip(
    [
      { x: 400, y: 380 },
      { x: 500, y: 420 },
    ],
    strip,
    view,
  );
  expect(lower.top).toBeGreaterThanOrEqual(420);
});
