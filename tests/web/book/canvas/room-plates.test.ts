import { sceneOf } from '@embertally/web/src/book/interaction/scene.ts';
import { RoomPlates, type PlateAsked } from '@embertally/web/src/book/canvas/room-plates.ts';
import type { SurveyDocument } from '@embertally/shared/survey/survey-document';
import { expect, test } from 'vitest';
import { box, crate, groundFloor, uid, withEntries, withRoom } from '../../../support/survey-builder.ts';

/** Every letter seven pixels wide. */
const measure = (words: string) => words.length * 7;

function asked(document: SurveyDocument, pxPerM: number): readonly PlateAsked[] {
  const [storeyId] = document.storeys.keys();
  const scene = storeyId === undefined ? null : sceneOf(document, storeyId);
  if (scene === null) throw new Error('no storey');
  return scene.rooms.map((shape) => ({
    shape,
    entries: scene.entries.filter((entry) => entry.room_id === shape.room.id),
    text: { name: shape.room.name, figure: '612 MJ/m²', standing: 'near' },
    pxPerM,
    wallWidth_px: 4,
    settled: true,
    measure,
  }));
}

const hall = withRoom(groundFloor(), 'hall', box(0, 0, 8, 6));
const closet = withRoom(hall, 'closet', box(8, 0, 2, 2));

test('no room is ever left without its name, however small it is on screen', () => {
  for (const pxPerM of [80, 40, 20, 12]) {
    const plates = new RoomPlates(true).place(asked(closet, pxPerM));
    expect(plates.map(({ roomId }) => roomId).toSorted()).toEqual([uid('closet'), uid('hall')].toSorted());
    for (const { lines } of plates) expect(lines.map(({ words }) => words).join(' ')).toContain('near');
  }
});

test('a plate beside the storey has a line that ends in its room, clear of what stands there', () => {
  const full = withEntries(closet, crate('shelf', 'closet', 9, 1, { width_m: 0.6, depth_m: 0.6 }));
  const beside = new RoomPlates(true).place(asked(full, 20)).find(({ roomId }) => roomId === uid('closet'));
  expect(beside?.centre.y_m).not.toBeCloseTo(1, 0);
  const end = beside?.leadsTo;
  expect(end?.x_m).toBeGreaterThan(8);
  expect(end?.x_m).toBeLessThan(10);
  expect(end?.y_m).toBeGreaterThan(0);
  expect(end?.y_m).toBeLessThan(2);
  const shelf = full.entries.get(uid('shelf'));
  const clear =
    Math.abs((end?.x_m ?? 9) - 9) > (shelf?.width_m ?? 0) / 2 ||
    Math.abs((end?.y_m ?? 1) - 1) > (shelf?.depth_m ?? 0) / 2;
  expect(clear).toBe(true);
});

test('while the zoom moves plates stay where they are', () => {
  const plates = new RoomPlates(true);
  const before = plates.place(asked(closet, 20));
  const moving = asked(closet, 33).map((one) => ({ ...one, settled: false }));
  expect(plates.place(moving)).toBe(before);
  expect(plates.shown).toBe(before);
  expect(plates.place(asked(closet, 80))).not.toBe(before);
});
