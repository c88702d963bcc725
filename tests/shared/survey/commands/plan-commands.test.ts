import { expect, test } from 'vitest';
import { checkInvariants } from '@embertally/shared/survey/check-invariants';
import { addStorey } from '@embertally/shared/survey/commands/add-storey';
import { deleteRoom } from '@embertally/shared/survey/commands/delete-room';
import { deleteStorey } from '@embertally/shared/survey/commands/delete-storey';
import { editRoom } from '@embertally/shared/survey/commands/edit-room';
import { editStorey } from '@embertally/shared/survey/commands/edit-storey';
import { fillHole } from '@embertally/shared/survey/commands/fill-hole';
import { insertCorner } from '@embertally/shared/survey/commands/insert-corner';
import { moveCorner } from '@embertally/shared/survey/commands/move-corner';
import { moveWall } from '@embertally/shared/survey/commands/move-wall';
import { removeCorner } from '@embertally/shared/survey/commands/remove-corner';
import { openingPosition } from '@embertally/shared/survey/derive/opening-position';
import { roomArea } from '@embertally/shared/survey/derive/room-area';
import { newStorey } from '@embertally/shared/survey/new-storey';
import {
  box,
  cornerAt,
  crate,
  done,
  door,
  groundFloor,
  GROUND,
  ran,
  roomNamed,
  uid,
  wallBetween,
  withEntries,
  withOpening,
  withRoom,
} from '../../../support/survey-builder.ts';

//   (0,4)───(6,4)───(9,4)
//     │ dock  │  bay  │
//   (0,0)───(6,0)───(9,0)
const twoRooms = (thickness = 0) =>
  withRoom(withRoom(groundFloor({ wall_thickness_m: thickness }), 'dock', box(0, 0, 6, 4)), 'bay', box(6, 0, 3, 4));

test('moving a corner moves only it, for both rooms that share it', () => {
  const document = twoRooms();
  const corner_id = cornerAt(document, 6, 4);
  const { changes } = done(document, moveCorner, { corner_id, x_m: 6, y_m: 5 });
  expect(changes).toEqual([{ kind: 'corner', id: corner_id, before: { y_m: 4 }, after: { y_m: 5 } }]);
  const after = ran(document, moveCorner, { corner_id, x_m: 6, y_m: 5 });
  expect([roomArea(after, uid('dock')), roomArea(after, uid('bay'))]).toEqual([27, 13.5]);
});

test('a corner moved into another room’s wall is inserted there, and one moved onto another becomes it', () => {
  let document = withRoom(groundFloor(), 'dock', box(0, 0, 6, 4));
  document = withRoom(document, 'bay', box(7, 1, 3, 2));
  document = ran(document, moveCorner, { corner_id: cornerAt(document, 7, 1), x_m: 6, y_m: 1 });
  expect(roomNamed(document, 'dock').ring).toContain(cornerAt(document, 6, 1));
  document = ran(document, moveCorner, { corner_id: cornerAt(document, 7, 3), x_m: 6, y_m: 4 });
  expect(document.corners.size).toBe(7);
  expect(roomNamed(document, 'bay').ring).toContain(cornerAt(document, 6, 4));
  expect(checkInvariants(document)).toEqual([]);
});

test('a wall moved over a corner of another room joins it', () => {
  let document = withRoom(groundFloor(), 'dock', box(0, 0, 6, 4));
  document = withRoom(document, 'bay', [
    [8, 2],
    [10, 0],
    [10, 4],
  ]);
  document = ran(document, moveWall, {
    storey_id: GROUND,
    wall: wallBetween(document, [6, 0], [6, 4]),
    dx_m: 2,
    dy_m: 0,
  });
  expect(roomNamed(document, 'dock').ring).toContain(cornerAt(document, 8, 2));
  expect(roomArea(document, uid('dock'))).toBe(32);
});

test('corners that would cross walls, leave too little or too short are refused with the numbers', () => {
  const document = twoRooms();
  const at = (x_m: number, y_m: number) => moveCorner(document, { corner_id: cornerAt(document, 6, 4), x_m, y_m });
  expect(at(6, -1)).toMatchObject({ refused: true });
  expect(at(6, 0.03)).toMatchObject({ code: 'WALL_TOO_SHORT', message: expect.stringContaining('0.03 m') as string });
  expect(at(6, 0)).toMatchObject({ code: 'WALL_TOO_SHORT' });
  expect(at(Number.NaN, 0)).toMatchObject({ code: 'FIELD_OUT_OF_RANGE' });
  expect(at(20_000, 4)).toMatchObject({ code: 'FIELD_OUT_OF_RANGE', field: 'x_m' });
});

test('moving a wall moves every corner on its straight line, across rooms, and nothing beyond', () => {
  const document = withRoom(twoRooms(), 'far', box(20, 4, 2, 2));
  const after = ran(document, moveWall, {
    storey_id: GROUND,
    wall: wallBetween(document, [0, 4], [6, 4]),
    dx_m: 0,
    dy_m: 0.5,
  });
  expect([roomArea(after, uid('dock')), roomArea(after, uid('bay')), roomArea(after, uid('far'))]).toEqual([
    27, 13.5, 4,
  ]);
});

test('a slanted wall with a corner in it, rounded to the millimetre, still moves as one', () => {
  let document = withRoom(groundFloor(), 'dock', [
    [0, 0],
    [7, 3],
    [7, 8],
    [0, 8],
  ]);
  const wall = wallBetween(document, [0, 0], [7, 3]);
  document = ran(document, insertCorner, { storey_id: GROUND, wall, corner_id: uid('mid'), x_m: 0.3, y_m: 0.129 });
  const short: [string, string] = [cornerAt(document, 0, 0), uid('mid')];
  const { changes } = done(document, moveWall, { storey_id: GROUND, wall: short, dx_m: 0, dy_m: -1 });
  expect(changes.filter(({ kind }) => kind === 'corner')).toHaveLength(3);
});

test('a door keeps its place when its wall gets longer at either end, and slides to stay in a shorter one', () => {
  const wall = (document: ReturnType<typeof twoRooms>) => wallBetween(document, [0, 0], [6, 0]);
  const document = withOpening(twoRooms(), door(wall(twoRooms()), 2));
  const left = ran(document, moveWall, {
    storey_id: GROUND,
    wall: wallBetween(document, [0, 0], [0, 4]),
    dx_m: -1,
    dy_m: 0,
  });
  expect(openingPosition(left, uid('door'))?.from).toEqual({ x_m: 2, y_m: 0 });
  expect(left.openings.get(uid('door'))?.offset_m).toBe(3);
  const right = ran(document, moveWall, {
    storey_id: GROUND,
    wall: wallBetween(document, [6, 0], [6, 4]),
    dx_m: -3.5,
    dy_m: 0,
  });
  expect(right.openings.get(uid('door'))?.offset_m).toBe(1.6);
  const tooFar = moveWall(document, {
    storey_id: GROUND,
    wall: wallBetween(document, [6, 0], [6, 4]),
    dx_m: -5.5,
    dy_m: 0,
  });
  expect(tooFar).toMatchObject({
    code: 'OPENING_TOO_WIDE',
    message: 'The door is 0.90 m wide but the wall has only 0.50 m free.',
    ids: [uid('door')],
  });
});

test('a wall moved past an entry is refused by the entry’s name', () => {
  const document = withEntries(twoRooms(), crate('Flats', 'dock', 5.5, 2));
  const wall = wallBetween(document, [6, 0], [6, 4]);
  expect(moveWall(document, { storey_id: GROUND, wall, dx_m: -1, dy_m: 0 })).toMatchObject({
    code: 'ENTRY_OUTSIDE_ROOM',
    message: '“Flats” would stand outside room “dock”.',
    ids: [uid('Flats'), uid('dock')],
  });
});

test('of several entries left outside all are counted and the first ones named', () => {
  const names = ['a', 'b', 'c', 'd', 'e'];
  const document = withEntries(twoRooms(), ...names.map((name) => crate(name, 'dock', 5.5, 2)));
  const refused = moveWall(document, {
    storey_id: GROUND,
    wall: wallBetween(document, [6, 0], [6, 4]),
    dx_m: -1,
    dy_m: 0,
  });
  const message = '“a”, “b”, “c” and 2 more would stand outside their rooms.';
  expect(refused).toMatchObject({ code: 'ENTRY_OUTSIDE_ROOM', message, ids: names.map(uid) });
});

test('a corner put into a wall goes into both rooms and may bend the wall at once', () => {
  const document = twoRooms();
  const wall = wallBetween(document, [6, 0], [6, 4]);
  const bent = ran(document, insertCorner, { storey_id: GROUND, wall, corner_id: uid('new'), x_m: 7, y_m: 2 });
  expect(roomNamed(bent, 'dock').ring).toContain(uid('new'));
  expect(roomNamed(bent, 'bay').ring).toContain(uid('new'));
  expect([roomArea(bent, uid('dock')), roomArea(bent, uid('bay'))]).toEqual([26, 10]);
  const back = ran(bent, removeCorner, { corner_id: uid('new') });
  expect([roomArea(back, uid('dock')), roomArea(back, uid('bay'))]).toEqual([24, 12]);
});

test('taking out a corner in a straight wall keeps its doors, at a bend the doors go with the walls', () => {
  let document = withRoom(groundFloor(), 'dock', [
    [0, 0],
    [3, 0],
    [6, 0],
    [6, 4],
    [0, 4],
  ]);
  document = withOpening(document, door(wallBetween(document, [6, 0], [3, 0]), 1));
  const joined = ran(document, removeCorner, { corner_id: cornerAt(document, 3, 0) });
  expect(openingPosition(joined, uid('door'))?.centre).toEqual({ x_m: 4.55, y_m: 0 });
  const bent = ran(document, removeCorner, { corner_id: cornerAt(document, 6, 0) });
  expect(bent.openings.size).toBe(0);
});

test('a corner where another wall ends, or a triangle’s corner, cannot go', () => {
  const document = twoRooms();
  expect(removeCorner(document, { corner_id: cornerAt(document, 6, 0) })).toMatchObject({ code: 'CORNER_HOLDS_WALLS' });
  const triangle = withRoom(groundFloor(), 'tip', [
    [0, 0],
    [3, 0],
    [0, 3],
  ]);
  expect(removeCorner(triangle, { corner_id: cornerAt(triangle, 3, 0) })).toMatchObject({
    code: 'ROOM_TOO_FEW_CORNERS',
  });
});

test('deleting a room takes its contents, its own corners and doors, and leaves the neighbour its corners', () => {
  let document = withEntries(twoRooms(), crate('a', 'bay', 7, 1), crate('b', 'dock', 1, 1));
  document = withOpening(document, door(wallBetween(document, [9, 0], [9, 4]), 1));
  document = withOpening(document, door(wallBetween(document, [6, 0], [6, 4]), 1, { id: uid('between') }));
  const after = ran(document, deleteRoom, { room_id: uid('bay') });
  expect([...after.rooms.keys()]).toEqual([uid('dock')]);
  expect([...after.entries.keys()]).toEqual([uid('b')]);
  expect([...after.openings.keys()]).toEqual([uid('between')]);
  expect(after.corners.size).toBe(4);
  expect(roomNamed(after, 'dock').ring).toBe(roomNamed(document, 'dock').ring);
});

test('the hole of a deleted room stays as a courtyard until it is filled', () => {
  let document = withRoom(groundFloor(), 'hall', box(0, 0, 10, 10));
  document = withRoom(document, 'yard', box(4, 4, 2, 2), { cut_out: true });
  expect(fillHole(document, { room_id: uid('hall'), corner_id: cornerAt(document, 4, 4) })).toMatchObject({
    code: 'ROOM_OVERLAPS',
  });
  document = ran(document, deleteRoom, { room_id: uid('yard') });
  expect(roomArea(document, uid('hall'))).toBe(96);
  document = ran(document, fillHole, { room_id: uid('hall'), corner_id: cornerAt(document, 4, 4) });
  expect(roomArea(document, uid('hall'))).toBe(100);
  expect(document.corners.size).toBe(4);
});

test('half the wall is taken off every side; walls that leave no floor are refused', () => {
  const document = twoRooms(0.2);
  expect(roomArea(document, uid('dock'))).toBeCloseTo(5.8 * 3.8, 9);
  const narrow = withRoom(document, 'slot', box(9, 0, 0.5, 4));
  const refused = editStorey(narrow, { storey_id: GROUND, patch: { wall_thickness_m: 0.5 } });
  expect(refused).toMatchObject({ code: 'ROOM_TOO_NARROW', ids: [uid('slot')] });
  expect(refused.refused && refused.message).toContain('0.50 m thick');
});

test('a measured floor area stands instead of the drawn one', () => {
  const document = ran(twoRooms(), editRoom, { room_id: uid('dock'), patch: { measured_floor_area_m2: 23.1 } });
  expect(roomArea(document, uid('dock'))).toBe(23.1);
});

test('a ceiling lower than a door is refused by the door’s name, for a room and for its storey', () => {
  const start = twoRooms();
  const document = withOpening(
    start,
    door(wallBetween(start, [0, 0], [6, 0]), 1, { label: 'Dock door', height_m: 2.4 }),
  );
  const message = 'The door “Dock door” reaches 2.40 m above the floor but room “dock” is only 2.20 m high.';
  expect(editRoom(document, { room_id: uid('dock'), patch: { height_m: 2.2 } })).toMatchObject({
    code: 'OPENING_TOO_HIGH',
    message,
  });
  expect(editStorey(document, { storey_id: GROUND, patch: { height_m: 2.2 } })).toMatchObject({
    code: 'OPENING_TOO_HIGH',
  });
});

test('fields out of range are refused at the field, with the number and its unit', () => {
  const document = twoRooms();
  expect(editRoom(document, { room_id: uid('dock'), patch: { height_m: 0.2 } })).toMatchObject({
    code: 'FIELD_OUT_OF_RANGE',
    field: 'height_m',
    message: 'The height must be at least 0.5 m; it is 0.2 m.',
  });
  expect(editRoom(document, { room_id: uid('dock'), patch: { name: 'x'.repeat(10_000) } })).toMatchObject({
    field: 'name',
    message: 'The name can have at most 200 characters; this one has 10,000.',
  });
  expect(editRoom(document, { room_id: uid('none'), patch: {} })).toMatchObject({ code: 'ROOM_GONE' });
});

test('a storey is added empty and goes with everything on it', () => {
  let document = withEntries(twoRooms(), crate('a', 'bay', 7, 1));
  document = ran(document, addStorey, { storey: newStorey({ id: uid('upper'), name: 'Upper floor', level_m: 3.2 }) });
  expect(addStorey(document, { storey: newStorey({ id: uid('upper'), name: 'x' }) })).toMatchObject({
    code: 'STOREY_EXISTS',
  });
  document = ran(document, deleteStorey, { storey_id: GROUND });
  expect([...document.storeys.keys()]).toEqual([uid('upper')]);
  expect([document.rooms.size, document.corners.size, document.openings.size, document.entries.size]).toEqual([
    0, 0, 0, 0,
  ]);
});
