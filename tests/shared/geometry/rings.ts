import fc from 'fast-check';
import type { Ring } from '@embertally/shared/geometry/point';
import { selfCrossing } from '@embertally/shared/geometry/self-crossing';

/** Star-shaped rings on the millimetre grid, often concave, either way round. */
export const starRing: fc.Arbitrary<Ring> = fc
  .record({
    radii: fc.array(fc.double({ min: 1, max: 8, noNaN: true }), { minLength: 3, maxLength: 14 }),
    at: fc.tuple(fc.integer({ min: -9000, max: 9000 }), fc.integer({ min: -9000, max: 9000 })),
    clockwise: fc.boolean(),
  })
  .map(({ radii, at, clockwise }) => {
    const corners = radii.map((radius, index) => {
      const angle = ((index + 0.3) / radii.length) * 2 * Math.PI;
      const grid = (value: number) => Math.round(value * 1000) / 1000;
      return { x_m: grid(at[0] + radius * Math.cos(angle)), y_m: grid(at[1] + radius * Math.sin(angle)) };
    });
    return clockwise ? corners.reverse() : corners;
  })
  .filter((ring) => selfCrossing(ring) === null);

/** Upright rings: a row of columns of different heights on a level floor, like a wall with recesses and piers. */
export const skyline: fc.Arbitrary<Ring> = fc
  .array(fc.record({ width: fc.integer({ min: 2, max: 30 }), height: fc.integer({ min: 10, max: 60 }) }), {
    minLength: 1,
    maxLength: 9,
  })
  .map((columns) => {
    const ring: { x_m: number; y_m: number }[] = [{ x_m: 0, y_m: 0 }];
    let x = columns.reduce((sum, { width }) => sum + width, 0);
    ring.push({ x_m: x / 10, y_m: 0 });
    let last: number | null = null;
    for (const { width, height } of columns.toReversed()) {
      if (last !== height) ring.push({ x_m: x / 10, y_m: height / 10 });
      x -= width;
      const top = ring.at(-1);
      if (last === height && top !== undefined) top.x_m = x / 10;
      else ring.push({ x_m: x / 10, y_m: height / 10 });
      last = height;
    }
    return ring;
  });
