import { bounds, boundsOverlap } from '@embertally/shared/geometry/bounds';
import type { Point } from '@embertally/shared/geometry/point';
import { placeBeside, type Beside, type OtherPlate } from '@embertally/web/src/book/canvas/place-beside.ts';
import { expect, test } from 'vitest';

const p = (x_m: number, y_m: number): Point => ({ x_m, y_m });
const room = (x: number, y: number, width: number, depth: number) => [
  p(x, y),
  p(x + width, y),
  p(x + width, y + depth),
  p(x, y + depth),
];
const SIZE = { width_m: 3, height_m: 1 };
const STOREY = [room(0, 0, 4, 6), room(4, 0, 4, 6), room(8, 0, 4, 6)];
const asked = { outlines: STOREY, size: SIZE, away_m: 0.5, gap_m: 0.2, others: [], lines: [], entries: [] };
const boxOf = ({ centre, width_m, height_m }: OtherPlate) =>
  bounds(room(centre.x_m - width_m / 2, centre.y_m - height_m / 2, width_m, height_m));

test('a plate stands outside the storey, straight out from its room on the nearer side', () => {
  expect(placeBeside({ ...asked, ends: [p(6, 2)] })).toEqual({ centre: p(6, -1), leadsTo: p(6, 2) });
  expect(placeBeside({ ...asked, ends: [p(6, 5)] })).toEqual({ centre: p(6, 7), leadsTo: p(6, 5) });
});

test('plates beside the storey cover neither a room nor each other, and keep within its width', () => {
  const placed: OtherPlate[] = [];
  const lines: Beside[] = [];
  for (let index = 0; index < 12; index++) {
    const beside = placeBeside({ ...asked, ends: [p(1 + (index % 11), 3)], others: placed, lines });
    if (beside === null) throw new Error('twelve plates have space in six rows of three');
    const plate = { ...SIZE, centre: beside.centre };
    for (const outline of STOREY) expect(boundsOverlap(boxOf(plate), bounds(outline))).toBe(false);
    for (const other of placed) expect(boundsOverlap(boxOf(plate), boxOf(other))).toBe(false);
    expect(boxOf(plate).minX_m).toBeGreaterThanOrEqual(0);
    expect(boxOf(plate).maxX_m).toBeLessThanOrEqual(12);
    placed.push(plate);
    lines.push(beside);
  }
});

test('the line takes a little way round to spare an entry', () => {
  const entry = bounds(room(5.5, -0.2, 1, 1));
  const beside = placeBeside({ ...asked, ends: [p(5, 2), p(6, 1.9)], entries: [entry] });
  expect(beside?.leadsTo).toEqual(p(5, 2));
});

test('a line that has nowhere to end is not drawn', () => {
  expect(placeBeside({ ...asked, ends: [] })).toBeNull();
});
