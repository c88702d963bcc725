import { enclosureAreas } from '../methods/room/enclosure-areas.ts';
import { estimateOutputs, type Estimate } from '../methods/estimate.ts';
import type { RoomInputRoom } from './room-input.ts';
import type { TallyContext } from './tally-context.ts';

type Ring = RoomInputRoom['ring_m'];

export interface RoomAreas {
  /** m² */
  readonly floor: number;
  readonly floorMeasured: boolean;
  /** Walls, floor and ceiling with openings, m². */
  readonly enclosing: number;
  readonly walls: number;
  /** m */
  readonly height: number;
  readonly estimates: { readonly floorArea: Estimate; readonly enclosingArea: Estimate; readonly volume: Estimate };
}

/** Areas of the room from its clear ring; a measured floor area replaces the ring's for floor and ceiling. */
export function roomAreas(room: RoomInputRoom, context: TallyContext): RoomAreas {
  const holes = room.holes_m ?? [];
  const drawn = Math.max(0, ringArea(room.ring_m) - holes.reduce((sum, hole) => sum + ringArea(hole), 0));
  const measured = room.measured_floor_area_m2 ?? null;
  const A_f = measured ?? drawn;
  const P = ringLength(room.ring_m) + holes.reduce((sum, hole) => sum + ringLength(hole), 0);
  const H = room.height_m;
  const run = estimateOutputs(
    enclosureAreas,
    { A_f, P, H },
    {
      workings: context.workings,
      origins: {
        A_f: measured === null ? 'computed' : { origin: 'measured', note: 'measured area instead of the drawn one' },
        P: { origin: 'computed', note: 'from the drawn ring' },
        H: 'given',
      },
    },
  );
  return {
    floor: A_f,
    floorMeasured: measured !== null,
    enclosing: run.result.enclosing,
    walls: P * H,
    height: H,
    estimates: { floorArea: run.of('floor'), enclosingArea: run.of('enclosing'), volume: run.of('volume') },
  };
}

/** Area of a ring, either way round, not closed by a repeated point. */
function ringArea(ring: Ring): number {
  let twice = 0;
  for (let i = 0; i < ring.length; i += 1) {
    const [x1, y1] = ring[i]!;
    const [x2, y2] = ring[(i + 1) % ring.length]!;
    twice += x1 * y2 - x2 * y1;
  }
  return Math.abs(twice) / 2;
}

function ringLength(ring: Ring): number {
  let length = 0;
  for (let i = 0; i < ring.length; i += 1) {
    const [x1, y1] = ring[i]!;
    const [x2, y2] = ring[(i + 1) % ring.length]!;
    length += Math.hypot(x2 - x1, y2 - y1);
  }
  return length;
}
