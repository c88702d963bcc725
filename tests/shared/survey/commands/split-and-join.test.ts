import { expect, test } from 'vitest';
import { checkInvariants } from '@embertally/shared/survey/check-invariants';
import { editRoom } from '@embertally/shared/survey/commands/edit-room';
import { joinRooms } from '@embertally/shared/survey/commands/join-rooms';
import { splitRoom, type SplitRoomInput } from '@embertally/shared/survey/commands/split-room';
import { roomArea } from '@embertally/shared/survey/derive/room-area';
import type { SurveyDocument } from '@embertally/shared/survey/survey-document';
import {
  box,
  cornerAt,
  crate,
  door,
  groundFloor,
  ran,
  roomNamed,
  uid,
  wallBetween,
  withEntries,
  withOpening,
  withRoom,
} from '../../../support/survey-builder.ts';

//   (0,4)───────(6,4)───(9,4)
//     │   dock    │  bay  │
//   (0,0)───────(6,0)───(9,0)
const twoRooms = () => withRoom(withRoom(groundFloor(), 'dock', box(0, 0, 6, 4)), 'bay', box(6, 0, 3, 4));

const across = (...points: [number, number][]): SplitRoomInput => ({
  room_id: uid('dock'),
  new_room_id: uid('new'),
  name: 'new',
  points: points.map(([x_m, y_m]) => ({ x_m, y_m })),
  corner_ids: points.map((_, index) => uid(`split.${index}`)),
});

const area = (document: SurveyDocument, name: string): number => roomArea(document, uid(name)) ?? Number.NaN;

test('a wall across parts a room: floor, contents and openings go where they are', () => {
  let document = withEntries(twoRooms(), crate('a', 'dock', 1, 2), crate('b', 'dock', 5, 2));
  document = withOpening(document, door(wallBetween(document, [0, 0], [6, 0]), 0.5));
  document = ran(document, editRoom, {
    room_id: uid('dock'),
    patch: { use: 'storage', measured_floor_area_m2: 23, notes: 'dry' },
  });
  document = ran(document, splitRoom, across([4, 0], [4, 4]));
  expect(checkInvariants(document)).toEqual([]);
  expect([area(document, 'dock'), area(document, 'new')]).toEqual([16, 8]);
  expect(document.entries.get(uid('a'))?.room_id).toBe(uid('dock'));
  expect(document.entries.get(uid('b'))?.room_id).toBe(uid('new'));
  expect(roomNamed(document, 'new')).toMatchObject({ use: 'storage', notes: 'dry', measured_floor_area_m2: null });
  expect(document.openings.get(uid('door'))).toMatchObject({
    wall: [cornerAt(document, 0, 0), cornerAt(document, 4, 0)],
    offset_m: 0.5,
  });
});

test('the new wall may bend, begin at a corner and end in a neighbour’s wall, which is shared then', () => {
  const document = ran(twoRooms(), splitRoom, across([0, 0], [3, 2], [6, 3]));
  expect(checkInvariants(document)).toEqual([]);
  expect(area(document, 'dock') + area(document, 'new')).toBeCloseTo(24, 9);
  // Below the bent wall: shoelace of (0,0) (6,0) (6,3) (3,2) = 10.5 m².
  expect(area(document, 'new')).toBeCloseTo(10.5, 9);
  expect(roomNamed(document, 'bay').ring).toContain(cornerAt(document, 6, 3));
});

test('a hole stays with the part round it', () => {
  let document = withRoom(groundFloor(), 'dock', box(0, 0, 6, 4));
  document = withRoom(document, 'cage', box(4, 1, 1, 1), { cut_out: true });
  document = ran(document, splitRoom, across([2, 4], [2, 0]));
  expect(checkInvariants(document)).toEqual([]);
  expect([area(document, 'dock'), area(document, 'new'), area(document, 'cage')]).toEqual([15, 8, 1]);
});

test.each([
  [
    'an end in the middle of the floor',
    [
      [0, 2],
      [3, 2],
    ],
    'SPLIT_NOT_ACROSS',
  ],
  [
    'a way outside',
    [
      [0, 0],
      [3, -2],
      [6, 0],
    ],
    'SPLIT_LEAVES_ROOM',
  ],
  [
    'a way along a wall',
    [
      [0, 0],
      [6, 0],
    ],
    'SPLIT_LEAVES_ROOM',
  ],
  ['a single point', [[0, 0]], 'SPLIT_TOO_SHORT'],
  [
    'a part too small',
    [
      [0, 0.2],
      [0.2, 0],
    ],
    'ROOM_TOO_SMALL',
  ],
  [
    'a wall crossing itself',
    [
      [0, 1],
      [5, 1],
      [5, 3],
      [2, 3],
      [2, 0],
    ],
    'ROOM_CROSSES_ITSELF',
  ],
] as [string, [number, number][], string][])('%s is refused', (_, points, code) => {
  expect(splitRoom(twoRooms(), across(...points))).toMatchObject({ refused: true, code });
});

test('a wall may not end inside a door', () => {
  const document = withOpening(twoRooms(), door(wallBetween(twoRooms(), [0, 0], [6, 0]), 2));
  expect(splitRoom(document, across([2.4, 0], [2.4, 4]))).toMatchObject({ code: 'CORNER_IN_OPENING' });
});

test('joining takes the wall and its doors away and keeps what stood in both rooms', () => {
  let document = withEntries(twoRooms(), crate('a', 'dock', 1, 2), crate('b', 'bay', 7, 2));
  document = withOpening(document, door(wallBetween(document, [6, 0], [6, 4]), 1));
  document = ran(document, editRoom, { room_id: uid('bay'), patch: { notes: 'from the bay' } });
  document = ran(document, joinRooms, { room_id: uid('dock'), other_id: uid('bay') });
  expect(checkInvariants(document)).toEqual([]);
  expect(area(document, 'dock')).toBe(36);
  expect(document.rooms.size).toBe(1);
  expect(document.openings.size).toBe(0);
  expect(roomNamed(document, 'dock').notes).toBe('from the bay');
  expect([...document.entries.values()].map((entry) => entry.room_id)).toEqual([uid('dock'), uid('dock')]);
});

test('what was split joins to the same floor', () => {
  const parted = ran(twoRooms(), splitRoom, across([0, 0], [3, 2], [6, 3]));
  const document = ran(parted, joinRooms, { room_id: uid('dock'), other_id: uid('new') });
  expect(checkInvariants(document)).toEqual([]);
  expect(area(document, 'dock')).toBeCloseTo(24, 9);
});

test('a cage goes back into the room round it', () => {
  let document = withRoom(groundFloor(), 'dock', box(0, 0, 6, 4));
  document = withRoom(document, 'cage', box(4, 1, 1, 1), { cut_out: true });
  for (const [room_id, other_id] of [
    [uid('dock'), uid('cage')],
    [uid('cage'), uid('dock')],
  ] as const) {
    const after = ran(document, joinRooms, { room_id, other_id });
    expect(checkInvariants(after)).toEqual([]);
    expect(roomArea(after, room_id)).toBe(24);
  }
});

test('rooms that do not share one wall are refused', () => {
  const apart = withRoom(twoRooms(), 'far', box(20, 0, 3, 3));
  expect(joinRooms(apart, { room_id: uid('dock'), other_id: uid('far') })).toMatchObject({ code: 'ROOMS_NOT_BESIDE' });
  expect(joinRooms(apart, { room_id: uid('dock'), other_id: uid('dock') })).toMatchObject({ code: 'ROOMS_NOT_BESIDE' });
  const corner = withRoom(twoRooms(), 'corner', box(-3, 4, 3, 3));
  expect(joinRooms(corner, { room_id: uid('dock'), other_id: uid('corner') })).toMatchObject({
    code: 'ROOMS_NOT_BESIDE',
  });
});
