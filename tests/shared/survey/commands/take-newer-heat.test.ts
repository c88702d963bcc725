import { newEntryFromMaterial } from '@embertally/shared/survey/new-entry';
import { takeNewerHeat } from '@embertally/shared/survey/commands/take-newer-heat';
import type { PlaceableMaterial } from '@embertally/shared/catalogue/placeable-material';
import { searchCatalogue } from '@embertally/shared/catalogue/search-catalogue';
import { roomInput } from '@embertally/shared/survey/room-input';
import { estimateRoom } from '@embertally/shared/tally/estimate-room';
import { heatsInForce } from '@embertally/shared/survey/newer-heat';
import { applyChanges } from '@embertally/shared/survey/apply-changes';
import { invertChanges } from '@embertally/shared/survey/invert-changes';
import { expect, test } from 'vitest';
import { box, crate, done, groundFloor, ran, uid, withEntries, withRoom } from '../../../support/survey-builder.ts';

const CANVAS = uid('canvas');

const canvas = (version: number, net: number, more: Partial<PlaceableMaterial> = {}): PlaceableMaterial => ({
  key: CANVAS,
  label: 'Painted canvas',
  synonyms: ['backcloth'],
  group: 'textiles',
  net_heat_MJ_kg: net,
  low_MJ_kg: net - 1,
  high_MJ_kg: net + 1,
  cellulosic: true,
  soot_yield: null,
  co_yield: null,
  radiative_fraction: 0.3,
  ignition_class: 'easy',
  source: { title: 'Report 12', locator: 'page 3', fromMemory: false },
  own: { version, heat_source: `version ${version} of the laboratory`, curve: null },
  ...more,
});

const PLACE = { id: uid('a'), room_id: uid('dock'), x_m: 1, y_m: 1, recorded_by: null, recorded_at: null };
const plan = withEntries(
  withRoom(groundFloor(), 'dock', box(0, 0, 6, 4)),
  newEntryFromMaterial(canvas(1, 16.3), 100, PLACE),
  crate('b', 'dock', 3, 1),
);
const partOf = (document: typeof plan, word: string) => document.entries.get(uid(word))?.parts[0];

test('placing an own material copies its heat, range, source and version', () => {
  expect(partOf(plan, 'a')).toMatchObject({
    material: CANVAS,
    material_version: 1,
    net_heat_MJ_kg: 16.3,
    low_MJ_kg: 15.3,
    high_MJ_kg: 17.3,
    heat_source: 'version 1 of the laboratory',
    moisture_pct: null,
  });
});

test('a measured curve comes with what is placed: of one piece as it is, of a surface by the area that faces up', () => {
  const points = [
    [0, 0],
    [60, 250],
    [120, 0],
  ] as const;
  for (const per of ['piece', 'm2'] as const) {
    const own = { version: 1, heat_source: 'measured', curve: { per, points } };
    const entry = newEntryFromMaterial(canvas(1, 16.3, { own }), 100, PLACE);
    // A heap of one material starts as one piece of one metre by one metre.
    expect(entry.width_m * entry.depth_m * entry.count).toBe(1);
    expect(entry.curve).toEqual(points);
  }
});

test('the newer heat is taken where the version is older, in one step that can be taken back', () => {
  const inForce = [...heatsInForce([canvas(2, 17.1)]).values()];
  const outcome = done(plan, takeNewerHeat, { entry_ids: [uid('a'), uid('b')], newer: inForce });
  const after = applyChanges(plan, outcome.changes);
  expect(partOf(after, 'a')).toMatchObject({
    material_version: 2,
    net_heat_MJ_kg: 17.1,
    low_MJ_kg: 16.1,
    high_MJ_kg: 18.1,
    heat_source: 'version 2 of the laboratory',
    mass_kg: 100,
    label: 'Painted canvas',
  });
  expect(after.entries.get(uid('b'))).toBe(plan.entries.get(uid('b')));
  expect(partOf(applyChanges(after, invertChanges(outcome.changes)), 'a')).toEqual(partOf(plan, 'a'));
});

test.each([
  ['the same version', [canvas(1, 99)]],
  ['an older version', [canvas(0, 99)]],
  ['another material', [canvas(5, 99, { key: uid('else') })]],
  ['a built-in material', [canvas(5, 99, { own: null })]],
  ['nothing', []],
])('%s is no newer heat', (_, materials) => {
  const newer = [...heatsInForce(materials).values()];
  expect(takeNewerHeat(plan, { entry_ids: [uid('a')], newer })).toMatchObject({ code: 'HEAT_NOT_NEWER' });
});

test('an entry that is gone is refused by name, and none is changed', () => {
  const newer = [...heatsInForce([canvas(2, 17.1)]).values()];
  expect(takeNewerHeat(plan, { entry_ids: [uid('a'), uid('gone')], newer })).toMatchObject({
    code: 'ENTRY_GONE',
    ids: [uid('gone')],
  });
});

test('twice taken is once taken', () => {
  const input = { entry_ids: [uid('a')], newer: [...heatsInForce([canvas(2, 17.1)]).values()] };
  const once = ran(plan, takeNewerHeat, input);
  expect(takeNewerHeat(once, input)).toMatchObject({ refused: true, code: 'HEAT_NOT_NEWER' });
});

test('own materials are found beside the built-in ones, and before them at the same rank', () => {
  const own = [canvas(1, 16.3), canvas(1, 18, { key: uid('paper'), label: 'Paper', synonyms: [] })];
  expect(searchCatalogue('backcl', { own }).map(({ row }) => row.key)).toEqual([CANVAS]);
  expect(searchCatalogue('paper', { own })[0]?.row.key).toBe(uid('paper'));
  expect(searchCatalogue('backcl')).toEqual([]);
});

test('an own plastic burns as one: its combustion factor and yields come along, and with a newer version', () => {
  const film = canvas(1, 43, { cellulosic: false, soot_yield: 0.06, co_yield: 0.024 });
  const document = withEntries(
    withRoom(groundFloor(), 'dock', box(0, 0, 6, 4)),
    newEntryFromMaterial(film, 100, PLACE),
  );
  const tally = estimateRoom(roomInput(document, uid('dock'), []), { spread: false });
  // EN 1991-1-2 E.3: 0.8 is for mainly cellulosic goods only.
  expect(tally.load.combustionFactor.value).toBe(1);
  // C V/(10 · 8700 y_s) with C 3 for what reflects light: hand sum from the room's volume.
  const volume = tally.room.volume.value ?? Number.NaN;
  expect(tally.air.massForVisibility10m?.value).toBeCloseTo((3 * volume) / (10 * 8700 * 0.06), 9);
  const newer = heatsInForce([canvas(2, 44, { cellulosic: false, soot_yield: 0.05 })]);
  const after = ran(document, takeNewerHeat, { entry_ids: [uid('a')], newer: [...newer.values()] });
  expect(partOf(after, 'a')).toMatchObject({ cellulosic: false, soot_yield: 0.05, material_version: 2 });
  expect(partOf(after, 'a')).not.toHaveProperty('co_yield');
});
