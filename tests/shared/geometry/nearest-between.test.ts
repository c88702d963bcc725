import { footprint } from '@embertally/shared/geometry/footprint';
import { nearestBetween } from '@embertally/shared/geometry/nearest-between';
import { describe, expect, it } from 'vitest';

const box = (x_m: number, y_m: number, rotation_deg = 0) =>
  footprint({ x_m, y_m, width_m: 2, depth_m: 1, rotation_deg });

describe('the nearest places of two rings', () => {
  it('lie in the middle of the stretch that two edges share', () => {
    // Edges x = 1 and x = 2; the boxes share y from −0.3 to 0.5, so the middle is y = 0.1.
    const near = nearestBetween(box(0, 0), box(3, 0.2));
    expect(near.distance_m).toBeCloseTo(1, 12);
    expect(near.a.x_m).toBeCloseTo(1, 12);
    expect(near.b.x_m).toBeCloseTo(2, 12);
    expect(near.a.y_m).toBeCloseTo(0.1, 12);
    expect(near.b.y_m).toBeCloseTo(0.1, 12);
  });

  it('are the corners of boxes that stand across from each other', () => {
    // Corners (1, 0.5) and (2, 1.5): √2 apart.
    const near = nearestBetween(box(0, 0), box(3, 2));
    expect(near.distance_m).toBeCloseTo(Math.SQRT2, 12);
    expect(near.a).toEqual({ x_m: 1, y_m: 0.5 });
    expect(near.b).toEqual({ x_m: 2, y_m: 1.5 });
  });

  it('are where they touch', () => {
    expect(nearestBetween(box(0, 0), box(2, 0)).distance_m).toBeCloseTo(0, 12);
  });
});
