import type { Changes } from '../change.ts';
import { loopsOfRoom } from '../derive/loops-of-room.ts';
import { roomsOfStorey } from '../derive/rooms-of-storey.ts';
import { roomsOfOpening } from '../derive/rooms-of-opening.ts';
import type { SurveyDocument } from '../survey-document.ts';

export interface Touched {
  readonly roomIds: readonly string[];
  readonly storeyIds: readonly string[];
}

/**
 * Rooms whose tally and storeys whose plan may differ between two states of a document, rooms deleted included. A room
 * drawn or deleted touches its neighbours: openings between them change where they lead.
 */
export function touchedBy(before: SurveyDocument, after: SurveyDocument, changes: Changes): Touched {
  const found: Found = { rooms: new Set(), storeys: new Set(), corners: new Set() };
  for (const { kind, id } of changes) {
    for (const document of [before, after]) {
      if (kind === 'storey') touchStorey(document, id, found);
      else if (kind === 'corner') touchCorner(document, id, found);
      else if (kind === 'room') touchRoom(document, id, changes, found);
      else if (kind === 'opening') touchOpening(document, id, found);
      else touchEntry(document, id, found);
    }
  }
  if (found.corners.size > 0) {
    for (const document of [before, after]) {
      for (const storeyId of found.storeys) {
        for (const room of roomsOfStorey(document, storeyId)) {
          if (loopsOfRoom(room).some((loop) => loop.some((id) => found.corners.has(id)))) found.rooms.add(room.id);
        }
      }
    }
  }
  return { roomIds: [...found.rooms], storeyIds: [...found.storeys] };
}

interface Found {
  readonly rooms: Set<string>;
  readonly storeys: Set<string>;
  /** Corners whose rooms are touched. */
  readonly corners: Set<string>;
}

function touchStorey(document: SurveyDocument, id: string, found: Found): void {
  found.storeys.add(id);
  for (const room of roomsOfStorey(document, id)) found.rooms.add(room.id);
}

function touchCorner(document: SurveyDocument, id: string, found: Found): void {
  const corner = document.corners.get(id);
  if (corner === undefined) return;
  found.storeys.add(corner.storey_id);
  found.corners.add(id);
}

function touchRoom(document: SurveyDocument, id: string, changes: Changes, found: Found): void {
  const room = document.rooms.get(id);
  found.rooms.add(id);
  if (room === undefined) return;
  found.storeys.add(room.storey_id);
  const change = changes.find((one) => one.kind === 'room' && one.id === id);
  const fields = change?.before && change.after ? Object.keys(change.after) : ['ring'];
  if (!fields.includes('ring') && !fields.includes('holes')) return;
  for (const corner of loopsOfRoom(room).flat()) found.corners.add(corner);
}

function touchOpening(document: SurveyDocument, id: string, found: Found): void {
  const opening = document.openings.get(id);
  if (opening === undefined) return;
  found.storeys.add(opening.storey_id);
  for (const roomId of roomsOfOpening(document, opening)) found.rooms.add(roomId);
}

function touchEntry(document: SurveyDocument, id: string, found: Found): void {
  const entry = document.entries.get(id);
  if (entry === undefined) return;
  found.rooms.add(entry.room_id);
  const storeyId = document.rooms.get(entry.room_id)?.storey_id;
  if (storeyId !== undefined) found.storeys.add(storeyId);
}
