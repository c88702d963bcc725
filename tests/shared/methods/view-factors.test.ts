import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { viewCylinder } from '@embertally/shared/methods/radiation/view-cylinder';
import { viewRectangle } from '@embertally/shared/methods/radiation/view-rectangle';

/** View of a rectangle by adding up cos²/πR² over small tiles. */
function rectangleByTiles(a: number, b: number, s: number): number {
  const n = 400;
  const tile = (a / n) * (b / n);
  let sum = 0;
  for (let i = 0; i < n; i += 1) {
    for (let j = 0; j < n; j += 1) {
      const x = ((i + 0.5) / n - 0.5) * a;
      const y = ((j + 0.5) / n - 0.5) * b;
      sum += (s * s * tile) / (Math.PI * (x * x + y * y + s * s) ** 2);
    }
  }
  return sum;
}

/** View of an upright cylinder from a target on the ground by adding up its visible side. */
function cylinderByTiles(L: number, H: number, D: number): readonly [vertical: number, horizontal: number] {
  const n = 900;
  const R = D / 2;
  const seen = Math.acos(R / L);
  let vertical = 0;
  let horizontal = 0;
  for (let i = 0; i < n; i += 1) {
    const angle = ((i + 0.5) / n) * seen;
    const x = L - R * Math.cos(angle);
    const y = R * Math.sin(angle);
    for (let j = 0; j < n; j += 1) {
      const z = ((j + 0.5) / n) * H;
      const squared = x * x + y * y + z * z;
      const facing = L * Math.cos(angle) - R;
      const part = (2 * facing * (R * seen * H)) / (n * n * Math.PI * squared * squared);
      vertical += part * x;
      horizontal += part * z;
    }
  }
  return [vertical, horizontal];
}

describe('view factors against sums over small tiles', () => {
  it.each([
    [4, 3, 5],
    [2, 2, 2],
    [10, 3, 6],
    [1, 2.4, 0.5],
  ])('rectangle %d × %d at %d m', (a, b, s) => {
    expect(viewRectangle.run({ a, b, s }).centre).toBeCloseTo(rectangleByTiles(a, b, s), 4);
  });

  it.each([
    [6, 9, 4],
    [10, 5, 3],
    [3, 1, 2],
    [40, 12, 8],
  ])('cylinder seen from %d m, %d m high, %d m wide', (L, H, D) => {
    const [vertical, horizontal] = cylinderByTiles(L, H, D);
    const view = viewCylinder.run({ L, H, D });
    expect(view.vertical).toBeCloseTo(vertical, 4);
    expect(view.horizontal).toBeCloseTo(horizontal, 4);
  });

  it('are between 0 and 1, grow with size and fall with distance', () => {
    const size = fc.double({ min: 0.1, max: 50, noNaN: true });
    const more = fc.double({ min: 1, max: 3, noNaN: true });
    fc.assert(
      fc.property(size, size, size, more, (a, b, s, k) => {
        const { centre, corner } = viewRectangle.run({ a, b, s });
        expect(centre).toBeGreaterThanOrEqual(corner);
        expect(centre).toBeLessThanOrEqual(1);
        expect(viewRectangle.run({ a: a * k, b, s }).centre).toBeGreaterThanOrEqual(centre - 1e-12);
        expect(viewRectangle.run({ a, b, s: s * k }).centre).toBeLessThanOrEqual(centre + 1e-12);
      }),
    );
  });
});
