import type { Point } from '../geometry/point.ts';
import type {
  RoomInput,
  RoomInputEntry,
  RoomInputLimit,
  RoomInputOpening,
  RoomInputOptions,
  RoomInputPart,
} from '../tally/room-input.ts';
import { clearRing } from './derive/clear-ring.ts';
import { entriesOfRoom } from './derive/entries-of-room.ts';
import { openingsOfRoom } from './derive/openings-of-room.ts';
import { roomHeight } from './derive/room-height.ts';
import { roomRegion } from './derive/room-region.ts';
import { roomsOfOpening } from './derive/rooms-of-opening.ts';
import type { Entry, EntryPart, Opening, Room, SurveyDocument } from './survey-document.ts';

/** A bound on a room, as the limits resource gives it. */
export type RoomLimit = RoomInputLimit & { readonly room_id: string; readonly set_by: string };

/**
 * What the estimate of one room is made from, taken from the survey: the clear inner ring, the openings in its walls with
 * where they lead, and its contents with the heats copied when they were placed.
 *
 * @param limits the limits of the building; those of other rooms are left out
 * @throws RangeError when the room is not in the document
 */
export function roomInput(document: SurveyDocument, roomId: string, limits: readonly RoomLimit[]): RoomInput {
  const room = document.rooms.get(roomId);
  // The rules leave no room without a clear ring; the centre lines stand in for one that came from elsewhere.
  const region = room && (clearRing(document, roomId) ?? roomRegion(document.corners, room));
  if (room === undefined || region == null) throw new RangeError(`The room ${roomId} is not in this survey.`);
  const entries = entriesOfRoom(document, roomId);
  const options = optionsOf(room, entries);
  return {
    room: {
      name: room.name,
      use: room.use,
      ring_m: pairs(region.ring),
      holes_m: region.holes.map(pairs),
      height_m: roomHeight(document, room),
      measured_floor_area_m2: room.measured_floor_area_m2,
      compartment_floor_m2: room.compartment_floor_m2,
      bounded_by_rated_construction: room.bounded_by_rated_construction,
      lining: room.lining,
      openings: openingsOfRoom(document, roomId).map((opening) => openingInput(document, opening)),
      roof_vents_m2: room.roof_vents_m2,
      roof_vents_state: room.roof_vents_state,
      protection: room.protection,
      danger_of_activation: room.danger_of_activation,
      rating_min: room.rating_min,
    },
    contents: entries.map(entryInput),
    limits: limits
      .filter((limit) => limit.room_id === roomId)
      .map(({ quantity, bound, set_by }) => ({ quantity, bound, set_by })),
    ...(options === null ? {} : { options }),
  };
}

/** What a person assumed; a first entry that has left the room is forgotten, and the worst is sought again. */
function optionsOf({ assumptions }: Room, entries: readonly Entry[]): RoomInputOptions | null {
  if (assumptions === null) return null;
  const { first_entry } = assumptions;
  const isHere = first_entry !== null && entries.some((entry) => entry.id === first_entry);
  return { ...assumptions, first_entry: isHere ? first_entry : null };
}

function pairs(ring: readonly Point[]): [number, number][] {
  return ring.map(({ x_m, y_m }) => [x_m, y_m]);
}

function openingInput(document: SurveyDocument, opening: Opening): RoomInputOpening {
  const { id, label, kind, width_m, height_m, sill_m, state } = opening;
  const leads_to = roomsOfOpening(document, opening).length > 1 ? 'inside' : 'outside';
  return { id, label, kind, width_m, height_m, sill_m, state, leads_to };
}

function entryInput(entry: Entry): RoomInputEntry {
  return {
    id: entry.id,
    label: entry.label,
    kind: entry.kind,
    count: entry.count,
    keeping: entry.keeping,
    enclosure: entry.enclosure,
    sealed_rating_min: entry.sealed_rating_min,
    evidence: entry.evidence,
    parts: entry.parts.map(partInput),
    x_m: entry.x_m,
    y_m: entry.y_m,
    rotation_deg: entry.rotation_deg,
    base_height_m: entry.base_height_m,
    width_m: entry.width_m,
    depth_m: entry.depth_m,
    height_m: entry.height_m,
    growth: entry.growth,
    peak_kW: entry.peak_kW,
    curve: entry.curve,
    radiative_fraction: entry.radiative_fraction,
    ignition_class: entry.ignition_class,
    ignites_at_kW_m2: entry.ignites_at_kW_m2,
  };
}

function partInput(part: EntryPart): RoomInputPart {
  const { material_version: _, moisture_pct, ...given } = part;
  return moisture_pct === null ? given : { ...given, water: 'dry', moisture_pct };
}
