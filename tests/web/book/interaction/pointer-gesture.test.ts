import { NO_PREVIEW } from '@embertally/web/src/book/interaction/preview.ts';
import fc from 'fast-check';
import { expect, test } from 'vitest';
import { box, crate, groundFloor, withEntries, withRoom } from '../../../support/survey-builder.ts';
import { PlanDriver } from '../book-driver.ts';

function store() {
  return withEntries(
    withRoom(groundFloor(), 'store', box(2, 2, 10, 8)),
    crate('a', 'store', 7, 6, { width_m: 6, depth_m: 5 }),
  );
}

const place = fc.tuple(fc.double({ min: 1, max: 14, noNaN: true }), fc.double({ min: 1, max: 11, noNaN: true }));
const trace = fc.record({
  tool: fc.constantFrom('select' as const, 'draw-room' as const, 'opening' as const, 'contents' as const),
  first: fc.array(place, { minLength: 2, maxLength: 6 }),
  second: fc.array(place, { minLength: 2, maxLength: 6 }),
  liftsFirst: fc.boolean(),
});

test('two fingers never edit, whatever they do: 100 random traces', () => {
  fc.assert(
    fc.property(trace, ({ tool, first, second, liftsFirst }) => {
      const driver = new PlanDriver(store());
      driver.session.setTool(tool, { entry: crate('x', '', 0, 0) });
      const { document } = driver;
      const one = { id: 1, type: 'touch' } as const;
      const two = { id: 2, type: 'touch' } as const;
      const a: [number, number] = first[0] ?? [3, 3];
      const b: [number, number] = second[0] ?? [4, 4];
      driver.down(...a, one);
      driver.down(...b, two);
      for (let step = 1; step < Math.max(first.length, second.length); step += 1) {
        const [p, q] = [first[step], second[step]];
        if (p !== undefined) driver.move(...p, one);
        if (q !== undefined) driver.move(...q, two);
      }
      driver.up(...a, liftsFirst ? one : two);
      driver.move(...b, liftsFirst ? two : one);
      driver.up(...b, liftsFirst ? two : one);
      expect(driver.document).toBe(document);
      expect(driver.queued).toEqual([]);
      expect(driver.preview).toEqual(NO_PREVIEW);
    }),
    { numRuns: 100 },
  );
});

test('two fingers spread apart zoom in around their middle', () => {
  const driver = new PlanDriver(store());
  const one = { id: 1, type: 'touch' } as const;
  const two = { id: 2, type: 'touch' } as const;
  driver.down(7, 6, one);
  driver.down(9, 6, two);
  driver.move(6, 6, one);
  const { camera } = driver.session.state;
  expect(camera.pxPerM).toBeCloseTo(75, 6);
});

test('after two fingers a single one draws again', () => {
  const driver = new PlanDriver(groundFloor());
  driver.session.setTool('draw-room');
  driver.down(3, 3, { id: 1, type: 'touch' });
  driver.down(5, 5, { id: 2, type: 'touch' });
  driver.up(3, 3, { id: 1, type: 'touch' });
  driver.up(5, 5, { id: 2, type: 'touch' });
  driver.drag([3, 3], [6, 6], { id: 3, type: 'touch', primary: true });
  expect(driver.document.rooms.size).toBe(1);
});

test('a pen draws while a palm rests on the plan', () => {
  const driver = new PlanDriver(groundFloor());
  driver.session.setTool('draw-room');
  driver.down(10, 2, { id: 1, type: 'touch' });
  driver.drag([3, 3], [6, 6], { id: 2, type: 'pen' });
  expect(driver.document.rooms.size).toBe(1);
  const { camera } = driver.session.state;
  driver.move(11, 3, { id: 1, type: 'touch' });
  expect(driver.session.state.camera).toBe(camera);
});

test('the space bar or the middle button moves the view, whatever is under it', () => {
  const driver = new PlanDriver(store());
  const { document } = driver;
  driver.drag([7, 6], [8, 6], { pans: true });
  expect(driver.session.state.camera.x_m).toBeLessThan(8);
  expect(driver.session.state.camera.y_m).toBeCloseTo(6, 9);
  expect(driver.document).toBe(document);
});

test('a second finger on the plan while the first is on a strip beside it draws nothing', () => {
  const driver = new PlanDriver(groundFloor());
  driver.session.setTool('draw-room');
  driver.drag([3, 3], [6, 6], { id: 2, type: 'touch', primary: false });
  expect(driver.document.rooms.size).toBe(0);
  expect(driver.preview).toEqual(NO_PREVIEW);
});
