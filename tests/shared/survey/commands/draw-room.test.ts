import { expect, test } from 'vitest';
import { checkInvariants } from '@embertally/shared/survey/check-invariants';
import { drawRoom } from '@embertally/shared/survey/commands/draw-room';
import { roomArea } from '@embertally/shared/survey/derive/room-area';
import { walls } from '@embertally/shared/survey/derive/walls';
import {
  box,
  cornerAt,
  crate,
  door,
  drawing,
  groundFloor,
  roomNamed,
  uid,
  wallBetween,
  withEntries,
  withOpening,
  withRoom,
} from '../../../support/survey-builder.ts';

test('a drawn room has its corners, its area and four walls of one room each', () => {
  const document = withRoom(groundFloor(), 'dock', box(0, 0, 6, 4));
  expect(document.corners.size).toBe(4);
  expect(roomArea(document, uid('dock'))).toBe(24);
  expect(walls(document, roomNamed(document, 'dock').storey_id).map((wall) => wall.roomIds.length)).toEqual([
    1, 1, 1, 1,
  ]);
});

test('coordinates are rounded to the millimetre once', () => {
  const document = withRoom(groundFloor(), 'dock', [
    [0.00049, 0],
    [6.0004, 0.1 + 0.2],
    [6.0006, 4.33333],
  ]);
  expect([...document.corners.values()].map(({ x_m, y_m }) => [x_m, y_m])).toEqual([
    [0, 0],
    [6, 0.3],
    [6.001, 4.333],
  ]);
});

//  ┌───────┬────┐
//  │ dock  │ bay│   the bay starts half-way up the dock's right wall, so the dock's ring
//  │       ├────┘   gains the corner at (6, 2)
//  └───────┘
test('a room drawn against another shares its corners and inserts one into its wall', () => {
  let document = withRoom(groundFloor(), 'dock', box(0, 0, 6, 4));
  document = withRoom(document, 'bay', box(6, 2, 3, 2));
  expect(document.corners.size).toBe(7);
  expect(roomNamed(document, 'dock').ring).toContain(cornerAt(document, 6, 2));
  const shared = walls(document, roomNamed(document, 'dock').storey_id).filter((wall) => wall.roomIds.length === 2);
  expect(shared).toHaveLength(1);
  expect(shared[0]?.length_m).toBe(2);
  expect(checkInvariants(document)).toEqual([]);
});

test('a corner 1 mm off another is that corner', () => {
  let document = withRoom(groundFloor(), 'dock', box(0, 0, 6, 4));
  document = withRoom(document, 'bay', box(6.001, 0, 3, 4));
  expect(document.corners.size).toBe(6);
  expect(checkInvariants(document)).toEqual([]);
});

test('corners of small rooms are inserted into the long wall of a room drawn along them', () => {
  let document = withRoom(groundFloor(), 'a', box(0, 0, 2, 2));
  document = withRoom(document, 'b', box(2, 0, 2, 2));
  document = withRoom(document, 'hall', box(-1, 2, 6, 3));
  expect(roomNamed(document, 'hall').ring).toHaveLength(7);
  expect(checkInvariants(document)).toEqual([]);
});

test('a new corner inside a door is refused by the door’s name, and beside it the door is hung on the right half', () => {
  let document = withRoom(groundFloor(), 'dock', box(0, 0, 6, 4));
  document = withOpening(document, door(wallBetween(document, [6, 0], [6, 4]), 1.6, { label: 'Stage door' }));
  const refused = drawRoom(document, drawing('bay', box(6, 2, 3, 2)));
  expect(refused).toMatchObject({ refused: true, code: 'CORNER_IN_OPENING', ids: [uid('door')] });
  expect(refused.refused && refused.message).toContain('door “Stage door”');

  document = withRoom(document, 'bay', box(6, 1, 3, 3));
  const hung = document.openings.get(uid('door'));
  expect(hung?.wall).toEqual(wallBetween(document, [6, 1], [6, 4]));
  expect(hung?.offset_m).toBe(0.6);
});

test('rooms never overlap', () => {
  const document = withRoom(groundFloor(), 'dock', box(0, 0, 6, 4));
  for (const corners of [box(5, 1, 4, 2), box(0, 0, 6, 4), box(0, 0, 3, 6), box(-1, 1, 8, 1)]) {
    expect(drawRoom(document, drawing('bay', corners))).toMatchObject({ code: 'ROOM_OVERLAPS', ids: [uid('dock')] });
  }
});

//  ┌──────────┐
//  │  ┌──┐    │
//  │  │  │    │
//  │  └──┘    │
//  └──────────┘
test('a room drawn inside another is offered to be cut out, and what stands there moves into it', () => {
  let document = withRoom(groundFloor(), 'dock', box(0, 0, 6, 4));
  document = withEntries(document, crate('inner', 'dock', 2, 2), crate('outer', 'dock', 5, 2));
  const inner = box(1, 1, 2, 2);
  expect(drawRoom(document, drawing('cage', inner))).toMatchObject({ code: 'ROOM_INSIDE_ROOM', field: 'cut_out' });
  document = withRoom(document, 'cage', inner, { cut_out: true });
  expect(roomNamed(document, 'dock').holes).toHaveLength(1);
  expect(roomArea(document, uid('dock'))).toBe(20);
  expect(document.entries.get(uid('inner'))?.room_id).toBe(uid('cage'));
  expect(document.entries.get(uid('outer'))?.room_id).toBe(uid('dock'));
  expect(checkInvariants(document)).toEqual([]);
});

//  ┌─────┬────┐
//  │     │ c  │
//  │     └────┤
//  └──────────┘
test('a room cut out of a corner leaves a bay, not a hole', () => {
  let document = withRoom(groundFloor(), 'dock', box(0, 0, 6, 4));
  document = withRoom(document, 'closet', box(4, 2, 2, 2), { cut_out: true });
  expect(roomNamed(document, 'dock').holes).toEqual([]);
  expect(roomNamed(document, 'dock').ring).toHaveLength(6);
  expect(roomArea(document, uid('dock'))).toBe(20);
  expect(checkInvariants(document)).toEqual([]);
});

test('a second room cut out beside the first shares its wall', () => {
  let document = withRoom(groundFloor(), 'dock', box(0, 0, 10, 6));
  document = withRoom(document, 'one', box(2, 2, 2, 2), { cut_out: true });
  document = withRoom(document, 'two', box(4, 2, 2, 2), { cut_out: true });
  expect(roomNamed(document, 'dock').holes).toHaveLength(1);
  expect(roomArea(document, uid('dock'))).toBe(52);
  expect(checkInvariants(document)).toEqual([]);
});

test('a cut from wall to wall would part the room and is refused', () => {
  const document = withRoom(groundFloor(), 'dock', box(0, 0, 6, 4));
  const refused = drawRoom(document, drawing('corridor', box(2, 0, 1, 4), { cut_out: true }));
  expect(refused).toMatchObject({ code: 'ROOM_WOULD_SPLIT', ids: [uid('dock')] });
});

test('a room drawn round others leaves them out', () => {
  let document = withRoom(groundFloor(), 'one', box(2, 2, 2, 2));
  document = withRoom(document, 'two', box(4, 2, 2, 2));
  expect(drawRoom(document, drawing('hall', box(0, 0, 10, 6)))).toMatchObject({ code: 'ROOM_AROUND_ROOM' });
  document = withRoom(document, 'hall', box(0, 0, 10, 6), { cut_out: true });
  expect(roomArea(document, uid('hall'))).toBe(52);
  expect(checkInvariants(document)).toEqual([]);
});

test.each([
  [
    'a bow tie',
    'ROOM_CROSSES_ITSELF',
    [
      [0, 0],
      [4, 4],
      [4, 0],
      [0, 4],
    ],
  ],
  [
    'no area',
    'ROOM_MEETS_ITSELF',
    [
      [0, 0],
      [4, 0],
      [2, 0],
    ],
  ],
  [
    'a spike back over itself',
    'ROOM_MEETS_ITSELF',
    [
      [0, 0],
      [4, 0],
      [4, 3],
      [4, 1],
      [0, 4],
    ],
  ],
  [
    'a wall of 4 cm',
    'WALL_TOO_SHORT',
    [
      [0, 0],
      [4, 0],
      [4, 0.04],
      [0, 4],
    ],
  ],
  [
    '0.2 m²',
    'ROOM_TOO_SMALL',
    [
      [0, 0],
      [0.5, 0],
      [0.5, 0.4],
      [0, 0.4],
    ],
  ],
  [
    'the same corner twice',
    'ROOM_MEETS_ITSELF',
    [
      [0, 0],
      [2, 0],
      [2, 2],
      [4, 2],
      [4, 0],
      [2, 0],
      [2, -2],
      [0, -2],
    ],
  ],
] as const)('an outline with %s is refused', (_, code, corners) => {
  const refused = drawRoom(groundFloor(), drawing('dock', corners));
  expect(refused).toMatchObject({ refused: true, code });
});

test('not a number, too far away, too long a name: a sentence at the field, nothing drawn', () => {
  const nan = drawRoom(
    groundFloor(),
    drawing('dock', [
      [0, 0],
      [Number.NaN, 0],
      [2, 2],
    ]),
  );
  expect(nan).toMatchObject({ code: 'FIELD_OUT_OF_RANGE', field: 'x_m' });
  const long = drawRoom(groundFloor(), drawing('dock', box(0, 0, 3, 3), { name: '🔥'.repeat(5000) }));
  expect(long).toMatchObject({ code: 'FIELD_OUT_OF_RANGE', field: 'name' });
  const named = withRoom(groundFloor(), 'dock', box(0, 0, 3, 3), { name: '🔥 مخزن الأزياء' });
  expect(roomNamed(named, 'dock').name).toBe('🔥 مخزن الأزياء');
});
