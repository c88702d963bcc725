import { hitTest } from '@embertally/web/src/book/interaction/hit-test.ts';
import { sceneOf } from '@embertally/web/src/book/interaction/scene.ts';
import { box, crate, groundFloor, GROUND, withRoom } from '../support/survey-builder.ts';
import { atMost, median, type BenchRow } from './bench-row.ts';

const ENTRIES = 5000;
const RUNS = 99;

/** What lies under the pointer on a storey of 5,000 turned entries. */
export function benchHitTest(): Promise<readonly BenchRow[]> {
  const scene = sceneOf(withRoom(groundFloor(), 'hall', box(0, 0, 130, 70)), GROUND);
  if (scene === null) throw new Error('The storey has no scene.');
  const entries = Array.from({ length: ENTRIES }, (_, index) =>
    crate(`e${index}`, 'hall', 1 + (index % 100) * 1.2, 1 + Math.floor(index / 100) * 1.2, {
      rotation_deg: index % 90,
    }),
  );
  const large = { ...scene, entries };
  const times = Array.from({ length: RUNS }, (_, run) => {
    const began = performance.now();
    hitTest(large, { x_m: 1 + run, y_m: 20 }, { margin: 0.14 });
    return performance.now() - began;
  });
  return Promise.resolve([atMost('what lies under the pointer, 5,000 entries, median', median(times), 'ms', 5)]);
}
