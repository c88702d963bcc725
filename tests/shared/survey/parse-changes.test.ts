import { expect, test } from 'vitest';
import { parseChanges } from '@embertally/shared/survey/parse-changes';
import type { Change } from '@embertally/shared/survey/change';
import { crate, uid } from '../../support/survey-builder.ts';

const row = { ...crate('a', 'dock', 1, 1) };
const create: Change = { kind: 'entry', id: uid('a'), before: null, after: row };

function faults(...changes: Change[]) {
  const parsed = parseChanges(changes);
  return parsed.ok ? [] : parsed.errors.map(({ pointer, code }) => `${pointer} ${code}`);
}

test('whole rows, edits of known fields and deletes pass', () => {
  expect(parseChanges([create])).toEqual({ ok: true, value: [create] });
  expect(faults({ kind: 'entry', id: uid('a'), before: { count: 1 }, after: { count: 2 } })).toEqual([]);
  expect(faults({ kind: 'entry', id: uid('a'), before: row, after: null })).toEqual([]);
});

test('every fault is listed, at its place', () => {
  const bad = { ...row, count: -1, colour: 'red', parts: [{ ...row.parts[0], mass_kg: 2_000_000 }] };
  expect(faults({ ...create, after: bad }).sort()).toEqual([
    '/changes/0/after FIELD_OUT_OF_RANGE',
    '/changes/0/after/count FIELD_OUT_OF_RANGE',
    '/changes/0/after/parts/0/mass_kg FIELD_OUT_OF_RANGE',
  ]);
});

test.each([
  ['nothing on either side', { kind: 'entry', id: uid('a'), before: null, after: null }, '/changes/0 CHANGE_EMPTY'],
  ['another id in the row', { ...create, id: uid('b') }, '/changes/0/after/id ID_DIFFERS'],
  [
    'an edit of the id',
    { kind: 'room', id: uid('a'), before: { id: uid('a') }, after: { id: uid('b') } },
    '/changes/0/before FIELD_OUT_OF_RANGE',
  ],
  [
    'a room sent to another storey',
    { kind: 'room', id: uid('a'), before: { storey_id: uid('a') }, after: { storey_id: uid('b') } },
    '/changes/0/before FIELD_OUT_OF_RANGE',
  ],
  [
    'other fields before than after',
    { kind: 'entry', id: uid('a'), before: {}, after: { count: 2 } },
    '/changes/0 EDIT_LOPSIDED',
  ],
  [
    'text for a number',
    { kind: 'corner', id: uid('a'), before: { x_m: 1 }, after: { x_m: 'NaN' } },
    '/changes/0/after/x_m FIELD_OUT_OF_RANGE',
  ],
] as const)('%s is refused', (_, change, fault) => {
  expect(faults(change)).toContain(fault);
});

test('one row twice in a set is refused', () => {
  expect(faults(create, { kind: 'entry', id: uid('a'), before: row, after: null })).toEqual(['/changes/1 ROW_TWICE']);
});
