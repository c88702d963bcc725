import { distance } from '../../geometry/distance.ts';
import { ringEdges } from '../../geometry/ring-edges.ts';
import type { SurveyDocument } from '../survey-document.ts';
import { loopsOfRoom } from './loops-of-room.ts';
import { roomsOfStorey } from './rooms-of-storey.ts';
import { wallKey } from './wall-key.ts';

/** A stretch of wall between two corners. With two rooms it is internal, with one external (or along a courtyard). */
export interface Wall {
  readonly a: string;
  readonly b: string;
  readonly roomIds: readonly string[];
  readonly length_m: number;
}

const known = new WeakMap<
  SurveyDocument['rooms'],
  WeakMap<SurveyDocument['corners'], Map<string, ReadonlyMap<string, Wall>>>
>();

/** The walls of a storey by {@link wallKey}. */
export function wallsByKey(document: SurveyDocument, storeyId: string): ReadonlyMap<string, Wall> {
  let byCorners = known.get(document.rooms);
  if (byCorners === undefined) known.set(document.rooms, (byCorners = new WeakMap()));
  let byStorey = byCorners.get(document.corners);
  if (byStorey === undefined)
    byCorners.set(document.corners, (byStorey = new Map<string, ReadonlyMap<string, Wall>>()));
  let found = byStorey.get(storeyId);
  if (found === undefined) byStorey.set(storeyId, (found = deriveWalls(document, storeyId)));
  return found;
}

/** The walls of a storey. Derived, never stored. */
export function walls(document: SurveyDocument, storeyId: string): readonly Wall[] {
  return [...wallsByKey(document, storeyId).values()];
}

function deriveWalls(document: SurveyDocument, storeyId: string): ReadonlyMap<string, Wall> {
  const found = new Map<string, Wall>();
  for (const room of roomsOfStorey(document, storeyId)) {
    for (const loop of loopsOfRoom(room)) {
      for (const [a, b] of ringEdges(loop)) {
        const key = wallKey(a, b);
        const wall = found.get(key);
        if (wall !== undefined) {
          found.set(key, { ...wall, roomIds: [...wall.roomIds, room.id] });
          continue;
        }
        const from = document.corners.get(a);
        const to = document.corners.get(b);
        const length_m = from === undefined || to === undefined ? 0 : distance(from, to);
        found.set(key, { a, b, roomIds: [room.id], length_m });
      }
    }
  }
  return found;
}
