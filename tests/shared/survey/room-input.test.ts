import { assumptionsOrNone, NO_ASSUMPTIONS } from '@embertally/shared/survey/no-assumptions';
import { expect, test } from 'vitest';
import { roomInput, type RoomLimit } from '@embertally/shared/survey/room-input';
import { roomInputSchema } from '@embertally/shared/tally/room-input';
import { editRoom } from '@embertally/shared/survey/commands/edit-room';
import {
  box,
  crate,
  door,
  groundFloor,
  ran,
  uid,
  wallBetween,
  withEntries,
  withOpening,
  withRoom,
} from '../../support/survey-builder.ts';

function plan() {
  let document = withRoom(groundFloor({ wall_thickness_m: 0.2, height_m: 3.6 }), 'dock', box(0, 0, 6, 4));
  document = withRoom(document, 'bay', box(6, 0, 3, 4));
  document = withOpening(document, door(wallBetween(document, [6, 0], [6, 4]), 1));
  document = withOpening(
    document,
    door(wallBetween(document, [0, 0], [6, 0]), 1, { id: uid('w'), kind: 'window', state: 'fails' }),
  );
  return withEntries(document, crate('a', 'dock', 1, 1), crate('b', 'bay', 7, 1));
}

test('the ring is the clear one, the height the storey’s, an opening between rooms leads inside', () => {
  const input = roomInput(plan(), uid('dock'), []);
  expect(input.room.ring_m.map(([x, y]) => [Math.round(x * 1000), Math.round(y * 1000)])).toEqual([
    [100, 100],
    [5900, 100],
    [5900, 3900],
    [100, 3900],
  ]);
  expect(input.room.height_m).toBe(3.6);
  expect(input.room.openings?.map(({ id, leads_to, state }) => [id, leads_to, state])).toEqual([
    [uid('door'), 'inside', 'closed'],
    [uid('w'), 'outside', 'fails'],
  ]);
  expect(roomInput(plan(), uid('bay'), []).room.openings).toHaveLength(1);
});

test('its own contents with the heat copied when placed, its own limits and no others', () => {
  const limit = (room: string): RoomLimit => ({
    room_id: uid(room),
    quantity: 'load_per_floor_MJ_m2',
    bound: 680,
    set_by: 'permit 12/7',
  });
  const input = roomInput(plan(), uid('dock'), [limit('dock'), limit('bay')]);
  expect(input.contents.map(({ id }) => id)).toEqual([uid('a')]);
  expect(input.contents[0]?.parts[0]).toMatchObject({ net_heat_MJ_kg: 17, low_MJ_kg: 16, high_MJ_kg: 19, mass_kg: 10 });
  expect(input.limits).toEqual([{ quantity: 'load_per_floor_MJ_m2', bound: 680, set_by: 'permit 12/7' }]);
});

test('it fits the estimate’s schema, a room with a hole, a measured area and nothing in it included', () => {
  let document = withRoom(plan(), 'cage', box(2, 2, 1, 1), { cut_out: true });
  document = ran(document, editRoom, { room_id: uid('dock'), patch: { measured_floor_area_m2: 20, height_m: 2.9 } });
  for (const room of document.rooms.keys()) {
    expect(roomInputSchema.safeParse(JSON.parse(JSON.stringify(roomInput(document, room, []))))).toMatchObject({
      success: true,
    });
  }
  const dock = roomInput(document, uid('dock'), []);
  expect(dock.room).toMatchObject({ measured_floor_area_m2: 20, height_m: 2.9 });
  // A cage of 1 × 1 m on centre lines takes 1.2 × 1.2 m of the dock's floor.
  expect(dock.room.holes_m?.[0]?.map(([x, y]) => [Math.round(x * 10), Math.round(y * 10)]).sort()).toEqual([
    [19, 19],
    [19, 31],
    [31, 19],
    [31, 31],
  ]);
  expect(roomInput(document, uid('cage'), []).contents).toEqual([]);
});

test('a part’s moisture means its heat is that of the dry matter', () => {
  const wet = crate('wet', 'dock', 2, 2);
  const parts = wet.parts.map((part) => ({ ...part, moisture_pct: 12 }));
  const input = roomInput(withEntries(plan(), { ...wet, parts }), uid('dock'), []);
  expect(input.contents[1]?.parts[0]).toMatchObject({ water: 'dry', moisture_pct: 12 });
});

test('a room that is not there is a programming error', () => {
  expect(() => roomInput(plan(), uid('none'), [])).toThrow(RangeError);
});

test('what a person assumed for the room is what the estimate takes', () => {
  const assumptions = { ...NO_ASSUMPTIONS, growth: 'slow', fire_area_m2: 6, first_entry: uid('a') } as const;
  const document = ran(plan(), editRoom, { room_id: uid('dock'), patch: { assumptions } });
  const input = roomInput(document, uid('dock'), []);
  expect(input.options).toMatchObject({ growth: 'slow', fire_area_m2: 6, first_entry: uid('a'), kc: null });
  expect(roomInputSchema.safeParse(input)).toMatchObject({ success: true });
  expect(roomInput(plan(), uid('dock'), []).options).toBeUndefined();
});

test('a first entry that has left the room is forgotten, not refused', () => {
  const assumptions = { ...NO_ASSUMPTIONS, first_entry: uid('elsewhere') };
  const document = ran(plan(), editRoom, { room_id: uid('dock'), patch: { assumptions } });
  expect(roomInput(document, uid('dock'), []).options).toMatchObject({ first_entry: null });
});

test('assumptions that are all defaults are none', () => {
  expect(assumptionsOrNone(NO_ASSUMPTIONS)).toBeNull();
  expect(assumptionsOrNone({ ...NO_ASSUMPTIONS, kb: 'UK' })).toMatchObject({ kb: 'UK' });
});
