import { expect, test } from 'vitest';
import { box, groundFloor, uid, withRoom } from '../../../support/survey-builder.ts';
import { PlanDriver } from '../book-driver.ts';

function drawing(document = groundFloor()): PlanDriver {
  const driver = new PlanDriver(document);
  driver.session.setTool('draw-room');
  return driver;
}

const outline = (driver: PlanDriver): string[] =>
  [...driver.document.corners.values()].map(({ x_m, y_m }) => `${x_m} ${y_m}`).sort();

test('a drag draws a rectangle on the grid, as one step, and takes the room in hand', () => {
  const driver = drawing();
  driver.drag([2.02, 2.03], [8.01, 5.96]);
  const [room] = driver.document.rooms.values();
  expect(room?.name).toBe('Room 1');
  expect(outline(driver)).toEqual(['2 2', '2 6', '8 2', '8 6']);
  expect(driver.session.state.roomInHand).toBe(room?.id);
  expect(driver.session.state.selection).toEqual([{ kind: 'room', id: room?.id }]);
  expect(driver.session.state.tool).toBe('select');
  expect(driver.queued).toHaveLength(1);
  driver.session.undo();
  expect(driver.document.rooms.size).toBe(0);
  expect(driver.document.corners.size).toBe(0);
});

test('corners pressed one by one close on the first', () => {
  const driver = drawing();
  driver.press(2, 2);
  driver.press(8, 2);
  driver.press(8, 6);
  driver.press(5, 6);
  driver.press(5, 4);
  driver.press(2, 4);
  expect(driver.document.rooms.size).toBe(0);
  driver.press(2.05, 2.04);
  expect(outline(driver)).toEqual(['2 2', '2 4', '5 4', '5 6', '8 2', '8 6']);
  expect(driver.queued).toHaveLength(1);
});

test('Enter closes an outline of three corners or more, and not one of two', () => {
  const driver = drawing();
  driver.press(2, 2);
  driver.press(8, 2);
  driver.keys('Enter');
  expect(driver.document.rooms.size).toBe(0);
  driver.press(8, 6);
  driver.keys('Enter');
  expect(outline(driver)).toEqual(['2 2', '8 2', '8 6']);
});

test('a typed length goes in the direction pointed to and beats the grid', () => {
  const driver = drawing();
  driver.press(2, 2);
  driver.move(6, 2);
  driver.type('4.237');
  expect(driver.preview.typed?.text).toBe('4.237');
  driver.keys('Enter');
  driver.move(6.237, 5);
  driver.type('2500mm');
  driver.keys('Enter');
  driver.keys('Enter');
  expect(outline(driver)).toEqual(['2 2', '6.237 2', '6.237 4.5']);
});

test('two typed lengths after the first corner make a rectangle towards the pointer', () => {
  const driver = drawing();
  driver.press(2, 6);
  driver.move(5, 4);
  driver.type('6 x 4');
  driver.keys('Enter');
  expect(outline(driver)).toEqual(['2 2', '2 6', '8 2', '8 6']);
});

test('what cannot be read as a length is said and nothing drawn is lost', () => {
  const driver = drawing();
  driver.press(2, 2);
  driver.move(6, 2);
  driver.type('1,234');
  driver.keys('Enter');
  expect(driver.session.state.message?.text).toMatch(/1234|1\.234/);
  expect(driver.preview.drawing?.points).toEqual([{ x_m: 2, y_m: 2 }]);
  expect(driver.preview.typed?.text).toBe('1,234');
});

test('Backspace takes back what was typed, then corner by corner', () => {
  const driver = drawing();
  driver.press(2, 2);
  driver.press(8, 2);
  driver.type('4');
  driver.keys('Backspace');
  expect(driver.preview.typed).toBeUndefined();
  driver.keys('Backspace');
  expect(driver.preview.drawing?.points).toEqual([{ x_m: 2, y_m: 2 }]);
  driver.keys('Backspace');
  expect(driver.host.tool.state()).toBe('idle');
});

test.each([
  ['Escape', (driver: PlanDriver) => driver.keys('Escape')],
  ['a lost pointer', (driver: PlanDriver) => driver.host.lose()],
  ['another tool', (driver: PlanDriver) => driver.session.setTool('measure')],
  ['a second finger', (driver: PlanDriver) => driver.down(1, 1, { id: 2, type: 'touch' })],
])('%s calls off a rectangle being dragged exactly', (_name, callOff) => {
  const driver = drawing();
  const before = driver.document;
  driver.down(2, 2, { type: 'touch' });
  driver.move(6, 5, { type: 'touch' });
  expect(driver.preview.drawing).toBeDefined();
  callOff(driver);
  driver.up(6, 5, { type: 'touch' });
  expect(driver.document).toBe(before);
  expect(driver.queued).toEqual([]);
  expect(driver.preview).toEqual({});
  expect(driver.session.state.canUndo).toBeNull();
});

test('Alt lets go of the grid; the corner lies where the pointer is, to the millimetre', () => {
  const driver = drawing();
  driver.drag([2.02, 2.02], [8.04, 5.96], { free: true });
  expect(outline(driver)).toEqual(['2.02 2.02', '2.02 5.96', '8.04 2.02', '8.04 5.96']);
});

test('a room beside another shares its corners', () => {
  // ┌────┬────┐
  // │ A  │ new│
  // └────┴────┘
  const driver = drawing(withRoom(groundFloor(), 'A', box(2, 2, 4, 4)));
  driver.drag([6.05, 2.04], [10, 6.03]);
  expect(driver.document.rooms.size).toBe(2);
  expect(driver.document.corners.size).toBe(6);
});

test('a room inside another asks, and the answer cuts it out', () => {
  const driver = drawing(withRoom(groundFloor(), 'hall', box(1, 1, 10, 8)));
  driver.drag([4, 4], [6, 6]);
  expect(driver.document.rooms.size).toBe(1);
  const { message } = driver.session.state;
  expect(message?.refusal?.code).toBe('ROOM_INSIDE_ROOM');
  message?.offer?.run();
  expect(driver.document.rooms.size).toBe(2);
  expect(driver.document.rooms.get(uid('hall'))?.holes).toHaveLength(1);
});

test('a room over another is refused by name and stays refused', () => {
  const driver = drawing(withRoom(groundFloor(), 'hall', box(1, 1, 6, 6)));
  driver.drag([5, 3], [10, 9]);
  expect(driver.document.rooms.size).toBe(1);
  expect(driver.session.state.message?.text).toContain('hall');
  expect(driver.queued).toEqual([]);
});

test('the keyboard alone draws a room: arrows point, Enter presses', () => {
  const driver = drawing();
  driver.keys('ArrowRight', 'Enter');
  const go = (key: string, steps: number) => {
    for (let step = 0; step < steps; step += 1) driver.host.key({ key, shift: true, alt: false });
  };
  go('ArrowRight', 5);
  driver.keys('Enter');
  go('ArrowUp', 4);
  driver.keys('Enter');
  go('ArrowLeft', 5);
  driver.keys('Enter');
  driver.keys('Enter');
  expect(outline(driver)).toEqual(['13 10', '13 6', '8 10', '8 6']);
});
