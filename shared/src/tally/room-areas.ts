import { perimeter } from '../geometry/perimeter.ts';
import { regionArea } from '../geometry/region-area.ts';
import { enclosureAreas } from '../methods/room/enclosure-areas.ts';
import { estimateOutputs, type Estimate } from '../methods/estimate.ts';
import { pointsOf } from './points-of.ts';
import type { RoomInputRoom } from './room-input.ts';
import type { TallyContext } from './tally-context.ts';

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

/** A ring that encloses less is no room. */
const LEAST_FLOOR_M2 = 1e-6;

/** Areas of the room from its clear ring; a measured floor area replaces the ring's for floor and ceiling. */
export function roomAreas(room: RoomInputRoom, context: TallyContext): RoomAreas {
  const ring = pointsOf(room.ring_m);
  const holes = (room.holes_m ?? []).map(pointsOf);
  const region = regionArea({ ring, holes });
  const measured = room.measured_floor_area_m2 ?? null;
  const A_f = (measured ?? region) < LEAST_FLOOR_M2 ? 0 : (measured ?? region);
  const P = [ring, ...holes].reduce((sum, edge) => sum + perimeter(edge), 0);
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
