import { expect, test } from 'vitest';
import { checkInvariants } from '@embertally/shared/survey/check-invariants';
import type { Corner, Entry, Opening, Room, SurveyDocument } from '@embertally/shared/survey/survey-document';
import {
  box,
  cornerAt,
  crate,
  door,
  groundFloor,
  GROUND,
  roomNamed,
  uid,
  wallBetween,
  withEntries,
  withOpening,
  withRoom,
} from '../../support/survey-builder.ts';

/** A sound plan: two rooms, a door between them, an entry in each. Every case below breaks one thing by hand. */
function sound(): SurveyDocument {
  let document = withRoom(withRoom(groundFloor(), 'dock', box(0, 0, 6, 4)), 'bay', box(6, 0, 3, 4));
  document = withOpening(document, door(wallBetween(document, [6, 0], [6, 4]), 1));
  return withEntries(document, crate('a', 'dock', 1, 1), crate('b', 'bay', 7, 1));
}

const put = <R extends { id: string }>(rows: ReadonlyMap<string, R>, ...more: R[]): ReadonlyMap<string, R> =>
  new Map([...rows, ...more.map((row) => [row.id, row] as const)]);
const without = <R>(rows: ReadonlyMap<string, R>, id: string): ReadonlyMap<string, R> =>
  new Map([...rows].filter(([key]) => key !== id));

function loose(name: string, corners: readonly (readonly [number, number])[]): { room: Room; corners: Corner[] } {
  const rows = corners.map(([x_m, y_m], index) => ({ id: uid(`${name}${index}`), storey_id: GROUND, x_m, y_m }));
  return {
    room: { ...roomNamed(sound(), 'dock'), id: uid(name), name, ring: rows.map(({ id }) => id) },
    corners: rows,
  };
}

function withLoose(name: string, corners: readonly (readonly [number, number])[]): SurveyDocument {
  const made = loose(name, corners);
  const document = sound();
  return { ...document, rooms: put(document.rooms, made.room), corners: put(document.corners, ...made.corners) };
}

function withRow(
  change: (document: SurveyDocument) => { room?: Room; opening?: Opening; entry?: Entry; corner?: Corner },
) {
  const document = sound();
  const { room, opening, entry, corner } = change(document);
  return {
    ...document,
    rooms: room ? put(document.rooms, room) : document.rooms,
    openings: opening ? put(document.openings, opening) : document.openings,
    entries: entry ? put(document.entries, entry) : document.entries,
    corners: corner ? put(document.corners, corner) : document.corners,
  };
}

const theDoor = (document: SurveyDocument) => document.openings.get(uid('door')) as Opening;
const entryA = (document: SurveyDocument) => document.entries.get(uid('a')) as Entry;

test('a sound plan breaks no rule', () => {
  expect(checkInvariants(sound())).toEqual([]);
});

test.each<[string, () => SurveyDocument]>([
  ['STOREY_GONE', () => ({ ...sound(), storeys: new Map() })],
  ['CORNER_GONE', () => ({ ...sound(), corners: without(sound().corners, cornerAt(sound(), 0, 0)) })],
  ['CORNER_UNUSED', () => withRow(() => ({ corner: { id: uid('k'), storey_id: GROUND, x_m: 50, y_m: 50 } }))],
  ['WALL_GONE', () => withRow((d) => ({ opening: { ...theDoor(d), wall: wallBetween(d, [0, 0], [6, 4]) } }))],
  ['ROOM_GONE', () => withRow((d) => ({ entry: { ...entryA(d), room_id: uid('nowhere') } }))],
  ['ENTRY_OUTSIDE_ROOM', () => withRow((d) => ({ entry: { ...entryA(d), x_m: 8 } }))],
  ['ENTRY_TOO_HEAVY', () => withRow((d) => ({ entry: { ...entryA(d), count: 100_001 } }))],
  ['OPENING_TOO_WIDE', () => withRow((d) => ({ opening: { ...theDoor(d), width_m: 4.002 } }))],
  ['OPENING_PAST_WALL', () => withRow((d) => ({ opening: { ...theDoor(d), offset_m: 3.102 } }))],
  ['OPENING_TOO_HIGH', () => withRow((d) => ({ opening: { ...theDoor(d), height_m: 3.002 } }))],
  ['OPENING_OVERLAPS', () => withRow((d) => ({ opening: { ...theDoor(d), id: uid('o2'), offset_m: 1.898 } }))],
  ['ROOM_TOO_SMALL', () => withLoose('x', box(20, 0, 0.5, 0.49))],
  ['WALL_TOO_SHORT', () => withLoose('x', box(20, 0, 0.049, 9))],
  [
    'ROOM_CROSSES_ITSELF',
    () =>
      withLoose('x', [
        [20, 0],
        [24, 4],
        [24, 0],
        [20, 4],
      ]),
  ],
  ['CORNER_NOT_SHARED', () => withLoose('x', box(9, 0, 3, 4))],
  ['CORNER_NOT_SHARED', () => withLoose('x', box(9.001, 1, 3, 2))],
  ['ROOM_OVERLAPS', () => withLoose('x', box(8, 1, 3, 2))],
  ['ROOM_OVERLAPS', () => withLoose('x', box(1, 1, 2, 2))],
  ['ROOM_OVERLAPS', () => withLoose('x', box(-1, -1, 12, 6))],
  ['ROOM_OVERLAPS', () => withRow((d) => ({ room: { ...roomNamed(d, 'dock'), id: uid('again') } }))],
  [
    'ROOM_MEETS_ITSELF',
    () => withRow((d) => ({ room: { ...roomNamed(d, 'dock'), holes: [roomNamed(d, 'dock').ring] } })),
  ],
  [
    'HOLE_OUTSIDE_ROOM',
    () => {
      const hole = loose('h', box(20, 0, 2, 2));
      const document = withRow((d) => ({ room: { ...roomNamed(d, 'dock'), holes: [hole.room.ring] } }));
      return { ...document, corners: put(document.corners, ...hole.corners) };
    },
  ],
])('%s is found in a plan broken by hand', (code, broken) => {
  const found = checkInvariants(broken());
  expect(found.map((violation) => violation.code)).toContain(code);
  expect(found[0]?.message).toMatch(/^[A-Z“].*\.$/u);
});

test.each<[string, () => SurveyDocument]>([
  ['an opening that ends exactly with its wall', () => withRow((d) => ({ opening: { ...theDoor(d), offset_m: 3.1 } }))],
  ['two openings side by side', () => withRow((d) => ({ opening: { ...theDoor(d), id: uid('o2'), offset_m: 1.9 } }))],
  ['an opening as high as the room', () => withRow((d) => ({ opening: { ...theDoor(d), height_m: 3 } }))],
  ['an entry of exactly 1,000 t', () => withRow((d) => ({ entry: { ...entryA(d), count: 100_000 } }))],
  ['an entry on the wall', () => withRow((d) => ({ entry: { ...entryA(d), x_m: 6 } }))],
  ['a room 2 mm away from another', () => withLoose('x', box(9.002, 0, 3, 4))],
  ['a room of exactly 0.25 m²', () => withLoose('x', box(20, 0, 0.5, 0.5))],
])('%s is within the rules', (_, document) => {
  expect(checkInvariants(document())).toEqual([]);
});

test('only the storeys asked for are looked at', () => {
  const document = withLoose('x', box(1, 1, 2, 2));
  expect(checkInvariants(document, [uid('other')])).toEqual([]);
  expect(checkInvariants(document, [GROUND])).toHaveLength(1);
});
