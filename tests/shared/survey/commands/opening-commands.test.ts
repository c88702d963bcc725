import { expect, test } from 'vitest';
import { addOpening } from '@embertally/shared/survey/commands/add-opening';
import { deleteOpening } from '@embertally/shared/survey/commands/delete-opening';
import { editOpening } from '@embertally/shared/survey/commands/edit-opening';
import { moveOpening } from '@embertally/shared/survey/commands/move-opening';
import { openingsOfRoom } from '@embertally/shared/survey/derive/openings-of-room';
import { roomsOfOpening } from '@embertally/shared/survey/derive/rooms-of-opening';
import { newOpening } from '@embertally/shared/survey/new-opening';
import {
  box,
  door,
  groundFloor,
  GROUND,
  ran,
  uid,
  wallBetween,
  withOpening,
  withRoom,
} from '../../../support/survey-builder.ts';

const plan = withRoom(withRoom(groundFloor(), 'dock', box(0, 0, 6, 4)), 'bay', box(6, 0, 3, 4));
const shared = wallBetween(plan, [6, 0], [6, 4]);

test('a door is closed, a window’s glass fails, a vent stands open', () => {
  const start = (kind: 'door' | 'window' | 'vent') => {
    const { state, width_m, height_m, sill_m } = newOpening({
      id: uid('o'),
      storey_id: GROUND,
      wall: shared,
      offset_m: 0,
      kind,
    });
    return [state, width_m, height_m, sill_m];
  };
  expect(start('door')).toEqual(['closed', 0.9, 2, 0]);
  expect(start('window')).toEqual(['fails', 1.2, 1.2, 0.9]);
  expect(start('vent')[0]).toBe('open');
});

test('an opening in a wall between two rooms belongs to both', () => {
  const document = withOpening(plan, door(shared, 1));
  expect([...roomsOfOpening(document, door(shared, 1))].sort()).toEqual([uid('dock'), uid('bay')].sort());
  expect(openingsOfRoom(document, uid('dock')).map(({ id }) => id)).toEqual([uid('door')]);
  expect(openingsOfRoom(document, uid('bay')).map(({ id }) => id)).toEqual([uid('door')]);
});

test('openings never overhang their wall, overlap one another or rise above the room', () => {
  const document = withOpening(plan, door(shared, 1.3, { label: 'Bay door', width_m: 0.9 }));
  const add = (more: Parameters<typeof door>[2], offset = 2.5) =>
    addOpening(document, { opening: door(shared, offset, { id: uid('w'), kind: 'window', ...more }) });
  expect(add({ width_m: 2.4 })).toMatchObject({
    code: 'OPENING_TOO_WIDE',
    field: 'width_m',
    message: 'The window is 2.40 m wide but the wall has only 1.80 m free.',
  });
  expect(add({ width_m: 1.8 })).toMatchObject({
    code: 'OPENING_PAST_WALL',
    field: 'offset_m',
    message: 'The window would end 0.30 m past the end of its wall, which is 4.00 m long.',
  });
  expect(add({ width_m: 1.2 }, 2)).toMatchObject({ code: 'OPENING_OVERLAPS', ids: [uid('w'), uid('door')] });
  expect(add({ width_m: 1.2, sill_m: 1.5, height_m: 2 })).toMatchObject({
    code: 'OPENING_TOO_HIGH',
    field: 'height_m',
  });
  expect(add({ width_m: 1.2, sill_m: -1 })).toMatchObject({ code: 'FIELD_OUT_OF_RANGE', field: 'sill_m' });
  expect(add({ width_m: 1.8, height_m: 0.5, sill_m: 2.1 }, 1)).toMatchObject({ refused: false });
});

test('openings counted from the other end of the wall are compared in the same place', () => {
  const document = withOpening(plan, door(shared, 0.5));
  const other: [string, string] = [shared[1], shared[0]];
  const from = (offset: number) => addOpening(document, { opening: door(other, offset, { id: uid('w') }) });
  expect(from(2.6)).toMatchObject({ code: 'OPENING_OVERLAPS' });
  expect(from(0.5)).toMatchObject({ refused: false });
  expect(from(1.7)).toMatchObject({ refused: false });
});

test('a wall that is not there, a number that is none', () => {
  const diagonal = wallBetween(plan, [0, 0], [6, 4]);
  expect(addOpening(plan, { opening: door(diagonal, 0) })).toMatchObject({ code: 'WALL_GONE' });
  expect(addOpening(plan, { opening: door(shared, Number.NaN) })).toMatchObject({
    code: 'FIELD_OUT_OF_RANGE',
    field: 'offset_m',
  });
});

test('moved to another wall, edited, taken out', () => {
  let document = withOpening(plan, door(shared, 1));
  const bottom = wallBetween(plan, [0, 0], [6, 0]);
  document = ran(document, moveOpening, { opening_id: uid('door'), wall: bottom, offset_m: 5.1 });
  expect(document.openings.get(uid('door'))).toMatchObject({ wall: bottom, offset_m: 5.1 });
  expect(editOpening(document, { opening_id: uid('door'), patch: { width_m: 1 } })).toMatchObject({
    code: 'OPENING_PAST_WALL',
  });
  document = ran(document, editOpening, { opening_id: uid('door'), patch: { state: 'open', width_m: 0.80004 } });
  expect(document.openings.get(uid('door'))).toMatchObject({ state: 'open', width_m: 0.8 });
  document = ran(document, deleteOpening, { opening_ids: [uid('door')] });
  expect(document.openings.size).toBe(0);
  expect(deleteOpening(document, { opening_ids: [uid('door')] })).toMatchObject({ code: 'OPENING_GONE' });
});
