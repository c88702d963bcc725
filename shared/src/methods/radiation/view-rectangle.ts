import { defineMethod } from '../define-method.ts';
import { definition } from '../sources.ts';

/** View of a parallel rectangle from a point opposite one of its corners. */
function fromCorner(width: number, height: number, distance: number): number {
  const x = width / distance;
  const y = height / distance;
  const u = Math.sqrt(1 + x * x);
  const v = Math.sqrt(1 + y * y);
  return ((x / u) * Math.atan(y / u) + (y / v) * Math.atan(x / v)) / (2 * Math.PI);
}

/** View factor of a parallel rectangle from a point opposite its centre and opposite a corner. */
export const viewRectangle = defineMethod({
  id: 'radiation.view-rectangle',
  version: 1,
  title: 'View of a rectangle',
  symbol: 'F',
  unit: '',
  inputs: {
    a: { symbol: 'a', unit: 'm', quantity: 'Width', valid: [1e-3, 1e4] },
    b: { symbol: 'b', unit: 'm', quantity: 'Height', valid: [1e-3, 1e4] },
    s: { symbol: 's', unit: 'm', quantity: 'Distance', valid: [1e-3, 1e4] },
  },
  equation:
    'corner: F = [X/√(1+X²) atan(Y/√(1+X²)) + Y/√(1+Y²) atan(X/√(1+Y²))]/2π, X = a/s, Y = b/s;  centre: four quarters',
  sources: [definition('configuration factor of parallel surfaces')],
  assumptions: ['The receiver is parallel to the rectangle.'],
  why: 'Openings and panels radiate by what is seen of them.',
  outOfRange: 'refuse',
  outputs: {
    centre: { symbol: 'F', unit: '', quantity: 'View factor opposite the centre' },
    corner: { symbol: 'F_c', unit: '', quantity: 'View factor opposite a corner' },
  },
  run: ({ a, b, s }) => ({ centre: 4 * fromCorner(a / 2, b / 2, s), corner: fromCorner(a, b, s) }),
});
