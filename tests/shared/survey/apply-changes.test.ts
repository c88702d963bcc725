import { expect, test } from 'vitest';
import { applyChanges, ChangesDoNotFit } from '@embertally/shared/survey/apply-changes';
import type { Changes } from '@embertally/shared/survey/change';
import { box, crate, groundFloor, uid, withEntries, withRoom } from '../../support/survey-builder.ts';

const plan = withEntries(
  withRoom(groundFloor(), 'dock', box(0, 0, 6, 4)),
  crate('a', 'dock', 1, 1),
  crate('b', 'dock', 2, 2),
);
const edit: Changes = [{ kind: 'entry', id: uid('a'), before: { count: 1 }, after: { count: 2 } }];

test('only what is touched is new; the document given stays as it was', () => {
  const after = applyChanges(plan, edit);
  expect(after.entries.get(uid('a'))?.count).toBe(2);
  expect(plan.entries.get(uid('a'))?.count).toBe(1);
  expect(after.entries.get(uid('b'))).toBe(plan.entries.get(uid('b')));
  expect([after.rooms, after.corners, after.openings, after.storeys]).toEqual([
    plan.rooms,
    plan.corners,
    plan.openings,
    plan.storeys,
  ]);
  expect(after.rooms).toBe(plan.rooms);
  expect(after.sequence).toBe(plan.sequence);
  expect(applyChanges(plan, [])).toBe(plan);
});

test('the same changes on another document are applied to that one', () => {
  const first = applyChanges(plan, edit);
  const renamed = applyChanges(plan, [{ kind: 'entry', id: uid('a'), before: { label: 'a' }, after: { label: 'x' } }]);
  expect(applyChanges(renamed, edit).entries.get(uid('a'))).toMatchObject({ label: 'x', count: 2 });
  expect(applyChanges(first, edit).entries.get(uid('a'))?.label).toBe('a');
});

test('an edit of a row that is not there is told, not ignored', () => {
  expect(() =>
    applyChanges(plan, [{ kind: 'entry', id: uid('z'), before: { count: 1 }, after: { count: 2 } }]),
  ).toThrow(ChangesDoNotFit);
});
