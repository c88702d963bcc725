import { distance } from '../../geometry/distance.ts';
import type { Point, Ring } from '../../geometry/point.ts';
import { pointInRegion } from '../../geometry/point-in-region.ts';
import { pointInRing } from '../../geometry/point-in-ring.ts';
import { roundToMillimetre } from '../../geometry/round-to-millimetre.ts';
import { signedArea } from '../../geometry/signed-area.ts';
import { ROUNDING_M, TOLERANCE_M } from '../../geometry/tolerance.ts';
import type { Command, Refusal } from '../command.ts';
import { nextRoomName } from '../derive/next-room-name.ts';
import { roomRegion } from '../derive/room-region.ts';
import { finish } from '../draft/finish.ts';
import { rehangOpenings } from '../draft/rehang-openings.ts';
import { rehouseEntries } from '../draft/rehouse-entries.ts';
import { settleCorners } from '../draft/settle-corners.ts';
import { SurveyDraft } from '../draft/survey-draft.ts';
import { sweepUnused } from '../draft/sweep-unused.ts';
import { refuse } from '../refuse.ts';
import { rowRefusal } from '../row-fault.ts';
import type { Corner, Room } from '../survey-document.ts';
import { nameOf } from '../words.ts';

export interface SplitRoomInput {
  readonly room_id: string;
  /** Of the smaller part; the larger one stays the room it was. */
  readonly new_room_id: string;
  /** Left out: the next free "Room n". */
  readonly name?: string;
  /** The new wall on its centre line: from one wall of the room to another, bends between. */
  readonly points: readonly Point[];
  /** One new id per point; those of points that fall on a corner already there stay unused. */
  readonly corner_ids: readonly string[];
}

/**
 * Parts a room in two by a new wall. Use, linings and protection go to both parts, contents to the part they stand in;
 * a measured floor area is forgotten, because it was that of the whole.
 */
export const splitRoom: Command<SplitRoomInput> = (document, input) => {
  const { room_id, new_room_id } = input;
  const room = document.rooms.get(room_id);
  if (room === undefined) return refuse('ROOM_GONE', 'The room is not in the survey any more.', { ids: [room_id] });
  if (input.points.length < 2)
    return refuse('SPLIT_TOO_SHORT', 'The new wall needs two ends.', { field: 'points', ids: [room_id] });
  const draft = new SurveyDraft(document);
  const path: Corner[] = [];
  for (const [index, point] of input.points.entries()) {
    const x_m = roundToMillimetre(point.x_m);
    const y_m = roundToMillimetre(point.y_m);
    const corner = { id: input.corner_ids[index] ?? '', storey_id: room.storey_id, x_m, y_m };
    const fault = rowRefusal('corner', corner);
    if (fault !== null) return fault;
    path.push(corner);
  }
  const astray = strayRefusal(draft, room, path);
  if (astray !== null) return astray;
  for (const corner of path) draft.put('corner', corner);
  settleCorners(draft, room.storey_id);
  // Openings go to their stretch of wall while the outline still runs along the whole of it.
  const hangs = rehangOpenings(draft, room.storey_id);
  if (hangs !== null) return hangs;

  const settled = draft.get('room', room_id) as Room;
  const ids = path.map((corner) => cornerThere(draft, settled, corner));
  const parts = partRing(settled.ring, ids);
  if (parts === null) {
    const message = `The new wall must go from one place on the outer walls of ${nameOf(room)} to another.`;
    return refuse('SPLIT_NOT_ACROSS', message, { field: 'points', ids: [room_id] });
  }
  const [kept, parted] = bySize(draft, parts);
  const holesIn = (ring: readonly string[]) => {
    const places = placesOf(draft, ring);
    return settled.holes.filter((hole) =>
      placesOf(draft, hole).every((corner) => pointInRing(corner, places) !== 'outside'),
    );
  };
  draft.put('room', { ...settled, ring: [...kept], holes: holesIn(kept), measured_floor_area_m2: null });
  const second: Room = {
    ...settled,
    id: new_room_id,
    name: input.name ?? nextRoomName(document),
    ring: [...parted],
    holes: holesIn(parted),
    measured_floor_area_m2: null,
    photos: [],
  };
  const fault = rowRefusal('room', second);
  if (fault !== null) return fault;
  draft.put('room', second);
  rehouseEntries(draft, room_id, second);
  sweepUnused(draft, room.storey_id);
  return finish(draft, [room.storey_id]);
};

/** A wall that starts or ends nowhere, or leaves the room on its way. */
function strayRefusal(draft: SurveyDraft, room: Room, path: readonly Corner[]): Refusal | null {
  const region = roomRegion(draft.corners, room);
  if (region === null) return null;
  const about = { field: 'points', ids: [room.id] };
  const ends = [path[0], path.at(-1)] as [Corner, Corner];
  if (ends.some((end) => pointInRing(end, region.ring) !== 'on')) {
    const message = `The new wall must begin and end on the walls of ${nameOf(room)}.`;
    return refuse('SPLIT_NOT_ACROSS', message, about);
  }
  const bends = path.slice(1, -1);
  const middles = path.slice(1).map((corner, index) => middle(path[index] as Corner, corner));
  if ([...bends, ...middles].some((place) => pointInRegion(place, region) !== 'inside')) {
    const message = `The new wall must stay inside ${nameOf(room)}; it leaves the room or runs along a wall.`;
    return refuse('SPLIT_LEAVES_ROOM', message, about);
  }
  return null;
}

function middle(a: Point, b: Point): Point {
  return { x_m: (a.x_m + b.x_m) / 2, y_m: (a.y_m + b.y_m) / 2 };
}

/** The corner that stands where a point of the new wall was put: its own, or the one it was joined to. */
function cornerThere(draft: SurveyDraft, room: Room, wanted: Corner): string {
  if (draft.get('corner', wanted.id) !== undefined) return wanted.id;
  const near = (id: string): boolean => {
    const corner = draft.get('corner', id);
    return corner !== undefined && distance(corner, wanted) <= TOLERANCE_M + ROUNDING_M;
  };
  return room.ring.find(near) ?? draft.cornersOf(room.storey_id).find(({ id }) => near(id))?.id ?? wanted.id;
}

/** The two rings a path between two corners of a ring makes of it; null when it does not lead from one to another. */
function partRing(ring: readonly string[], path: readonly string[]): readonly [string[], string[]] | null {
  const from = ring.indexOf(path[0] as string);
  const to = ring.indexOf(path.at(-1) as string);
  if (from < 0 || to < 0 || from === to) return null;
  const turned = [...ring.slice(from), ...ring.slice(0, from)];
  const at = turned.indexOf(path.at(-1) as string);
  const bends = path.slice(1, -1);
  return [
    [...turned.slice(0, at + 1), ...[...bends].reverse()],
    [...turned.slice(at), turned[0] as string, ...bends],
  ];
}

function bySize(draft: SurveyDraft, [a, b]: readonly [string[], string[]]): readonly [string[], string[]] {
  const size = (ring: readonly string[]): number => Math.abs(signedArea(placesOf(draft, ring)));
  return size(a) >= size(b) ? [a, b] : [b, a];
}

function placesOf(draft: SurveyDraft, ring: readonly string[]): Ring {
  return ring.flatMap((id) => draft.get('corner', id) ?? []);
}
