import { ROUNDING_M, TOLERANCE_M } from '../../geometry/tolerance.ts';
import { openingsOfStorey } from '../derive/openings-of-storey.ts';
import { roomHeight } from '../derive/room-height.ts';
import { wallKey } from '../derive/wall-key.ts';
import { wallsByKey, type Wall } from '../derive/walls.ts';
import type { Opening, SurveyDocument } from '../survey-document.ts';
import { metres, nameOf, openingWords } from '../words.ts';
import type { Violation } from './violation.ts';

const SLACK_M = TOLERANCE_M + ROUNDING_M;

/** Openings past the end of their wall, taller than a room they bound, or one over another. */
export function openingViolations(document: SurveyDocument, storeyId: string): Violation[] {
  const walls = wallsByKey(document, storeyId);
  const byWall = new Map<string, Opening[]>();
  const found: Violation[] = [];
  for (const opening of openingsOfStorey(document, storeyId)) {
    const key = wallKey(...opening.wall);
    const wall = walls.get(key);
    if (wall === undefined) continue;
    const beside = byWall.get(key) ?? [];
    const fault =
      widthMisfit(opening, wall, openingsIn(document, wall, opening)) ??
      heightMisfit(document, opening, wall) ??
      overlapViolation(opening, beside, wall);
    if (fault !== null) found.push(fault);
    byWall.set(key, [...beside, opening]);
  }
  return found;
}

/** What is wrong with one opening; cheaper than looking at all of its storey. */
export function openingFits(document: SurveyDocument, openingId: string): Violation[] {
  const storeyId = document.openings.get(openingId)?.storey_id;
  if (storeyId === undefined) return [];
  return openingViolations(document, storeyId).filter((violation) => violation.ids.includes(openingId));
}

/** The other openings of the wall that stand at the opening's height. */
function openingsIn(document: SurveyDocument, wall: Wall, opening: Opening): Opening[] {
  const key = wallKey(wall.a, wall.b);
  return openingsOfStorey(document, opening.storey_id).filter(
    (other) => other.id !== opening.id && wallKey(...other.wall) === key && sameHeight(opening, other),
  );
}

function widthMisfit(opening: Opening, wall: Wall, others: readonly Opening[]): Violation | null {
  const words = openingWords(opening);
  const at = { storeyId: opening.storey_id, kind: 'opening', ids: [opening.id] } as const;
  const free_m = widestFree(opening, others, wall);
  if (opening.width_m > free_m + SLACK_M) {
    const message = `The ${words} is ${metres(opening.width_m)} wide but the wall has only ${metres(free_m)} free.`;
    return { ...at, code: 'OPENING_TOO_WIDE', message, field: 'width_m' };
  }
  const end_m = opening.offset_m + opening.width_m;
  if (end_m <= wall.length_m + SLACK_M) return null;
  const message = `The ${words} would end ${metres(end_m - wall.length_m)} past the end of its wall, which is ${metres(wall.length_m)} long.`;
  return { ...at, code: 'OPENING_PAST_WALL', message, field: 'offset_m' };
}

/** The widest stretch of the wall that the others leave free, m. */
function widestFree(opening: Opening, others: readonly Opening[], wall: Wall): number {
  let widest_m = 0;
  let from_m = 0;
  const taken = others.map((other) => ({ from_m: offsetAlong(other, opening, wall), width_m: other.width_m }));
  for (const other of taken.sort((a, b) => a.from_m - b.from_m)) {
    widest_m = Math.max(widest_m, other.from_m - from_m);
    from_m = Math.max(from_m, other.from_m + other.width_m);
  }
  return Math.max(widest_m, wall.length_m - from_m);
}

/** An opening's offset counted from the same corner as another's. */
function offsetAlong(opening: Opening, reference: Opening, wall: Wall): number {
  if (opening.wall[0] === reference.wall[0]) return opening.offset_m;
  return wall.length_m - opening.offset_m - opening.width_m;
}

function heightMisfit(document: SurveyDocument, opening: Opening, wall: Wall): Violation | null {
  const top_m = opening.sill_m + opening.height_m;
  for (const roomId of wall.roomIds) {
    const room = document.rooms.get(roomId);
    if (room === undefined) continue;
    const height_m = roomHeight(document, room);
    if (top_m <= height_m + SLACK_M) continue;
    const message = `The ${openingWords(opening)} reaches ${metres(top_m)} above the floor but room ${nameOf(room)} is only ${metres(height_m)} high.`;
    const at = { storeyId: opening.storey_id, kind: 'opening', ids: [opening.id, roomId], field: 'height_m' } as const;
    return { ...at, code: 'OPENING_TOO_HIGH', message };
  }
  return null;
}

/** Openings overlap in the plane of the wall only: a light above a door does not. */
function sameHeight(a: Opening, b: Opening): boolean {
  return a.sill_m + a.height_m > b.sill_m + SLACK_M && b.sill_m + b.height_m > a.sill_m + SLACK_M;
}

function overlapViolation(opening: Opening, beside: readonly Opening[], wall: Wall): Violation | null {
  const over = beside.find((other) => {
    const from_m = offsetAlong(other, opening, wall);
    const sideBySide =
      opening.offset_m + opening.width_m <= from_m + SLACK_M || from_m + other.width_m <= opening.offset_m + SLACK_M;
    return !sideBySide && sameHeight(opening, other);
  });
  if (over === undefined) return null;
  const message = `The ${openingWords(opening)} and the ${openingWords(over)} would overlap in one wall.`;
  const at = { storeyId: opening.storey_id, kind: 'opening', ids: [opening.id, over.id], field: 'offset_m' } as const;
  return { ...at, code: 'OPENING_OVERLAPS', message };
}
