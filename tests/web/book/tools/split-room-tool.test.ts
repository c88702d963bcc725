import { expect, test } from 'vitest';
import { roomArea } from '@embertally/shared/survey/derive/room-area';
import { box, groundFloor, uid, withRoom } from '../../../support/survey-builder.ts';
import { PlanDriver } from '../book-driver.ts';

function splitting(): PlanDriver {
  const driver = new PlanDriver(withRoom(groundFloor(), 'hall', box(2, 2, 8, 6)));
  driver.session.setTool('split-room');
  return driver;
}

const areas = (driver: PlanDriver) => [...driver.document.rooms.keys()].map((id) => roomArea(driver.document, id));

test('a wall from one side to the other parts the room, as one step, and takes the smaller part in hand', () => {
  const driver = splitting();
  driver.press(7, 2.04);
  driver.press(7, 7.96);
  expect(areas(driver)).toEqual([30, 18]);
  const [, part] = driver.document.rooms.keys();
  expect(driver.session.state.selection).toEqual([{ kind: 'room', id: part }]);
  expect(driver.session.state.tool).toBe('select');
  expect(driver.queued).toHaveLength(1);
  driver.session.undo();
  expect(areas(driver)).toEqual([48]);
});

test('the new wall may bend on its way; Backspace takes the last bend back', () => {
  const driver = splitting();
  driver.press(2, 5);
  driver.press(4, 5);
  driver.press(6, 4);
  driver.keys('Backspace');
  driver.press(4, 8);
  expect(areas(driver)).toEqual([42, 6]);
});

test('a wall that begins in the middle of the floor is refused in words, and nothing is changed', () => {
  const driver = splitting();
  driver.press(5, 5);
  driver.press(10, 5);
  expect(driver.queued).toEqual([]);
  expect(driver.session.state.message?.text).toContain('must begin and end on the walls');
});

test.each([
  ['Escape', (driver: PlanDriver) => driver.keys('Escape')],
  ['a lost pointer', (driver: PlanDriver) => driver.host.lose()],
  [
    'another tool',
    (driver: PlanDriver) => {
      driver.session.setTool('measure');
    },
  ],
])('%s calls it off', (_name, callOff) => {
  const driver = splitting();
  driver.press(7, 2);
  driver.move(7, 5);
  callOff(driver);
  expect(driver.preview).toEqual({});
  expect(driver.queued).toEqual([]);
  expect(driver.document.rooms.size).toBe(1);
  expect(uid('hall')).toBe([...driver.document.rooms.keys()][0]);
});
