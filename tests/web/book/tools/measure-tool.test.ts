import { expect, test } from 'vitest';
import { box, groundFloor, withRoom } from '../../../support/survey-builder.ts';
import { PlanDriver } from '../book-driver.ts';

function withTool(): PlanDriver {
  const driver = new PlanDriver(withRoom(groundFloor(), 'hall', box(2, 2, 8, 6)));
  driver.session.setTool('measure');
  return driver;
}

const measured = (driver: PlanDriver) => {
  const [line] = driver.preview.lengths ?? [];
  return line === undefined ? null : Math.hypot(line.b.x_m - line.a.x_m, line.b.y_m - line.a.y_m);
};

test('two presses measure between corners they snap to, and change nothing', () => {
  const driver = withTool();
  driver.press(2.05, 2.05);
  driver.press(9.96, 8.04);
  expect(measured(driver)).toBeCloseTo(10, 9);
  expect(driver.queued).toEqual([]);
  expect(driver.session.state.announcement.text).toBe('Measured 10.0 m');
});

test('a drag measures as well', () => {
  const driver = withTool();
  driver.drag([3, 3], [6, 7]);
  expect(measured(driver)).toBeCloseTo(5, 9);
});

test.each([
  ['Escape', (driver: PlanDriver) => driver.keys('Escape')],
  ['a lost pointer', (driver: PlanDriver) => driver.host.lose()],
])('%s takes the measure away', (_name, callOff) => {
  const driver = withTool();
  driver.press(3, 3);
  driver.move(5, 5);
  callOff(driver);
  expect(driver.preview).toEqual({});
  expect(driver.host.tool.state()).toBe('idle');
});
