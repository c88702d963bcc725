import { kindByKey } from '@embertally/shared/catalogue/kinds';
import { materialByKey } from '@embertally/shared/catalogue/materials';
import { nearestOnSegment } from '@embertally/shared/geometry/nearest-on-segment';
import { applyChanges } from '@embertally/shared/survey/apply-changes';
import type { Changes } from '@embertally/shared/survey/change';
import type { Command } from '@embertally/shared/survey/command';
import { addEntries } from '@embertally/shared/survey/commands/add-entries';
import { addOpening } from '@embertally/shared/survey/commands/add-opening';
import { addStorey } from '@embertally/shared/survey/commands/add-storey';
import { drawRoom } from '@embertally/shared/survey/commands/draw-room';
import { editStorey } from '@embertally/shared/survey/commands/edit-storey';
import { walls } from '@embertally/shared/survey/derive/walls';
import { newEntryFromKind } from '@embertally/shared/survey/new-entry';
import { newOpening } from '@embertally/shared/survey/new-opening';
import { newStorey } from '@embertally/shared/survey/new-storey';
import { newSurveyDocument } from '@embertally/shared/survey/new-survey-document';
import type { Entry, SurveyDocument } from '@embertally/shared/survey/survey-document';
import { BUILDING_PROTECTION, type DemoEntry, type DemoFloor, type DemoOpening, type DemoRoom } from './demo-floor.ts';
import { GROUND_FLOOR } from './ground-floor.ts';
import { UPPER_FLOOR } from './upper-floor.ts';

const WALL_M = 0.2;

export interface DemoSurvey {
  readonly survey_id: string;
  /** The storey the building begins with. */
  readonly storey_id: string;
  /** The same id for the same name, so that a run cut short can be finished by another. */
  readonly idOf: (name: string) => string;
  readonly recorded_by: string;
  readonly recorded_at: string;
}

export interface DemoStep {
  readonly label: string;
  readonly changes: Changes;
}

/** The demo survey as the gestures of somebody who draws and records it: the steps in order, and the document they make. */
export function demoChanges(survey: DemoSurvey): {
  readonly steps: readonly DemoStep[];
  readonly document: SurveyDocument;
} {
  const steps: DemoStep[] = [];
  const first = newStorey({ id: survey.storey_id, name: GROUND_FLOOR.name });
  const empty = newSurveyDocument(survey.survey_id);
  let document: SurveyDocument = { ...empty, storeys: new Map([[first.id, first]]) };
  const run = <Input>(label: string, command: Command<Input>, input: Input): void => {
    const outcome = command(document, input);
    if (outcome.refused) throw new Error(`The demo book cannot be drawn, ${label}: ${outcome.message}`);
    document = applyChanges(document, outcome.changes);
    steps.push({ label, changes: outcome.changes });
  };

  for (const floor of [GROUND_FLOOR, UPPER_FLOOR]) {
    const storey_id = floor === GROUND_FLOOR ? survey.storey_id : survey.idOf(floor.name);
    const measures = { level_m: floor.level_m, height_m: floor.height_m, wall_thickness_m: WALL_M, north_deg: 20 };
    if (floor === GROUND_FLOOR) run(`Measure ${floor.name}`, editStorey, { storey_id, patch: measures });
    else run(`Add ${floor.name}`, addStorey, { storey: newStorey({ id: storey_id, name: floor.name, ...measures }) });
    for (const room of floor.rooms) run(`Draw ${room.name}`, drawRoom, roomInput(survey, storey_id, room));
    for (const opening of floor.openings) {
      run(`Put a ${opening.kind}`, addOpening, { opening: openingRow(survey, document, storey_id, floor, opening) });
    }
    for (const room of floor.rooms) {
      const entries = room.contents.map((entry) => entryRow(survey, room, entry));
      run(`Record ${room.name}`, addEntries, { entries });
    }
  }
  return { steps, document };
}

function roomInput(survey: DemoSurvey, storey_id: string, room: DemoRoom): Parameters<typeof drawRoom>[1] {
  return {
    room_id: survey.idOf(`room ${room.name}`),
    storey_id,
    name: room.name,
    points: room.ring.map(([x_m, y_m]) => ({ x_m, y_m })),
    corner_ids: room.ring.map((_, index) => survey.idOf(`corner ${room.name} ${index}`)),
    room: {
      use: room.use,
      lining: room.lining,
      protection: { ...BUILDING_PROTECTION, ...room.protection },
      rating_min: room.rating_min,
      danger_of_activation: room.danger_of_activation ?? null,
      bounded_by_rated_construction: true,
    },
  };
}

function openingRow(
  survey: DemoSurvey,
  document: SurveyDocument,
  storey_id: string,
  floor: DemoFloor,
  opening: DemoOpening,
) {
  const { at, kind, ...given } = opening;
  const point = { x_m: at[0], y_m: at[1] };
  for (const wall of walls(document, storey_id)) {
    const from = document.corners.get(wall.a);
    const to = document.corners.get(wall.b);
    if (from === undefined || to === undefined || nearestOnSegment(point, from, to).distance_m > 0.001) continue;
    const row = newOpening({
      id: survey.idOf(`opening ${floor.name} ${at.join(' ')}`),
      storey_id,
      wall: [wall.a, wall.b],
      offset_m: 0,
      kind,
      ...given,
    });
    return { ...row, offset_m: Math.hypot(point.x_m - from.x_m, point.y_m - from.y_m) - row.width_m / 2 };
  }
  throw new Error(`The demo book has no wall at ${at.join(', ')} on the ${floor.name}.`);
}

function entryRow(survey: DemoSurvey, room: DemoRoom, { kind, label, at, size, ...given }: DemoEntry): Entry {
  const row = kindByKey(kind);
  if (row === undefined) throw new Error(`The demo book names the unknown kind ${kind}.`);
  const entry = newEntryFromKind(row, materialByKey, {
    id: survey.idOf(`entry ${room.name} ${label}`),
    room_id: survey.idOf(`room ${room.name}`),
    x_m: at[0],
    y_m: at[1],
    recorded_by: survey.recorded_by,
    recorded_at: survey.recorded_at,
  });
  // A kind's peak is that of one piece; the whole entry's is given where it is known.
  const peak_kW = given.count === 1 ? entry.peak_kW : null;
  return { ...entry, peak_kW, ...given, label, width_m: size[0], depth_m: size[1], height_m: size[2] };
}
