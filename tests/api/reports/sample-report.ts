import { kindByKey } from '@embertally/shared/catalogue/kinds';
import { materialByKey } from '@embertally/shared/catalogue/materials';
import { addStorey } from '@embertally/shared/survey/commands/add-storey';
import { editRoom } from '@embertally/shared/survey/commands/edit-room';
import { newEntryFromKind } from '@embertally/shared/survey/new-entry';
import { newStorey } from '@embertally/shared/survey/new-storey';
import { toStored } from '@embertally/shared/survey/stored';
import type { Entry, Room, SurveyDocument } from '@embertally/shared/survey/survey-document';
import type { ReportInput, ReportLimit } from '../../../api/src/reports/report-input.ts';
import {
  box,
  door,
  groundFloor,
  ran,
  uid,
  wallBetween,
  withEntries,
  withOpening,
  withRoom,
} from '../../support/survey-builder.ts';

type Corner = readonly [number, number];

export const LOFT = uid('loft');
const CONCRETE: Room['lining'] = {
  walls: { key: 'brick' },
  ceiling: { key: 'concrete' },
  floor: { key: 'concrete' },
};

/** An entry of a kind of the catalogue, `count` pieces on a footprint that is given or the kind's own. */
export function kept(kind: string, room: string, x_m: number, y_m: number, more: Partial<Entry> = {}): Entry {
  const row = kindByKey(kind);
  if (row === undefined) throw new Error(`no kind ${kind}`);
  const id = uid(`${room}.${kind}.${x_m}.${y_m}`);
  const place = { id, room_id: uid(room), x_m, y_m, recorded_by: 'Ines Marlow', recorded_at: '2026-11-30T09:00:00Z' };
  return { ...newEntryFromKind(row, materialByKey, place), evidence: 'counted', ...more };
}

function opening(document: SurveyDocument, name: string, a: Corner, b: Corner, offset_m: number, more: object = {}) {
  return withOpening(document, door(wallBetween(document, a, b), offset_m, { id: uid(name), ...more }));
}

/** A store of two storeys with seven rooms: every band, every standing, openings of every kind, one room left empty. */
export function sampleDocument(): SurveyDocument {
  let doc = groundFloor({ wall_thickness_m: 0.2, height_m: 3.6, north_deg: 20 });
  const room = (name: string, x: number, y: number, width: number, depth: number, more: Partial<Room> = {}) => {
    doc = withRoom(doc, name, box(x, y, width, depth), { room: { lining: CONCRETE, rating_min: 60, ...more } });
  };
  room('Scenery dock', 0, 10, 12, 8, { use: 'theatre' });
  room('Paint shop', 12, 13, 6, 5, { use: 'paint-shop' });
  room('Workshop', 12, 6, 6, 7, { use: 'workshop' });
  room('Loading bay', 0, 6, 7, 4, { use: 'loading-bay' });
  room('Corridor', 7, 8.5, 5, 1.5, { use: 'corridor' });
  room('Archive', 12, 0, 6, 6, { use: 'archive' });
  doc = opening(doc, 'dock-gate', [0, 10], [0, 18], 2, { kind: 'shutter', width_m: 3, height_m: 2.8, state: 'open' });
  doc = opening(doc, 'dock-door', [7, 10], [12, 10], 1, { state: 'open', width_m: 1.2 });
  doc = opening(doc, 'paint-window', [18, 13], [18, 18], 1.5, {
    kind: 'window',
    state: 'fails',
    sill_m: 0.9,
    width_m: 2,
  });
  doc = opening(doc, 'paint-door', [12, 13], [12, 18], 1, { state: 'closed' });
  doc = opening(doc, 'shop-window', [18, 6], [18, 13], 2, { kind: 'window', state: 'fails', sill_m: 0.9, width_m: 3 });
  doc = opening(doc, 'shop-door', [12, 6], [12, 8.5], 0.6, { state: 'open' });
  doc = opening(doc, 'bay-gap', [0, 6], [0, 10], 1, { kind: 'gap', state: 'open', width_m: 2, height_m: 2.4 });
  doc = opening(doc, 'archive-vent', [18, 0], [18, 6], 2, { kind: 'vent', state: 'open', sill_m: 2.4, height_m: 0.4 });
  const stack = { width_m: 1.2, depth_m: 0.8, height_m: 1.2 };
  doc = withEntries(
    doc,
    kept('timber-flat', 'Scenery dock', 2, 16.6, {
      count: 40,
      width_m: 2.4,
      depth_m: 1.2,
      height_m: 2.4,
      peak_kW: 2500,
    }),
    kept('pallet-stack', 'Scenery dock', 5.4, 16.8, { count: 2, ...stack }),
    kept('pallet-stack', 'Scenery dock', 7.2, 16.8, { count: 2, ...stack }),
    kept('foam-blocks', 'Scenery dock', 10, 16.4, { width_m: 2, depth_m: 1.6, evidence: 'estimated' }),
    kept('rostrum', 'Scenery dock', 2, 12, { count: 24, width_m: 2, depth_m: 2 }),
    kept('stage-drape', 'Scenery dock', 8, 12.5, {
      count: 4,
      width_m: 3,
      depth_m: 0.6,
      rotation_deg: 20,
      evidence: 'weighed',
    }),
    kept('solvent-paint-shelf', 'Paint shop', 13.2, 17.4, { count: 3, width_m: 2, depth_m: 0.5 }),
    kept('flammables-cabinet', 'Paint shop', 16.8, 17.4, { width_m: 1, depth_m: 0.6 }),
    kept('timber-rack', 'Workshop', 14, 11, { count: 3, width_m: 3, depth_m: 0.8 }),
    kept('workbench', 'Workshop', 15, 8, { count: 2 }),
    kept('sawdust-bin', 'Workshop', 17, 6.8, { evidence: 'hearsay' }),
    kept('shrink-wrapped-pallet', 'Loading bay', 1.4, 7, { keeping: 'passing' }),
    kept('shrink-wrapped-pallet', 'Loading bay', 3.2, 7, { keeping: 'passing' }),
    ...[0.9, 2.1, 3.3, 4.5].map((x) =>
      kept('archive-shelving', 'Archive', 12 + x, 3, { count: 7, width_m: 0.6, depth_m: 4.6, height_m: 2.2 }),
    ),
  );
  doc = ran(doc, addStorey, { storey: newStorey({ id: LOFT, name: 'Loft', level_m: 3.8, height_m: 2.6 }) });
  doc = withRoom(doc, 'Prop loft', box(0, 0, 10, 7), { storey_id: LOFT, room: { use: 'storage' } });
  doc = withEntries(
    doc,
    kept('upholstered-chair', 'Prop loft', 2, 2, { count: 30, width_m: 3, depth_m: 3 }),
    kept('mattress-foam', 'Prop loft', 6, 2, { count: 12, width_m: 2, depth_m: 1 }),
  );
  return ran(doc, editRoom, { room_id: uid('Prop loft'), patch: { notes: 'Reached by the stair of the corridor.' } });
}

function limit(room: string, more: Partial<ReportLimit>): ReportLimit {
  return {
    room_id: uid(room),
    quantity: 'load_per_floor_MJ_m2',
    bound: 900,
    source: 'permit',
    set_by: 'Harbourwell Fire Office, permit 12/7',
    since: '2026-03-01',
    ...more,
  };
}

export function sampleInput(document: SurveyDocument = sampleDocument(), more: Partial<ReportInput> = {}): ReportInput {
  return {
    kind: 'survey-report',
    room_id: null,
    site: 'Saltmarsh Lane Store',
    building: 'Main building',
    made_by: 'Ines Marlow',
    made_at: '2026-12-01T14:32:00Z',
    time_zone: 'Europe/London',
    units: 'SI',
    document: { ...toStored(document), sequence: 14 },
    limits: [
      limit('Scenery dock', { bound: 420 }),
      limit('Paint shop', { bound: 250, source: 'policy', set_by: 'Merrow Mutual, clause 4.2' }),
      limit('Workshop', { bound: 5000, quantity: 'load_total_MJ', source: 'house-rule', set_by: 'Tom Reed' }),
      limit('Archive', { bound: 4000 }),
    ],
    ...more,
  };
}
