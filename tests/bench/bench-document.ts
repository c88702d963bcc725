import { randomUUID } from 'node:crypto';
import { KINDS } from '@embertally/shared/catalogue/kinds';
import { materialByKey } from '@embertally/shared/catalogue/materials';
import { applyChanges } from '@embertally/shared/survey/apply-changes';
import { MAX_CHANGES, type Changes } from '@embertally/shared/survey/change';
import type { Command } from '@embertally/shared/survey/command';
import { addEntries } from '@embertally/shared/survey/commands/add-entries';
import { drawRoom } from '@embertally/shared/survey/commands/draw-room';
import { newEntryFromKind } from '@embertally/shared/survey/new-entry';
import { newStorey } from '@embertally/shared/survey/new-storey';
import { newSurveyDocument } from '@embertally/shared/survey/new-survey-document';
import type { SurveyDocument } from '@embertally/shared/survey/survey-document';

const COLUMNS = 10;
const ROOM_M = 12;

/** A storey of square rooms in rows of ten, each with the same number of entries, and the change sets that make it. */
export function benchDocument(
  ids: { readonly surveyId: string; readonly storeyId: string },
  rooms: number,
  entriesPerRoom: number,
): { readonly document: SurveyDocument; readonly sets: readonly Changes[] } {
  const storey = newStorey({ id: ids.storeyId, name: 'Ground floor' });
  let document: SurveyDocument = { ...newSurveyDocument(ids.surveyId), storeys: new Map([[storey.id, storey]]) };
  const all: Changes[] = [];
  const run = <Input>(command: Command<Input>, input: Input): void => {
    const outcome = command(document, input);
    if (outcome.refused) throw new Error(outcome.message);
    document = applyChanges(document, outcome.changes);
    all.push(outcome.changes);
  };
  for (let index = 0; index < rooms; index += 1) {
    const x = (index % COLUMNS) * ROOM_M;
    const y = Math.floor(index / COLUMNS) * ROOM_M;
    const room_id = randomUUID();
    const points = [
      [0, 0],
      [ROOM_M, 0],
      [ROOM_M, ROOM_M],
      [0, ROOM_M],
    ].map(([dx = 0, dy = 0]) => ({ x_m: x + dx, y_m: y + dy }));
    run(drawRoom, {
      room_id,
      storey_id: storey.id,
      name: `Room ${index + 1}`,
      points,
      corner_ids: points.map(() => randomUUID()),
    });
    const entries = Array.from({ length: entriesPerRoom }, (_, at) => {
      const kind = KINDS[(index + at) % KINDS.length]!;
      const place = {
        id: randomUUID(),
        room_id,
        x_m: x + 0.8 + (at % 11),
        y_m: y + 0.8 + Math.floor(at / 11),
        recorded_by: 'Bench',
        recorded_at: '2026-11-01T10:00:00.000Z',
      };
      return { ...newEntryFromKind(kind, materialByKey, place), width_m: 0.6, depth_m: 0.6 };
    });
    if (entries.length > 0) run(addEntries, { entries });
  }
  const sets: Changes[] = [];
  let open: Changes = [];
  for (const changes of all) {
    if (open.length + changes.length > Math.min(MAX_CHANGES, 900)) {
      sets.push(open);
      open = [];
    }
    open = [...open, ...changes];
  }
  if (open.length > 0) sets.push(open);
  return { document, sets };
}
