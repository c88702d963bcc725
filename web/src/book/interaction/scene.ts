import type { Point } from '@embertally/shared/geometry/point';
import { openingPosition } from '@embertally/shared/survey/derive/opening-position';
import { openingsOfStorey } from '@embertally/shared/survey/derive/openings-of-storey';
import { entriesOfRoom } from '@embertally/shared/survey/derive/entries-of-room';
import { roomsOfStorey } from '@embertally/shared/survey/derive/rooms-of-storey';
import { wallsByKey } from '@embertally/shared/survey/derive/walls';
import type { Entry, Opening, Room, Storey, SurveyDocument } from '@embertally/shared/survey/survey-document';

export interface RoomShape {
  readonly room: Room;
  /** Wall centre lines. */
  readonly ring: readonly Point[];
  readonly holes: readonly (readonly Point[])[];
}
export interface WallShape {
  /** The wall's key: `cornerId|cornerId`. */
  readonly id: string;
  readonly corners: readonly [string, string];
  readonly a: Point;
  readonly b: Point;
  readonly roomIds: readonly string[];
}
export interface OpeningShape {
  readonly opening: Opening;
  readonly a: Point;
  readonly b: Point;
}
/** One storey ready to be drawn and hit: points instead of ids. Derived, never stored. */
export interface Scene {
  readonly storey: Storey;
  readonly rooms: readonly RoomShape[];
  readonly walls: readonly WallShape[];
  readonly openings: readonly OpeningShape[];
  readonly entries: readonly Entry[];
}

const kept = new WeakMap<Room, { readonly corners: readonly unknown[]; readonly shape: RoomShape }>();
const scenes = new WeakMap<SurveyDocument, Map<string, Scene>>();

/**
 * The scene of a storey; null when the storey is gone. Room shapes keep their identity while their corners stay, so that
 * what is drawn from them can be kept too.
 */
export function sceneOf(document: SurveyDocument, storeyId: string): Scene | null {
  let ofDocument = scenes.get(document);
  if (ofDocument === undefined) scenes.set(document, (ofDocument = new Map<string, Scene>()));
  const known = ofDocument.get(storeyId);
  if (known !== undefined) return known;
  const storey = document.storeys.get(storeyId);
  if (storey === undefined) return null;
  const rooms = roomsOfStorey(document, storeyId);
  const scene: Scene = {
    storey,
    rooms: rooms.map((room) => roomShape(document, room)),
    walls: [...wallsByKey(document, storeyId)].flatMap(([id, wall]) => {
      const a = document.corners.get(wall.a);
      const b = document.corners.get(wall.b);
      return a === undefined || b === undefined
        ? []
        : [{ id, corners: [wall.a, wall.b] as const, a, b, roomIds: wall.roomIds }];
    }),
    openings: openingsOfStorey(document, storeyId).flatMap((opening) => {
      const position = openingPosition(document, opening.id);
      return position === null ? [] : [{ opening, a: position.from, b: position.to }];
    }),
    // Large ones first: what stands on a carpet is drawn on it.
    entries: rooms.flatMap((room) => entriesOfRoom(document, room.id)).sort((a, b) => areaOf(b) - areaOf(a)),
  };
  ofDocument.set(storeyId, scene);
  return scene;
}

function areaOf(entry: Entry): number {
  return entry.width_m * entry.depth_m;
}

function roomShape(document: SurveyDocument, room: Room): RoomShape {
  const corners = [...room.ring, ...room.holes.flat()].map((id) => document.corners.get(id));
  const before = kept.get(room);
  if (before?.corners.every((corner, index) => corner === corners[index])) return before.shape;
  const points = (ids: readonly string[]) => ids.flatMap((id) => document.corners.get(id) ?? []);
  const shape = { room, ring: points(room.ring), holes: room.holes.map(points) };
  kept.set(room, { corners, shape });
  return shape;
}
