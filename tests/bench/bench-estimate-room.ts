import { estimateRoom } from '@embertally/shared/tally/estimate-room';
import { detectorResponse } from '@embertally/shared/methods/plume/detector-response';
import { parseRoomInput } from '@embertally/shared/tally/parse-room-input';
import type { RoomInput } from '@embertally/shared/tally/room-input';
import { KINDS } from '@embertally/shared/catalogue/kinds';
import { atMost, median, percentile, type BenchRow } from './bench-row.ts';

const ROUNDS = 7;
const RUNS = 60;

/** A store of 30 × 15 m with entries of every kind in turn, in rows that do not overlap. */
function room(entries: number, options: object = { samples: 0 }): RoomInput {
  const parsed = parseRoomInput({
    room: {
      name: 'Bench store',
      use: 'office',
      ring_m: [
        [0, 0],
        [30, 0],
        [30, 15],
        [0, 15],
      ],
      height_m: 3.6,
      lining: { walls: { key: 'plastered-brick' }, ceiling: { key: 'concrete' }, floor: { key: 'concrete' } },
      openings: [
        { width_m: 3, height_m: 3, sill_m: 0, state: 'open', leads_to: 'outside' },
        { width_m: 2, height_m: 1.2, sill_m: 1, state: 'fails', leads_to: 'outside' },
      ],
      protection: {
        sprinklers: { rti: 50, activation_C: 68, distance_m: 2.5 },
        detection: 'smoke',
        alarm_to_brigade: true,
        brigade: 'off-site',
      },
      rating_min: 60,
    },
    contents: Array.from({ length: entries }, (_, index) => {
      const kind = KINDS[index % KINDS.length]!;
      return {
        id: `e${index}`,
        label: kind.label,
        count: 1 + (index % 5),
        keeping: kind.keeping,
        evidence: 'counted',
        parts: kind.parts.map((part) => ({ material: part.material, mass_kg: part.mass_kg })),
        x_m: 0.6 + (index % 32) * 0.9,
        y_m: 0.6 + Math.floor(index / 32) * 0.9,
        width_m: 0.8,
        depth_m: 0.8,
        height_m: 1,
        peak_kW: 300 + index,
      };
    }),
    limits: [{ quantity: 'load_per_floor_MJ_m2', bound: 900, set_by: 'permit' }],
    options,
  });
  if (!parsed.ok) throw new Error(JSON.stringify(parsed.errors));
  return parsed.value;
}

/** p95 of a round of runs; the median of the rounds is told, because another program may take the processor for one. */
function p95(entries: number): number {
  const input = room(entries);
  for (let warm = 0; warm < 50; warm += 1) estimateRoom(input, { spread: false });
  const rounds = Array.from({ length: ROUNDS }, () => {
    const times = Array.from({ length: RUNS }, () => {
      const began = performance.now();
      estimateRoom(input, { spread: false });
      return performance.now() - began;
    });
    return percentile(times, 95);
  });
  return median(rounds);
}

/** Median of some runs, one unhurried run before them. */
function typical(run: () => unknown, runs: number): number {
  run();
  return median(
    Array.from({ length: runs }, () => {
      const began = performance.now();
      run();
      return performance.now() - began;
    }),
  );
}

/** One sprinkler on the design curve of the store of 50 entries. */
function sprinkler(): number {
  const { curve } = estimateRoom(room(50), { spread: false }).growth;
  if (!curve) throw new Error('The store has no design curve.');
  const [t, Q] = [curve.map(([time]) => time), curve.map(([, rate]) => rate)];
  const inputs = { t, Q, H: 3.6, r: 2.5, place: 'free', RTI: 50, T_a: 20, T_act: 68 } as const;
  for (let warm = 0; warm < 50; warm += 1) detectorResponse.run(inputs);
  return typical(() => detectorResponse.run(inputs), RUNS);
}

export function benchEstimateRoom(): Promise<readonly BenchRow[]> {
  const whole = (entries: number, first: string | null) => {
    const input = room(entries, { first_entry: first });
    return typical(() => estimateRoom(input), ROUNDS);
  };
  return Promise.resolve([
    atMost('estimateRoom, 500 entries, no Monte Carlo, no spread, p95', p95(500), 'ms', 8),
    atMost('estimateRoom, 50 entries, p95', p95(50), 'ms', 1),
    atMost('response of a sprinkler to a design curve', sprinkler(), 'ms', 2),
    atMost('estimateRoom with spread and gaps, 50 entries, worst first entry sought', whole(50, null), 'ms', null),
    atMost('estimateRoom with spread and gaps, 500 entries, first entry given', whole(500, 'e0'), 'ms', null),
    atMost('estimateRoom with spread and gaps, 500 entries, worst first entry sought', whole(500, null), 'ms', null),
  ]);
}
