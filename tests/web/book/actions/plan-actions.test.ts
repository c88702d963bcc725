import { keyName } from '@embertally/web/src/book/actions/key-name.ts';
import { ALL_ACTIONS } from '@embertally/web/src/book/actions/plan-actions.ts';
import { runKey } from '@embertally/web/src/book/actions/run-key.ts';
import { expect, test } from 'vitest';
import { box, crate, groundFloor, uid, withEntries, withRoom } from '../../../support/survey-builder.ts';
import { PlanDriver } from '../book-driver.ts';

const pressed = (key: string, held: { ctrl?: boolean; shift?: boolean; alt?: boolean } = {}) => ({
  key,
  ctrlKey: held.ctrl ?? false,
  metaKey: false,
  shiftKey: held.shift ?? false,
  altKey: held.alt ?? false,
});

function withCrate(): PlanDriver {
  const document = withEntries(withRoom(groundFloor(), 'store', box(2, 2, 8, 6)), crate('a', 'store', 4, 4));
  const driver = new PlanDriver(document);
  driver.session.select([{ kind: 'entry', id: uid('a') }]);
  return driver;
}
const entry = (driver: PlanDriver) => driver.document.entries.get(uid('a'));
const key = (driver: PlanDriver, ...event: Parameters<typeof pressed>) => runKey(pressed(...event), driver);

test('no key does two things', () => {
  const keys = ALL_ACTIONS.flatMap((action) => action.keys);
  expect(keys.filter((name, index) => keys.indexOf(name) !== index)).toEqual([]);
});

test.each([
  [pressed('z', { ctrl: true }), 'Control+Z'],
  [pressed('Z', { ctrl: true, shift: true }), 'Control+Shift+Z'],
  [pressed('?', { shift: true }), '?'],
  [pressed('F', { shift: true }), 'Shift+F'],
  [pressed('ArrowUp', { alt: true }), 'Alt+ArrowUp'],
])('%#: a pressed key has one name', (event, name) => {
  expect(keyName(event)).toBe(name);
});

test('arrows move what is picked by 0.1 m, Shift by 1 m, Alt by 1 mm', () => {
  const driver = withCrate();
  key(driver, 'ArrowRight');
  key(driver, 'ArrowUp', { shift: true });
  key(driver, 'ArrowLeft', { alt: true });
  expect(entry(driver)).toMatchObject({ x_m: 4.099, y_m: 5 });
  expect(driver.queued).toHaveLength(3);
});

test('duplicate puts the copy beside the first, inside its room, and picks it', () => {
  const driver = withCrate();
  key(driver, 'd', { ctrl: true });
  const copy = [...driver.document.entries.values()].find(({ id }) => id !== uid('a'));
  expect(copy).toMatchObject({ x_m: 5.1, y_m: 4, room_id: uid('store'), recorded_by: 'Ines Okoro' });
  expect(driver.session.state.selection).toEqual([{ kind: 'entry', id: copy?.id }]);
});

test('a copy that would stand in the wall goes to another side', () => {
  const driver = withCrate();
  for (let step = 0; step < 5; step += 1) key(driver, 'ArrowRight', { shift: true });
  key(driver, 'd', { ctrl: true });
  const copy = [...driver.document.entries.values()].find(({ id }) => id !== uid('a'));
  expect(copy).toMatchObject({ x_m: 9, y_m: 5.1 });
});

test('copy and paste put the entry into the room in the middle of the view', () => {
  const driver = withCrate();
  key(driver, 'c', { ctrl: true });
  driver.session.setCamera({ x_m: 8, y_m: 6, pxPerM: 50 });
  key(driver, 'v', { ctrl: true });
  const pasted = [...driver.document.entries.values()].find(({ id }) => id !== uid('a'));
  expect(pasted).toMatchObject({ x_m: 8, y_m: 6, room_id: uid('store'), confirmed_by: null });
});

test('delete takes what is picked, and undo brings it back as it was', () => {
  const driver = withCrate();
  const before = entry(driver);
  key(driver, 'Delete');
  expect(entry(driver)).toBeUndefined();
  key(driver, 'z', { ctrl: true });
  expect(entry(driver)).toEqual(before);
});

test('what is not available now is not done', () => {
  const driver = new PlanDriver(groundFloor());
  expect(key(driver, 'c')).toBe(false);
  expect(key(driver, 'Delete')).toBe(false);
  expect(driver.session.state.tool).toBe('select');
});

test('a tool’s key takes it in hand and puts it away', () => {
  const driver = withCrate();
  key(driver, 'r');
  expect(driver.session.state.tool).toBe('draw-room');
  key(driver, 'r');
  expect(driver.session.state.tool).toBe('select');
});

test('fit shows the whole room', () => {
  const driver = withCrate();
  key(driver, 'f');
  const { camera, view } = driver.session.state;
  expect(camera).toMatchObject({ x_m: 6, y_m: 5 });
  expect(8 * camera.pxPerM).toBeLessThanOrEqual(view.width);
  expect(6 * camera.pxPerM).toBeLessThanOrEqual(view.height);
});
