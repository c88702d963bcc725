import { hitTest } from '@embertally/web/src/book/interaction/hit-test.ts';
import { sceneOf } from '@embertally/web/src/book/interaction/scene.ts';
import { expect, test } from 'vitest';
import {
  box,
  cornerAt,
  crate,
  door,
  groundFloor,
  GROUND,
  uid,
  wallBetween,
  withEntries,
  withOpening,
  withRoom,
} from '../../../support/survey-builder.ts';

function scene() {
  let document = withRoom(groundFloor({ wall_thickness_m: 0.2 }), 'dock', box(0, 0, 8, 6));
  document = withOpening(document, door(wallBetween(document, [0, 0], [8, 0]), 3));
  document = withEntries(
    document,
    crate('big', 'dock', 4, 3, { width_m: 4, depth_m: 3 }),
    crate('small', 'dock', 4, 3),
    crate('by the wall', 'dock', 0.7, 3),
    crate('turned', 'dock', 7, 4.5, { width_m: 1.2, depth_m: 0.2, rotation_deg: 90 }),
  );
  const found = sceneOf(document, GROUND);
  if (found === null) throw new Error('no scene');
  return { document, scene: found };
}

const at = (x_m: number, y_m: number, corners?: ReadonlySet<string>) =>
  hitTest(scene().scene, { x_m, y_m }, { margin: 0.14, ...(corners === undefined ? {} : { corners }) }).map(
    ({ kind, id }) => (kind === 'wall' ? kind : `${kind} ${id}`),
  );

test('of two entries the smaller is meant', () => {
  expect(at(4, 3)).toEqual([`entry ${uid('small')}`, `entry ${uid('big')}`, `room ${uid('dock')}`]);
});

test('an opening beats its wall, on the wall’s face as well', () => {
  const [first, second] = at(3.4, 0.09);
  expect([first, second]).toEqual([`opening ${uid('door')}`, 'wall']);
});

test('an entry the pointer is on beats the wall it is only near', () => {
  expect(at(0.21, 3)[0]).toBe(`entry ${uid('by the wall')}`);
});

test('a wall beats the room beside it', () => {
  expect(at(0.2, 5)).toEqual(['wall', `room ${uid('dock')}`]);
});

test('a turned entry is hit where it lies now', () => {
  expect(at(7, 5)[0]).toBe(`entry ${uid('turned')}`);
  expect(at(7.5, 4.5)).toEqual([`room ${uid('dock')}`]);
});

test('corners count only when asked for, and then before all else', () => {
  const corner = cornerAt(scene().document, 0, 0);
  expect(at(0.05, 0.05)[0]).toBe('wall');
  expect(at(0.05, 0.05, new Set([corner]))[0]).toBe(`corner ${corner}`);
});

test('outside everything there is nothing', () => {
  expect(at(20, 20)).toEqual([]);
});
