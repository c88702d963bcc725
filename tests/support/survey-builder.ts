import { applyChanges } from '@embertally/shared/survey/apply-changes';
import type { Command, Done } from '@embertally/shared/survey/command';
import { addEntries } from '@embertally/shared/survey/commands/add-entries';
import { addOpening } from '@embertally/shared/survey/commands/add-opening';
import { drawRoom, type DrawRoomInput } from '@embertally/shared/survey/commands/draw-room';
import { newOpening } from '@embertally/shared/survey/new-opening';
import { newStorey } from '@embertally/shared/survey/new-storey';
import { newSurveyDocument } from '@embertally/shared/survey/new-survey-document';
import type { Entry, Opening, Room, Storey, SurveyDocument } from '@embertally/shared/survey/survey-document';

/** The same readable id for the same word: `uid('dock')` is a UUID that is easy to find again. */
export function uid(word: string): string {
  const hex = [...word].map((character) => (character.codePointAt(0) ?? 0).toString(16).padStart(2, '0')).join('');
  const tail = (hex + '0'.repeat(24)).slice(0, 24);
  return `${checksum(word)}-${tail.slice(0, 4)}-4${tail.slice(4, 7)}-8${tail.slice(7, 10)}-${tail.slice(10, 22)}`;
}

function checksum(word: string): string {
  let sum = 2166136261;
  for (const character of word) sum = Math.imul(sum ^ (character.codePointAt(0) ?? 0), 16777619) >>> 0;
  return sum.toString(16).padStart(8, '0');
}

/** Runs a command that must succeed and gives the document after it. */
export function ran<I>(document: SurveyDocument, command: Command<I>, input: I): SurveyDocument {
  return applyChanges(document, done(document, command, input).changes);
}

export function done<I>(document: SurveyDocument, command: Command<I>, input: I): Done {
  const outcome = command(document, input);
  if (outcome.refused) throw new Error(`${outcome.code}: ${outcome.message}`);
  return outcome;
}

export const GROUND = uid('ground');

/** A survey with one storey and nothing on it. */
export function groundFloor(storey: Partial<Storey> = {}): SurveyDocument {
  const row = newStorey({ id: GROUND, name: 'Ground floor', ...storey });
  return { ...newSurveyDocument(uid('survey')), storeys: new Map([[row.id, row]]) };
}

type Corners = readonly (readonly [x: number, y: number])[];

export function drawing(name: string, corners: Corners, more: Partial<DrawRoomInput> = {}): DrawRoomInput {
  return {
    room_id: uid(name),
    storey_id: GROUND,
    name,
    points: corners.map(([x_m, y_m]) => ({ x_m, y_m })),
    corner_ids: corners.map((_, index) => uid(`${name}.${index}`)),
    ...more,
  };
}

export function box(x: number, y: number, width: number, depth: number): Corners {
  return [
    [x, y],
    [x + width, y],
    [x + width, y + depth],
    [x, y + depth],
  ];
}

export function withRoom(document: SurveyDocument, name: string, corners: Corners, more?: Partial<DrawRoomInput>) {
  return ran(document, drawRoom, drawing(name, corners, more));
}

/** The corner that stands at a place. */
export function cornerAt(document: SurveyDocument, x: number, y: number): string {
  const found = [...document.corners.values()].filter((corner) => corner.x_m === x && corner.y_m === y);
  if (found.length !== 1 || found[0] === undefined) throw new Error(`${found.length} corners at ${x}, ${y}`);
  return found[0].id;
}

export function wallBetween(document: SurveyDocument, a: readonly [number, number], b: readonly [number, number]) {
  return [cornerAt(document, ...a), cornerAt(document, ...b)] as [string, string];
}

export function door(wall: [string, string], offset_m: number, more: Partial<Opening> = {}): Opening {
  return newOpening({ id: uid('door'), storey_id: GROUND, kind: 'door', wall, offset_m, ...more });
}

export function withOpening(document: SurveyDocument, opening: Opening): SurveyDocument {
  return ran(document, addOpening, { opening });
}

export function roomNamed(document: SurveyDocument, name: string): Room {
  const room = document.rooms.get(uid(name));
  if (room === undefined) throw new Error(`no room ${name}`);
  return room;
}

/** 10 kg of something at 17 MJ/kg, 1 × 1 × 1 m. */
export function crate(name: string, room: string, x_m: number, y_m: number, more: Partial<Entry> = {}): Entry {
  return {
    id: uid(name),
    room_id: uid(room),
    kind: null,
    label: name,
    count: 1,
    parts: [
      {
        material: null,
        material_version: null,
        label: 'timber',
        net_heat_MJ_kg: 17,
        low_MJ_kg: 16,
        high_MJ_kg: 19,
        heat_source: 'our own',
        mass_kg: 10,
        moisture_pct: null,
      },
    ],
    x_m,
    y_m,
    rotation_deg: 0,
    base_height_m: 0,
    width_m: 1,
    depth_m: 1,
    height_m: 1,
    keeping: 'stored',
    enclosure: 'open',
    sealed_rating_min: null,
    evidence: 'counted',
    growth: null,
    peak_kW: null,
    curve: null,
    radiative_fraction: null,
    ignition_class: null,
    ignites_at_kW_m2: null,
    note: '',
    photos: [],
    measure: null,
    recorded_by: null,
    recorded_at: null,
    confirmed_by: null,
    confirmed_at: null,
    ...more,
  };
}

export function withEntries(document: SurveyDocument, ...entries: Entry[]): SurveyDocument {
  return ran(document, addEntries, { entries });
}
