import { expect, test } from 'vitest';
import { box, groundFloor, withRoom } from '../../../support/survey-builder.ts';
import { PlanDriver } from '../book-driver.ts';

function withTool(): PlanDriver {
  const driver = new PlanDriver(withRoom(groundFloor(), 'hall', box(2, 2, 8, 6)));
  driver.session.setTool('opening', { openingKind: 'door' });
  return driver;
}

const placed = (driver: PlanDriver) => [...driver.document.openings.values()];

test('a press near a wall puts the opening there, centred under the pointer on the grid', () => {
  const driver = withTool();
  driver.press(5.03, 2.1);
  const [door] = placed(driver);
  expect(door).toMatchObject({ kind: 'door', width_m: 0.9, height_m: 2, state: 'closed' });
  const from = driver.document.corners.get(door?.wall[0] ?? '');
  const middle = Math.abs((from?.x_m ?? 0) - 5.03) - ((door?.offset_m ?? 0) + 0.45);
  expect(Math.abs(middle)).toBeLessThanOrEqual(0.051);
  expect(driver.session.state.selection).toEqual([{ kind: 'opening', id: door?.id }]);
  expect(driver.session.state.tool).toBe('opening');
  expect(driver.queued).toHaveLength(1);
  driver.session.undo();
  expect(placed(driver)).toEqual([]);
});

test('it stays in hand: each press is one more, and each one step', () => {
  const driver = withTool();
  driver.press(4, 2);
  driver.session.setTool('opening', { openingKind: 'window' });
  driver.press(7, 8);
  expect(placed(driver).map(({ kind }) => kind)).toEqual(['door', 'window']);
  expect(driver.queued).toHaveLength(2);
});

test('near the end of a wall it is held inside it', () => {
  const driver = withTool();
  driver.press(9.9, 2);
  const [door] = placed(driver);
  expect(door?.offset_m).toBeGreaterThanOrEqual(0);
  expect((door?.offset_m ?? 0) + (door?.width_m ?? 0)).toBeLessThanOrEqual(8);
});

test('a press far from every wall says where openings go', () => {
  const driver = withTool();
  driver.press(6, 5);
  expect(placed(driver)).toEqual([]);
  expect(driver.session.state.message?.text).toMatch(/wall/);
});

test('an opening over another is refused where it is and nothing changes', () => {
  const driver = withTool();
  driver.press(5, 2);
  driver.press(5.3, 2);
  expect(placed(driver)).toHaveLength(1);
  expect(driver.session.state.message?.kind).toBe('refusal');
});

test.each([
  ['Escape', (driver: PlanDriver) => driver.keys('Escape')],
  ['a lost pointer', (driver: PlanDriver) => driver.host.lose()],
  ['another tool', (driver: PlanDriver) => driver.session.setTool('select')],
])('%s calls off a press', (_name, callOff) => {
  const driver = withTool();
  driver.down(5, 2);
  callOff(driver);
  driver.up(5, 2);
  expect(placed(driver)).toEqual([]);
  expect(driver.preview).toEqual({});
});
