import { bounds } from '../../geometry/bounds.ts';
import type { Room, SurveyDocument } from '../survey-document.ts';
import { roomsOfStorey } from './rooms-of-storey.ts';

const byName = new Intl.Collator('en', { numeric: true });

/** Rooms whose top edges are nearer than this count as one row of the plan, m. */
const ROW_M = 1;

/**
 * The rooms of a storey as one reads its plan: row by row from the top, from left to right. Lists, thumb index and report
 * all use it, so that "room 3" is the same room everywhere, whoever drew it first.
 */
export function roomsInReadingOrder(document: SurveyDocument, storeyId: string): readonly Room[] {
  const places = roomsOfStorey(document, storeyId).map((room) => {
    const box = bounds(room.ring.flatMap((id) => document.corners.get(id) ?? []));
    return { room, row: -Math.round(box.maxY_m / ROW_M), left_m: box.minX_m };
  });
  places.sort((a, b) => a.row - b.row || a.left_m - b.left_m || byName.compare(a.room.name, b.room.name));
  return places.map(({ room }) => room);
}

/** All rooms of the building: storey by storey from the lowest, each in reading order. */
export function roomsOfBuildingInReadingOrder(document: SurveyDocument): readonly Room[] {
  return [...document.storeys.values()]
    .sort((a, b) => a.level_m - b.level_m || byName.compare(a.name, b.name))
    .flatMap((storey) => roomsInReadingOrder(document, storey.id));
}
