import { expect, test } from 'vitest';
import type { Change } from '@embertally/shared/survey/change';
import { newRoom } from '@embertally/shared/survey/new-room';
import { parseChanges } from '@embertally/shared/survey/parse-changes';
import { stepUpChanges } from '@embertally/shared/survey/versions/step-up';
import { crate, uid } from '../../support/survey-builder.ts';

/** A row as the first release wrote it. */
function without(row: object, ...fields: string[]): Record<string, unknown> {
  return Object.fromEntries(Object.entries(row).filter(([name]) => !fields.includes(name)));
}
const entry = crate('a', 'dock', 1, 1);
const room = newRoom({ id: uid('dock'), storey_id: uid('ground'), name: 'Dock', ring: [uid('1'), uid('2'), uid('3')] });
const oldEntry = without(entry, 'measure');
const oldRoom = without(room, 'assumptions', 'photos', 'to_do');

test('whole rows of the first release are taken, with what they could not say left unsaid', () => {
  const old: Change[] = [
    { kind: 'room', id: room.id, before: null, after: oldRoom },
    { kind: 'entry', id: entry.id, before: oldEntry, after: null },
  ];
  expect(stepUpChanges(old)).toEqual([
    { kind: 'room', id: room.id, before: null, after: { ...room } },
    { kind: 'entry', id: entry.id, before: { ...entry }, after: null },
  ]);
  expect(parseChanges(old)).toMatchObject({ ok: true });
});

test('edits and present rows stay as they are', () => {
  const changes: Change[] = [
    { kind: 'room', id: room.id, before: { name: 'Dock' }, after: { name: 'Scene dock' } },
    {
      kind: 'entry',
      id: entry.id,
      before: null,
      after: { ...entry, measure: { by: 'litres', quantity: 5, density_kg_m3: null } },
    },
    { kind: 'corner', id: uid('1'), before: null, after: { id: uid('1'), storey_id: uid('ground'), x_m: 0, y_m: 0 } },
  ];
  expect(stepUpChanges(changes)).toEqual(changes);
});
