import { useByKey } from '../catalogue/uses.ts';
import { bounds } from '../geometry/bounds.ts';
import { estimate, estimateOutputs } from '../methods/estimate.ts';
import { farField } from '../methods/plume/far-field.ts';
import { travellingTime } from '../methods/plume/travelling-time.ts';
import { pointsOf } from '../tally/points-of.ts';
import { readingOf, type FurtherGiven, type FurtherReading } from './further-reading.ts';

const SHARE = 0.1;
const USUAL_AMBIENT_C = 20;

/** A fire that travels through a hall instead of filling it. */
export function largeRoom(given: FurtherGiven): FurtherReading[] {
  return [
    readingOf(
      {
        id: 'travelling-fire',
        topic: 'large room',
        title: 'A fire that travels',
        note: 'For rooms too large for one hot layer: a tenth of the length burns at a time. Near field 800 to 1200 °C.',
      },
      () => travelling(given),
    ),
  ];
}

function travelling({ input, tally, basis }: FurtherGiven) {
  if (tally.room.regime !== 'large') return 'The room is not large: the tally covers it with one hot layer.';
  const use = input.room.use == null ? undefined : useByKey(input.room.use);
  const rate = input.options?.plateau_kW_m2 ?? use?.rhr_kW_m2 ?? null;
  const q_f = tally.load.perFloor?.value ?? null;
  if (rate === null) return 'No heat release rate per area is known for this use: state one.';
  if (q_f === null) return 'The load per floor area is not known.';
  const { minX_m, minY_m, maxX_m, maxY_m } = bounds(pointsOf(input.room.ring_m));
  const L = Math.max(maxX_m - minX_m, maxY_m - minY_m);
  const run = estimateOutputs(
    travellingTime,
    { q_f, rate, L, L_f: SHARE * L },
    {
      workings: true,
      origins: {
        rate: input.options?.plateau_kW_m2 == null ? { origin: 'catalogue', note: use?.label ?? '' } : 'given',
        L: { origin: 'computed', note: 'longer side of the room' },
        L_f: { origin: 'default', note: 'a tenth of the path' },
      },
    },
  );
  const Q = rate * SHARE * basis.areas.floor;
  const H = basis.areas.height;
  return [
    { name: 'One place burns for', estimate: run.of('burning') },
    { name: 'The whole fire lasts', estimate: run.of('total') },
    {
      name: 'Gas half the room away',
      estimate: estimate(
        farField,
        { Q, H, r: L / 2, T_0: input.options?.ambient_C ?? USUAL_AMBIENT_C, ratio: L / 2 / H },
        { workings: true, origins: { Q: { origin: 'computed', note: 'a tenth of the floor at that rate' } } },
      ),
    },
  ];
}
