import { describe, expect, test } from 'vitest';
import { applyChanges } from '@embertally/shared/survey/apply-changes';
import { clashSchema, type Changes } from '@embertally/shared/survey/change';
import { checkInvariants } from '@embertally/shared/survey/check-invariants';
import { addEntries } from '@embertally/shared/survey/commands/add-entries';
import { addOpening } from '@embertally/shared/survey/commands/add-opening';
import { deleteEntries } from '@embertally/shared/survey/commands/delete-entries';
import { deleteRoom } from '@embertally/shared/survey/commands/delete-room';
import { drawRoom } from '@embertally/shared/survey/commands/draw-room';
import { editEntries } from '@embertally/shared/survey/commands/edit-entries';
import { editRoom } from '@embertally/shared/survey/commands/edit-room';
import { insertCorner } from '@embertally/shared/survey/commands/insert-corner';
import { moveCorner } from '@embertally/shared/survey/commands/move-corner';
import { mergeChangeSet } from '@embertally/shared/survey/merge-change-set';
import { undoChanges } from '@embertally/shared/survey/undo-changes';
import type { SurveyDocument } from '@embertally/shared/survey/survey-document';
import {
  box,
  cornerAt,
  crate,
  done,
  door,
  drawing,
  groundFloor,
  GROUND,
  roomNamed,
  uid,
  wallBetween,
  withEntries,
  withRoom,
} from '../../support/survey-builder.ts';

const plan = withEntries(
  withRoom(withRoom(groundFloor(), 'dock', box(0, 0, 6, 4)), 'bay', box(6, 0, 3, 4)),
  crate('a', 'dock', 1, 1),
  crate('b', 'bay', 7, 1),
);
const bottom = wallBetween(plan, [0, 0], [6, 0]);
const top = wallBetween(plan, [0, 4], [6, 4]);

function merged(document: SurveyDocument, changes: Changes) {
  const outcome = mergeChangeSet(document, changes);
  if (!outcome.ok) throw new Error(outcome.clashes.map(({ message }) => message).join(' '));
  return outcome;
}

function clashes(document: SurveyDocument, changes: Changes) {
  const outcome = mergeChangeSet(document, changes);
  if (outcome.ok) throw new Error('merged');
  for (const clash of outcome.clashes) expect(clashSchema.safeParse(clash).success).toBe(true);
  return outcome.clashes;
}

const edit = (patch: Parameters<typeof editEntries>[1]['patch'], id = 'a') =>
  done(plan, editEntries, { entry_ids: [uid(id)], patch }).changes;

describe('fields', () => {
  test('different fields of one row merge, and the changes say what the document was', () => {
    const theirs = applyChanges(plan, edit({ count: 5 }));
    const outcome = merged(theirs, edit({ label: 'Flats' }));
    expect(outcome.document.entries.get(uid('a'))).toMatchObject({ count: 5, label: 'Flats' });
    expect(outcome.changes).toEqual([
      { kind: 'entry', id: uid('a'), before: { label: 'a' }, after: { label: 'Flats' } },
    ]);
    expect(outcome).toMatchObject({ touchedRoomIds: [uid('dock')], touchedStoreyIds: [GROUND] });
  });

  test('the same field with the same value merges to nothing', () => {
    expect(merged(applyChanges(plan, edit({ count: 5 })), edit({ count: 5 })).changes).toEqual([]);
  });

  test('the same field with another value clashes with both values, and nothing is applied', () => {
    const found = clashes(applyChanges(plan, edit({ count: 5 })), [...edit({ count: 6, note: 'x' })]);
    expect(found).toEqual([
      {
        reason: 'field',
        kind: 'entry',
        id: uid('a'),
        field: 'count',
        base: 1,
        theirs: 5,
        mine: 6,
        by: null,
        at: null,
        message: 'The count of “a” was changed by someone else as well.',
      },
    ]);
  });

  test('a value changed and changed back in between merges, whatever the version', () => {
    const there = applyChanges(plan, edit({ count: 5 }));
    const back = applyChanges(there, done(there, editEntries, { entry_ids: [uid('a')], patch: { count: 1 } }).changes);
    expect(merged(back, edit({ count: 6 })).document.entries.get(uid('a'))?.count).toBe(6);
  });

  test('nested values are one field', () => {
    const parts = plan.entries.get(uid('a'))?.parts ?? [];
    const mine = edit({ parts: parts.map((one) => ({ ...one, mass_kg: 11 })) });
    const theirs = applyChanges(plan, edit({ parts: parts.map((one) => ({ ...one, label: 'canvas' })) }));
    expect(clashes(theirs, mine)).toMatchObject([{ reason: 'field', field: 'parts' }]);
  });
});

describe('rows', () => {
  test('a create arriving twice does nothing; another row under its id clashes', () => {
    const { changes } = done(plan, addEntries, { entries: [crate('c', 'dock', 2, 2)] });
    const once = applyChanges(plan, changes);
    expect(merged(once, changes).changes).toEqual([]);
    const other = done(plan, addEntries, { entries: [crate('c', 'dock', 3, 3)] }).changes;
    expect(clashes(once, other)).toMatchObject([{ reason: 'edited', kind: 'entry', id: uid('c') }]);
  });

  test('deleting what was edited clashes as edited, editing what was deleted as gone, deleting twice is nothing', () => {
    const gone = done(plan, deleteEntries, { entry_ids: [uid('a')] }).changes;
    expect(clashes(applyChanges(plan, edit({ count: 5 })), gone)).toMatchObject([
      { reason: 'edited', id: uid('a'), message: '“a” was changed while you deleted it.' },
    ]);
    expect(clashes(applyChanges(plan, gone), edit({ count: 5 }))).toMatchObject([
      { reason: 'gone', id: uid('a'), mine: { count: 5 } },
    ]);
    expect(merged(applyChanges(plan, gone), gone).changes).toEqual([]);
  });

  test('an entry put into a room that is gone, and a room deleted while something was put into it', () => {
    const put = done(plan, addEntries, { entries: [crate('c', 'bay', 8, 2)] }).changes;
    const drop = done(plan, deleteRoom, { room_id: uid('bay') }).changes;
    expect(clashes(applyChanges(plan, drop), put)).toMatchObject([{ reason: 'gone', kind: 'room', id: uid('bay') }]);
    expect(clashes(applyChanges(plan, put), drop)).toMatchObject([{ reason: 'edited', kind: 'room', id: uid('bay') }]);
  });
});

describe('plan', () => {
  const split = (wall: [string, string], name: string, x: number, y: number) =>
    done(plan, insertCorner, { storey_id: GROUND, wall, corner_id: uid(name), x_m: x, y_m: y }).changes;

  test('corners put into different walls of one room merge', () => {
    const outcome = merged(applyChanges(plan, split(bottom, 'p', 2, 0)), split(top, 'q', 3, 4));
    expect(roomNamed(outcome.document, 'dock').ring).toHaveLength(6);
    expect(checkInvariants(outcome.document)).toEqual([]);
  });

  test('corners put into the same wall clash at the outline', () => {
    const found = clashes(applyChanges(plan, split(bottom, 'p', 2, 0)), split(bottom, 'q', 4, 0));
    expect(found).toMatchObject([{ reason: 'field', kind: 'room', field: 'ring' }]);
  });

  test('a door put into a wall that was split in between is hung on the right half, either way round', () => {
    const hang = done(plan, addOpening, { opening: door(bottom, 3) }).changes;
    const cut = split(bottom, 'p', 2, 0);
    const one = merged(applyChanges(plan, cut), hang).document;
    const other = merged(applyChanges(plan, hang), cut).document;
    expect(one.openings.get(uid('door'))).toMatchObject({ wall: [uid('p'), bottom[1]], offset_m: 1 });
    expect(other).toEqual(one);
  });

  test('a door over the place where the wall was split clashes by its name', () => {
    const hang = done(plan, addOpening, { opening: door(bottom, 1.5, { label: 'Dock door' }) }).changes;
    const found = clashes(applyChanges(plan, split(bottom, 'p', 2, 0)), hang);
    expect(found).toMatchObject([{ reason: 'geometry', kind: 'opening', id: uid('door') }]);
    expect(found[0]?.message).toContain('door “Dock door”');
  });

  test('each fine alone, together over one another: geometry', () => {
    const mine = done(plan, drawRoom, drawing('x', box(0, 4, 3, 3))).changes;
    const theirs = done(plan, drawRoom, drawing('y', box(2, 5, 3, 3))).changes;
    const found = clashes(applyChanges(plan, theirs), mine);
    expect(found).toMatchObject([
      { reason: 'geometry', kind: 'room', message: expect.stringContaining('overlap') as string },
    ]);
  });

  test('corners of a deleted room stay while another person’s new room uses them, and go when nobody does', () => {
    const drop = done(plan, deleteRoom, { room_id: uid('bay') }).changes;
    const draw = done(plan, drawRoom, drawing('x', box(9, 0, 2, 4))).changes;
    const outcome = merged(applyChanges(plan, draw), drop);
    expect(outcome.document.corners.has(cornerAt(plan, 9, 0))).toBe(true);
    expect(checkInvariants(outcome.document)).toEqual([]);

    const dropOther = done(plan, deleteRoom, { room_id: uid('dock') }).changes;
    expect(merged(applyChanges(plan, drop), dropOther).document.corners.size).toBe(0);
  });

  test('touched rooms: both along a moved corner, neighbours of a room that goes, none for a change of nothing', () => {
    const move = done(plan, moveCorner, { corner_id: cornerAt(plan, 6, 4), x_m: 6, y_m: 5 }).changes;
    expect([...merged(plan, move).touchedRoomIds].sort()).toEqual([uid('bay'), uid('dock')].sort());
    const drop = done(plan, deleteRoom, { room_id: uid('bay') }).changes;
    expect([...merged(plan, drop).touchedRoomIds].sort()).toEqual([uid('bay'), uid('dock')].sort());
    const rename = done(plan, editRoom, { room_id: uid('bay'), patch: { name: 'Bay 2' } }).changes;
    expect(merged(plan, rename).touchedRoomIds).toEqual([uid('bay')]);
    expect(merged(plan, [])).toMatchObject({ changes: [], touchedRoomIds: [], touchedStoreyIds: [] });
  });

  test('a set made by hand that breaks a rule is a clash, not a crash', () => {
    const [a = '', b = '', c = ''] = roomNamed(plan, 'dock').ring;
    const twisted = [
      {
        kind: 'room' as const,
        id: uid('dock'),
        before: { ring: roomNamed(plan, 'dock').ring },
        after: { ring: [a, c, b] },
      },
    ];
    expect(clashes(plan, twisted)[0]?.reason).toBe('geometry');
    const nowhere = { ...crate('z', 'dock', 1, 1), room_id: uid('nowhere') };
    expect(clashes(plan, [{ kind: 'entry', id: nowhere.id, before: null, after: nowhere }])[0]?.reason).toBe('gone');
    const storeyless = { kind: 'corner' as const, id: uid('k'), before: null };
    const corner = { id: uid('k'), storey_id: uid('nowhere'), x_m: 0, y_m: 0 };
    expect(mergeChangeSet(plan, [{ ...storeyless, after: corner }])).toMatchObject({ ok: true, changes: [] });
    const room = { ...roomNamed(plan, 'dock'), id: uid('r'), ring: [uid('k1'), uid('k2'), uid('k3')] };
    expect(clashes(plan, [{ kind: 'room', id: room.id, before: null, after: room }])[0]).toMatchObject({
      reason: 'gone',
      kind: 'corner',
    });
  });
});

describe('undo', () => {
  test('what somebody else changed since stays and is named, the rest goes back', () => {
    const mine = edit({ count: 5, label: 'Flats' });
    const now = applyChanges(plan, mine);
    const later = applyChanges(now, done(now, editEntries, { entry_ids: [uid('a')], patch: { count: 9 } }).changes);
    const undone = undoChanges(later, mine);
    expect(undone).toMatchObject({
      refused: false,
      changes: [{ kind: 'entry', id: uid('a'), before: { label: 'Flats' }, after: { label: 'a' } }],
      skipped: [{ field: 'count', message: 'The count of “Flats” was changed by someone else and stays as it is.' }],
    });
  });

  test('a deleted room comes back with its contents; a drawn one that somebody filled cannot go', () => {
    const drop = done(plan, deleteRoom, { room_id: uid('bay') }).changes;
    const back = undoChanges(applyChanges(plan, drop), drop);
    expect(back.refused ? null : applyChanges(applyChanges(plan, drop), back.changes)).toEqual(plan);

    const draw = done(plan, drawRoom, drawing('x', box(9, 0, 2, 4))).changes;
    const drawn = applyChanges(plan, draw);
    const filled = withEntries(drawn, crate('late', 'x', 10, 1));
    expect(undoChanges(filled, draw)).toMatchObject({ refused: true, code: 'UNDO_IMPOSSIBLE' });
  });

  test('undoing the undo does the step again', () => {
    const mine = edit({ count: 5 });
    const undone = undoChanges(applyChanges(plan, mine), mine);
    if (undone.refused) throw new Error();
    const redone = undoChanges(plan, undone.changes);
    expect(redone.refused ? null : applyChanges(plan, redone.changes)).toEqual(applyChanges(plan, mine));
  });
});
