import type { Region } from '../geometry/point.ts';
import { entriesOfRoom } from './derive/entries-of-room.ts';
import { roomRegion } from './derive/room-region.ts';
import { roomsOfStorey } from './derive/rooms-of-storey.ts';
import { entryViolations } from './invariants/entry-violations.ts';
import { openingViolations } from './invariants/opening-violations.ts';
import { planViolations } from './invariants/plan-violations.ts';
import { referenceViolations } from './invariants/reference-violations.ts';
import { roomShapeViolation } from './invariants/room-shape-violations.ts';
import type { Violation } from './invariants/violation.ts';
import type { Entry, Room, SurveyDocument } from './survey-document.ts';

/**
 * The rules of the survey document that do not hold, most basic first: rows that are there, outlines, rooms against one
 * another, openings, contents. A storey's later rules are looked at only when its earlier ones hold, because they rest on
 * them.
 *
 * @param storeyIds the storeys to check; all of them, and entries without a room, when left out
 */
export function checkInvariants(document: SurveyDocument, storeyIds?: Iterable<string>): Violation[] {
  if (storeyIds !== undefined) return [...storeyIds].flatMap((id) => checkStorey(document, id));
  const all = new Set(document.storeys.keys());
  for (const { storey_id } of [
    ...document.rooms.values(),
    ...document.corners.values(),
    ...document.openings.values(),
  ]) {
    all.add(storey_id);
  }
  const homeless = [...document.entries.values()].filter((entry) => !document.rooms.has(entry.room_id));
  return [...[...all].flatMap((id) => checkStorey(document, id)), ...entryViolations(document, homeless)];
}

function checkStorey(document: SurveyDocument, storeyId: string): Violation[] {
  const references = referenceViolations(document, storeyId);
  if (references.length > 0) return references;
  const rooms = roomsOfStorey(document, storeyId);
  const shapes = rooms.flatMap((room) => roomShapeViolation(document, room) ?? []);
  if (shapes.length > 0) return shapes;
  const plan = planViolations(document, storeyId);
  if (plan.length > 0) return plan;
  return [...openingViolations(document, storeyId), ...rooms.flatMap((room) => contentsViolations(document, room))];
}

/** Contents found to be in order, by the region they stand in: neither changes without becoming another object. */
const inOrder = new WeakMap<Region, readonly Entry[]>();

function contentsViolations(document: SurveyDocument, room: Room): Violation[] {
  const region = roomRegion(document.corners, room);
  const entries = entriesOfRoom(document, room.id);
  if (region === null || inOrder.get(region) === entries) return [];
  const found = entryViolations(document, entries);
  if (found.length === 0) inOrder.set(region, entries);
  return found;
}
