import { expect, test } from 'vitest';
import { KINDS } from '@embertally/shared/catalogue/kinds';
import { materialByKey, MATERIALS } from '@embertally/shared/catalogue/materials';
import { newEntryFromKind, newEntryFromMaterial } from '@embertally/shared/survey/new-entry';
import { newRoom } from '@embertally/shared/survey/new-room';
import { newStorey } from '@embertally/shared/survey/new-storey';
import { rowFaults } from '@embertally/shared/survey/row-fault';
import { uid } from '../../support/survey-builder.ts';

const place = {
  id: uid('e'),
  room_id: uid('dock'),
  x_m: 1,
  y_m: 2,
  recorded_by: 'Inspector',
  recorded_at: '2026-03-04T05:06:07Z',
};

test('every kind of the catalogue makes an entry that fits, with the heat and source of its materials copied', () => {
  expect(KINDS.length).toBeGreaterThan(0);
  for (const kind of KINDS) {
    const entry = newEntryFromKind(kind, materialByKey, place);
    expect(rowFaults('entry', entry), kind.key).toEqual([]);
    expect(entry).toMatchObject({ kind: kind.key, label: kind.label, keeping: kind.keeping, peak_kW: kind.peak_kW });
    for (const [index, part] of entry.parts.entries()) {
      const material = materialByKey(kind.parts[index]?.material ?? '');
      expect(part.net_heat_MJ_kg).toBe(material?.net_heat_MJ_kg);
      expect(part.heat_source).toContain(material?.source.title);
    }
  }
});

test('every material of the catalogue makes an entry that fits', () => {
  for (const material of MATERIALS) {
    const entry = newEntryFromMaterial(material, 12.5, place);
    expect(rowFaults('entry', entry), material.key).toEqual([]);
    expect(entry.parts).toMatchObject([{ material: material.key, mass_kg: 12.5, low_MJ_kg: material.low_MJ_kg }]);
  }
});

test('a kind that names an unknown material is a fault of the catalogue', () => {
  const [kind] = KINDS;
  if (kind === undefined) throw new Error('no kinds');
  expect(() => newEntryFromKind(kind, () => undefined, place)).toThrow(kind.key);
});

test('a new room and storey fit, nothing is credited for protection nobody has looked at', () => {
  const room = newRoom({ id: uid('r'), storey_id: uid('s'), name: 'Dock', ring: [uid('1'), uid('2'), uid('3')] });
  expect(rowFaults('room', room)).toEqual([]);
  expect(room.protection).toMatchObject({
    sprinklers: null,
    detection: 'unknown',
    brigade: 'unknown',
    access_routes: 'unknown',
  });
  expect(room).toMatchObject({ height_m: null, use: null, holes: [] });
  const storey = newStorey({ id: uid('s'), name: 'Ground floor' });
  expect(rowFaults('storey', storey)).toEqual([]);
  expect(storey.wall_thickness_m).toBe(0);
});
