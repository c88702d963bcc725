import { expect, test } from 'vitest';
import {
  box,
  cornerAt,
  crate,
  door,
  groundFloor,
  uid,
  wallBetween,
  withEntries,
  withOpening,
  withRoom,
} from '../../../support/survey-builder.ts';
import { PlanDriver } from '../book-driver.ts';

// ┌────────┬──────┐  y 8
// │ dock   │ shop │
// │  a b   │   c  │
// └────────┴──────┘  y 2
// x 2     8      13
function twoRooms(): PlanDriver {
  let document = withRoom(groundFloor(), 'dock', box(2, 2, 6, 6));
  document = withRoom(document, 'shop', box(8, 2, 5, 6));
  document = withOpening(document, door(wallBetween(document, [2, 2], [8, 2]), 2));
  document = withEntries(document, crate('a', 'dock', 4, 5), crate('b', 'dock', 6, 5), crate('c', 'shop', 11, 5));
  return new PlanDriver(document);
}

const entry = (driver: PlanDriver, name: string) => driver.document.entries.get(uid(name));
const picked = (driver: PlanDriver) => driver.session.state.selection.map(({ kind, id }) => `${kind} ${id}`);

test('a press picks what is under it and takes its room in hand', () => {
  const driver = twoRooms();
  driver.press(11, 5);
  expect(picked(driver)).toEqual([`entry ${uid('c')}`]);
  expect(driver.session.state.roomInHand).toBe(uid('shop'));
  driver.press(3, 7);
  expect(picked(driver)).toEqual([`room ${uid('dock')}`]);
  driver.press(15, 11);
  expect(picked(driver)).toEqual([]);
  expect(driver.queued).toEqual([]);
});

test('Shift adds to what is picked and takes away again', () => {
  const driver = twoRooms();
  driver.press(4, 5);
  driver.press(6, 5, { shift: true });
  expect(picked(driver)).toEqual([`entry ${uid('a')}`, `entry ${uid('b')}`]);
  driver.press(4, 5, { shift: true });
  expect(picked(driver)).toEqual([`entry ${uid('b')}`]);
});

test('a drag moves an entry in grid steps, as one step that undo takes back whole', () => {
  const driver = twoRooms();
  driver.drag([4, 5], [4.43, 6.52]);
  expect(entry(driver, 'a')).toMatchObject({ x_m: 4.4, y_m: 6.5, room_id: uid('dock') });
  expect(driver.queued).toHaveLength(1);
  driver.session.undo();
  expect(entry(driver, 'a')).toMatchObject({ x_m: 4, y_m: 5 });
});

test('over a wall it moves to that room', () => {
  const driver = twoRooms();
  driver.drag([4, 5], [10, 7]);
  expect(entry(driver, 'a')).toMatchObject({ room_id: uid('shop'), x_m: 10, y_m: 7 });
});

test('onto no room it springs back and says why', () => {
  const driver = twoRooms();
  const before = driver.document;
  driver.drag([4, 5], [4, 10]);
  expect(driver.document).toBe(before);
  expect(driver.session.state.message?.kind).toBe('refusal');
  expect(driver.preview).toEqual({});
});

test('several picked entries move together and keep their distances', () => {
  const driver = twoRooms();
  driver.press(4, 5);
  driver.press(6, 5, { shift: true });
  driver.drag([4, 5], [4.33, 6]);
  const [a, b] = [entry(driver, 'a'), entry(driver, 'b')];
  expect((b?.x_m ?? 0) - (a?.x_m ?? 0)).toBeCloseTo(2, 9);
  expect((b?.y_m ?? 0) - (a?.y_m ?? 0)).toBeCloseTo(0, 9);
  expect(driver.queued).toHaveLength(1);
});

test('a rectangle dragged over the floor picks the entries wholly in it', () => {
  const driver = twoRooms();
  driver.drag([3.2, 3.2], [6.2, 7]);
  expect(picked(driver)).toEqual([`entry ${uid('a')}`]);
  expect(driver.queued).toEqual([]);
});

test('a corner handle resizes from the opposite corner', () => {
  const driver = twoRooms();
  driver.press(4, 5);
  driver.drag([4.5, 5.5], [5.02, 6.01]);
  const a = entry(driver, 'a');
  expect(a).toMatchObject({ width_m: 1.5, depth_m: 1.5 });
  expect([(a?.x_m ?? 0) - 0.75, (a?.y_m ?? 0) - 0.75]).toEqual([3.5, 4.5]);
  expect(driver.queued).toHaveLength(1);
});

test('the knob turns in steps of 15°, with Alt freely', () => {
  const driver = twoRooms();
  driver.press(4, 5);
  // 26 px above the edge at 50 px/m
  driver.drag([4, 6.02], [5.02, 5.02]);
  expect(entry(driver, 'a')?.rotation_deg).toBe(270);
  driver.session.undo();
  expect(entry(driver, 'a')?.rotation_deg).toBe(0);
});

test('a corner of the picked room moves, and the neighbour with it', () => {
  const driver = twoRooms();
  driver.press(3, 7);
  const corner = cornerAt(driver.document, 8, 8);
  driver.drag([8, 8], [8.5, 9]);
  expect(driver.document.corners.get(corner)).toMatchObject({ x_m: 8.5, y_m: 9 });
  expect(driver.document.rooms.get(uid('shop'))?.ring).toContain(corner);
  expect(driver.queued).toHaveLength(1);
});

test('a wall of the picked room moves with every corner on its line', () => {
  const driver = twoRooms();
  driver.press(3, 7);
  driver.drag([5, 8], [5, 9]);
  const tops = [...driver.document.corners.values()].filter(({ y_m }) => y_m === 9);
  expect(tops.map(({ x_m }) => x_m).sort((a, b) => a - b)).toEqual([2, 8, 13]);
});

test('a wall that is not picked does not move under a slip of the hand', () => {
  const driver = twoRooms();
  const before = driver.document;
  driver.drag([5, 8], [5, 9]);
  expect(driver.document).toBe(before);
});

test('an opening slides along its wall', () => {
  const driver = twoRooms();
  driver.drag([4.45, 2], [6.05, 2.05]);
  const opening = driver.document.openings.get(uid('door'));
  expect(opening?.offset_m).toBeCloseTo(3.6, 6);
  expect(driver.queued).toHaveLength(1);
});

test.each([
  ['Escape', (driver: PlanDriver) => driver.keys('Escape')],
  ['a lost pointer', (driver: PlanDriver) => driver.host.lose()],
  ['another tool', (driver: PlanDriver) => driver.session.setTool('measure')],
])('%s calls off a drag exactly', (_name, callOff) => {
  const driver = twoRooms();
  const before = driver.document;
  driver.down(4, 5);
  driver.move(5, 6);
  expect(driver.preview.entries).toBeDefined();
  callOff(driver);
  driver.move(6, 6);
  driver.up(6, 6);
  expect(driver.document).toBe(before);
  expect(driver.preview).toEqual({});
  expect(driver.queued).toEqual([]);
});

test('who may only read can pick and look, and moves nothing', () => {
  const { document } = twoRooms();
  const reader = new PlanDriver(document, { canEdit: false });
  reader.drag([4, 5], [6, 6]);
  expect(reader.document).toBe(document);
  reader.press(11, 5);
  expect(picked(reader)).toEqual([`entry ${uid('c')}`]);
});

test('one finger on empty floor moves the view, never the plan', () => {
  const driver = twoRooms();
  const { camera } = driver.session.state;
  driver.drag([3, 3], [4, 3], { type: 'touch' });
  expect(driver.session.state.camera.x_m).toBeLessThan(camera.x_m);
  expect(driver.queued).toEqual([]);
});
