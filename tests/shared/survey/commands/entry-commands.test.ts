import { expect, test } from 'vitest';
import { addEntries } from '@embertally/shared/survey/commands/add-entries';
import { copyContents } from '@embertally/shared/survey/commands/copy-contents';
import { deleteEntries } from '@embertally/shared/survey/commands/delete-entries';
import { duplicateEntries } from '@embertally/shared/survey/commands/duplicate-entries';
import { editEntries } from '@embertally/shared/survey/commands/edit-entries';
import { moveEntries } from '@embertally/shared/survey/commands/move-entries';
import { freePlace } from '@embertally/shared/survey/derive/free-place';
import type { Entry } from '@embertally/shared/survey/survey-document';
import { inSequence } from '@embertally/shared/survey/in-sequence';
import { box, crate, done, groundFloor, ran, uid, withEntries, withRoom } from '../../../support/survey-builder.ts';

const plan = withRoom(withRoom(groundFloor(), 'dock', box(0, 0, 6, 4)), 'bay', box(6, 0, 3, 4));
const maker = { recorded_by: 'Inspector', recorded_at: '2026-03-04T05:06:07Z' };

test('peak and measured curve go with the count', () => {
  const curve: [number, number][] = [
    [0, 0],
    [60, 200],
    [120, 0],
  ];
  const one = crate('a', 'dock', 1, 1, { count: 2, peak_kW: 300, curve });
  const document = withEntries(withRoom(groundFloor(), 'dock', box(0, 0, 6, 4)), one);
  const edit = (patch: Partial<Entry>) => ran(document, editEntries, { entry_ids: [uid('a')], patch });
  expect(edit({ count: 6 }).entries.get(uid('a'))).toMatchObject({
    count: 6,
    peak_kW: 900,
    curve: [
      [0, 0],
      [60, 600],
      [120, 0],
    ],
  });
  expect(edit({ count: 6, peak_kW: 500 }).entries.get(uid('a'))).toMatchObject({ peak_kW: 500 });
  expect(edit({ count: 0 }).entries.get(uid('a'))).toMatchObject({ count: 0, peak_kW: 300, curve });
  expect(edit({ label: 'x' }).entries.get(uid('a'))).toMatchObject({ count: 2, peak_kW: 300 });
});

test('contents lie in their room; outside it they are refused by name and nothing is recorded', () => {
  const refused = addEntries(plan, { entries: [crate('in', 'dock', 1, 1), crate('out', 'dock', 7, 1)] });
  expect(refused).toMatchObject({ code: 'ENTRY_OUTSIDE_ROOM', ids: [uid('out'), uid('dock')] });
  expect(addEntries(plan, { entries: [crate('x', 'nowhere', 1, 1)] })).toMatchObject({ code: 'ROOM_GONE' });
});

test.each([
  ['over 1,000 t', { count: 200_000, parts: [{ ...part(), mass_kg: 10 }] }, 'ENTRY_TOO_HEAVY', 'parts'],
  ['one part over 1,000 t', { parts: [{ ...part(), mass_kg: 1_000_001 }] }, 'FIELD_OUT_OF_RANGE', 'mass_kg'],
  ['negative', { parts: [{ ...part(), mass_kg: -1 }] }, 'FIELD_OUT_OF_RANGE', 'mass_kg'],
  ['not a number', { count: Number.NaN }, 'FIELD_OUT_OF_RANGE', 'count'],
  ['infinite', { width_m: Infinity }, 'FIELD_OUT_OF_RANGE', 'width_m'],
  ['a label of 10,000 characters', { label: 'x'.repeat(10_000) }, 'FIELD_OUT_OF_RANGE', 'label'],
  ['no label', { label: '' }, 'FIELD_OUT_OF_RANGE', 'label'],
  [
    'a curve that runs backwards',
    {
      curve: [
        [0, 0],
        [60, 100],
        [30, 50],
      ] as [number, number][],
    },
    'ENTRY_CURVE_ORDER',
    'curve',
  ],
] as const)('a mass, count or text that is %s is refused at its field', (_, more, code, field) => {
  const refused = addEntries(plan, { entries: [crate('a', 'dock', 1, 1, more as never)] });
  expect(refused).toMatchObject({ refused: true, code, field });
  expect(refused.refused && refused.message).toMatch(/\.$/);
});

function part() {
  const [first] = crate('x', 'x', 0, 0).parts;
  if (first === undefined) throw new Error();
  return first;
}

test('text in any script is kept as it is', () => {
  const label = '🪑 مقاعد ‮קרש‬ 椅子';
  const document = withEntries(plan, crate('a', 'dock', 1, 1, { label }));
  expect(document.entries.get(uid('a'))?.label).toBe(label);
});

test('dragged over a wall an entry belongs to the other room, onto no room it stays where it was', () => {
  const document = withEntries(plan, crate('a', 'dock', 5, 2));
  const over = ran(document, moveEntries, { moves: [{ entry_id: uid('a'), x_m: 7, y_m: 2 }] });
  expect(over.entries.get(uid('a'))).toMatchObject({ room_id: uid('bay'), x_m: 7, y_m: 2 });
  expect(moveEntries(document, { moves: [{ entry_id: uid('a'), x_m: 12, y_m: 2 }] })).toMatchObject({
    code: 'ENTRY_OUTSIDE_ROOMS',
    message: 'There is no room there, so “a” stays where it was.',
  });
  const onWall = done(document, moveEntries, { moves: [{ entry_id: uid('a'), x_m: 6, y_m: 2 }] });
  expect(onWall.changes[0]?.after).toEqual({ x_m: 6 });
});

test('sent to a room by name an entry finds a free place there', () => {
  const document = withEntries(plan, crate('a', 'dock', 1, 1), crate('b', 'bay', 6.5, 0.5));
  const after = ran(document, moveEntries, { moves: [{ entry_id: uid('a'), room_id: uid('bay') }] });
  const moved = after.entries.get(uid('a'));
  expect(moved?.room_id).toBe(uid('bay'));
  expect(moved && (moved.x_m >= 7.5 || moved.y_m >= 1.5) && moved.x_m <= 8.5 && moved.y_m <= 3.5).toBe(true);
});

test('a full room still gives a place, inside', () => {
  const full = withEntries(plan, crate('a', 'bay', 7.5, 2, { width_m: 3, depth_m: 4 }));
  const place = freePlace(full, uid('bay'), crate('b', 'bay', 0, 0));
  expect(place && place.x_m > 6 && place.x_m < 9 && place.y_m > 0 && place.y_m < 4).toBe(true);
});

test('one edit for several entries touches only its fields', () => {
  const document = withEntries(plan, crate('a', 'dock', 1, 1), crate('b', 'dock', 2, 2, { keeping: 'fixed' }));
  const { changes } = done(document, editEntries, {
    entry_ids: [uid('a'), uid('b')],
    patch: { keeping: 'fixed', count: 3 },
  });
  expect(changes).toEqual([
    { kind: 'entry', id: uid('a'), before: { keeping: 'stored', count: 1 }, after: { keeping: 'fixed', count: 3 } },
    { kind: 'entry', id: uid('b'), before: { count: 1 }, after: { count: 3 } },
  ]);
  expect(editEntries(document, { entry_ids: [uid('gone')], patch: {} })).toMatchObject({ code: 'ENTRY_GONE' });
});

test('an edit that changes nothing makes no change', () => {
  const document = withEntries(plan, crate('a', 'dock', 1, 1));
  expect(done(document, editEntries, { entry_ids: [uid('a')], patch: { count: 1 } }).changes).toEqual([]);
});

test('copies along a line are recorded anew, and one over the wall belongs next door', () => {
  const document = withEntries(plan, crate('a', 'dock', 5, 1, { confirmed_by: 'X', photos: [uid('photo')] }));
  const copies = [1, 2].map((n) => ({ entry_id: uid('a'), id: uid(`a${n}`), dx_m: n * 0.9, dy_m: 0 }));
  const after = ran(document, duplicateEntries, { ...maker, copies });
  expect(after.entries.get(uid('a1'))).toMatchObject({
    room_id: uid('dock'),
    x_m: 5.9,
    ...maker,
    confirmed_by: null,
    photos: [],
  });
  expect(after.entries.get(uid('a2'))).toMatchObject({ room_id: uid('bay'), x_m: 6.8 });
  const off = [{ entry_id: uid('a'), id: uid('a9'), dx_m: 50, dy_m: 0 }];
  expect(duplicateEntries(document, { ...maker, copies: off })).toMatchObject({ code: 'ENTRY_OUTSIDE_ROOMS' });
});

test('contents copied to another room stand in the same place, or in a free one where that is no floor', () => {
  const document = withEntries(plan, crate('a', 'dock', 1, 1), crate('b', 'dock', 5, 2));
  const ids = { [uid('a')]: uid('a2'), [uid('b')]: uid('b2') };
  const after = ran(document, copyContents, { ...maker, from_room_id: uid('dock'), to_room_id: uid('bay'), ids });
  expect(after.entries.get(uid('a2'))).toMatchObject({ room_id: uid('bay'), x_m: 7, y_m: 1 });
  const b = after.entries.get(uid('b2'));
  expect(b?.room_id).toBe(uid('bay'));
  expect(b && (Math.abs(b.x_m - 7) >= 1 || Math.abs(b.y_m - 1) >= 1)).toBe(true);
});

test('several commands as one gesture are one set of changes, or none', () => {
  const document = withEntries(plan, crate('a', 'dock', 1, 1));
  const both = inSequence(document, [
    (now) => addEntries(now, { entries: [crate('b', 'dock', 2, 2)] }),
    (now) => editEntries(now, { entry_ids: [uid('a'), uid('b')], patch: { count: 7 } }),
    (now) => deleteEntries(now, { entry_ids: [uid('a')] }),
  ]);
  expect(both).toMatchObject({ refused: false });
  expect(
    both.refused ? [] : both.changes.map(({ id, before, after }) => [id, before === null, after === null]),
  ).toEqual([
    [uid('b'), true, false],
    [uid('a'), false, true],
  ]);
  const none = inSequence(document, [
    (now) => deleteEntries(now, { entry_ids: [uid('a')] }),
    (now) => editEntries(now, { entry_ids: [uid('a')], patch: { count: 7 } }),
  ]);
  expect(none).toMatchObject({ code: 'ENTRY_GONE' });
});

test('more than 2,000 changes at once are refused', () => {
  const entries = Array.from({ length: 2001 }, (_, n) => crate(`e${n}`, 'dock', 1, 1));
  const refused = addEntries(plan, { entries });
  expect(refused).toMatchObject({ code: 'TOO_MANY_CHANGES' });
});
