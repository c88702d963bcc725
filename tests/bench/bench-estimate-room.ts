import { estimateRoom } from '@embertally/shared/tally/estimate-room';
import { parseRoomInput } from '@embertally/shared/tally/parse-room-input';
import type { RoomInput } from '@embertally/shared/tally/room-input';
import { KINDS } from '@embertally/shared/catalogue/kinds';
import { atMost, median, percentile, type BenchRow } from './bench-row.ts';

const ROUNDS = 7;
const RUNS = 60;

/** A store of 30 × 15 m with entries of every kind in turn, in rows that do not overlap. */
function room(entries: number): RoomInput {
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
      protection: { detection: 'smoke', alarm_to_brigade: true, brigade: 'off-site' },
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
    options: { samples: 0 },
  });
  if (!parsed.ok) throw new Error(JSON.stringify(parsed.errors));
  return parsed.value;
}

/** p95 of a round of runs; the median of the rounds is told, because another program may take the processor for one. */
function p95(entries: number): number {
  const input = room(entries);
  for (let warm = 0; warm < 50; warm += 1) estimateRoom(input);
  const rounds = Array.from({ length: ROUNDS }, () => {
    const times = Array.from({ length: RUNS }, () => {
      const began = performance.now();
      estimateRoom(input);
      return performance.now() - began;
    });
    return percentile(times, 95);
  });
  return median(rounds);
}

export function benchEstimateRoom(): Promise<readonly BenchRow[]> {
  return Promise.resolve([
    atMost('estimateRoom, 500 entries, no Monte Carlo, no spread, p95', p95(500), 'ms', 8),
    atMost('estimateRoom, 50 entries, p95', p95(50), 'ms', 1),
  ]);
}
