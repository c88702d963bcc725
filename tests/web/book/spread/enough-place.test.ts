import { enoughPlace } from '@embertally/web/src/book/spread/enough-place.ts';
import { describe, expect, it } from 'vitest';

const box = (x_m: number, y_m: number, width_m = 1, depth_m = 1) => ({ x_m, y_m, width_m, depth_m, rotation_deg: 0 });

describe('where an entry would stand with enough of a gap', () => {
  it('is straight away along the line of centres', () => {
    // Half widths 0.5 + 0.5 and a clear 1.8 m: centres 2.8 m apart.
    expect(enoughPlace(box(0, 0), box(1.4, 0), 1.8)?.x_m).toBeCloseTo(2.8, 6);
    // Along the diagonal the corners (0.5, 0.5) and (c − 0.5, c − 0.5) are √2 (c − 1) apart.
    const place = enoughPlace(box(0, 0), box(1.2, 1.2), 2);
    expect(place?.x_m).toBeCloseTo(1 + Math.SQRT2, 6);
    expect(place?.y_m).toBeCloseTo(1 + Math.SQRT2, 6);
  });

  it('is along the first one’s depth where both have one centre', () => {
    const place = enoughPlace(box(2, 2, 3, 1), box(2, 2), 1);
    expect(place?.x_m).toBeCloseTo(2, 6);
    expect(place?.y_m).toBeCloseTo(2 + 0.5 + 1 + 0.5, 6);
  });

  it('is nowhere else for one that stands far enough', () => {
    expect(enoughPlace(box(0, 0), box(5, 0), 1.8)).toBeNull();
  });
});
