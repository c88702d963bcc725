import { expect, test } from 'vitest';
import { box, crate, groundFloor, uid, withEntries, withRoom } from '../../../support/survey-builder.ts';
import { NOW, PlanDriver } from '../book-driver.ts';

function withTool(document = withRoom(groundFloor(), 'store', box(2, 2, 8, 6))): PlanDriver {
  const driver = new PlanDriver(document);
  driver.session.setTool('contents', { entry: crate('crates', '', 0, 0, { width_m: 1.2, depth_m: 0.8 }) });
  return driver;
}

const placed = (driver: PlanDriver) => [...driver.document.entries.values()];

test('a press places the entry in the room under it, recorded by whom and when', () => {
  const driver = withTool();
  driver.move(5.02, 4.97);
  expect(driver.preview.ghost).toMatchObject({ x_m: 5, y_m: 5, width_m: 1.2 });
  driver.press(5.02, 4.97);
  const [entry] = placed(driver);
  expect(entry).toMatchObject({ room_id: uid('store'), x_m: 5, y_m: 5, recorded_by: 'Ines Okoro', recorded_at: NOW });
  expect(driver.session.state.roomInHand).toBe(uid('store'));
  expect(driver.session.state.tool).toBe('contents');
});

test('it stays armed: three presses are three entries and three steps', () => {
  const driver = withTool();
  driver.press(4, 4);
  driver.press(6, 4);
  driver.press(8, 4);
  expect(placed(driver)).toHaveLength(3);
  expect(new Set(placed(driver).map(({ id }) => id)).size).toBe(3);
  driver.session.undo();
  expect(placed(driver)).toHaveLength(2);
});

test('against a wall it comes to rest on the wall’s face, not on its centre line', () => {
  const driver = withTool(withRoom(groundFloor({ wall_thickness_m: 0.2 }), 'store', box(2, 2, 8, 6)));
  driver.press(2.78, 5);
  expect(placed(driver)[0]?.x_m).toBeCloseTo(2 + 0.1 + 0.6, 6);
});

test('beside another entry it stands in line with it', () => {
  const start = withEntries(
    withRoom(groundFloor(), 'store', box(2, 2, 8, 6)),
    crate('first', 'store', 4, 4.03, { width_m: 1.2, depth_m: 0.8 }),
  );
  const driver = withTool(start);
  driver.press(6.3, 4.1);
  const second = placed(driver)[1];
  expect(second?.y_m).toBeCloseTo(4.03, 6);
});

test('outside every room it says so and places nothing', () => {
  const driver = withTool();
  driver.move(14, 10);
  expect(driver.preview.unfit).toBe(true);
  driver.press(14, 10);
  expect(placed(driver)).toEqual([]);
  expect(driver.session.state.message?.text).toMatch(/room/);
});

test('without a choice it asks for one', () => {
  const driver = new PlanDriver(withRoom(groundFloor(), 'store', box(2, 2, 8, 6)));
  driver.session.setTool('contents');
  driver.press(5, 5);
  expect(placed(driver)).toEqual([]);
  expect(driver.session.state.message?.text).toMatch(/[Cc]hoose/);
});

test('brackets turn what is being placed', () => {
  const driver = withTool();
  driver.move(5, 5);
  driver.keys('[', '[');
  expect(driver.preview.ghost?.rotation_deg).toBe(30);
  driver.press(5, 5);
  expect(placed(driver)[0]?.rotation_deg).toBe(30);
});

test.each([
  ['Escape', (driver: PlanDriver) => driver.keys('Escape')],
  ['a lost pointer', (driver: PlanDriver) => driver.host.lose()],
  ['another tool', (driver: PlanDriver) => driver.session.setTool('select')],
])('%s calls off a press', (_name, callOff) => {
  const driver = withTool();
  driver.down(5, 5);
  callOff(driver);
  driver.up(5, 5);
  expect(placed(driver)).toEqual([]);
  expect(driver.preview).toEqual({});
  expect(driver.queued).toEqual([]);
});

test('Escape puts the tool away once nothing is going on', () => {
  const driver = withTool();
  driver.keys('Escape');
  expect(driver.session.state.tool).toBe('select');
});
