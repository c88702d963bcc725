import { randomUUID } from 'node:crypto';
import { afterAll, beforeAll, describe, expect, it, vi } from 'vitest';
import { kindByKey } from '@embertally/shared/catalogue/kinds';
import { materialByKey } from '@embertally/shared/catalogue/materials';
import type { RoomSummary } from '@embertally/shared/contracts/surveys';
import { applyChanges } from '@embertally/shared/survey/apply-changes';
import type { Changes } from '@embertally/shared/survey/change';
import type { Command } from '@embertally/shared/survey/command';
import { addEntries } from '@embertally/shared/survey/commands/add-entries';
import { drawRoom } from '@embertally/shared/survey/commands/draw-room';
import { newEntryFromKind } from '@embertally/shared/survey/new-entry';
import { fromStored } from '@embertally/shared/survey/stored';
import { surveyDocument } from '@embertally/shared/survey/versions/v2';
import type { Entry, SurveyDocument } from '@embertally/shared/survey/survey-document';
import { TestApp, type TestBook, type TestPerson } from '../support/test-app.ts';

/**
 * Rooms put together from items whose heat somebody measured or published, recorded the way a person records them. The
 * totals the product gives must lie between the sums of the published low and high values.
 */
interface Item {
  readonly what: string;
  /** A kind of the catalogue, or the heat of a test of the person's own. */
  readonly kind?: string;
  readonly own?: { readonly mass_kg: number; readonly net_heat_MJ_kg: number };
  readonly count: number;
  /** Published heat of ONE piece, MJ. */
  readonly published_MJ: readonly [number, number];
  readonly source: string;
}

const NFPA921 = 'NFPA 921 and NBS furniture calorimeter tests, item table (from memory)';
const LAWSON = 'Lawson, Walton and Twilley 1983, NBS furniture calorimeter, wardrobes (from memory)';
const NIST_BEDS = 'NIST bed fire tests: double bed with foundation and bedding 750 to 1100 MJ (from memory)';
const FSRI = 'FSRI Materials and Products Database: overstuffed sofa 48.9 kg, 723 MJ, 15.0 MJ per kg lost';
const ARCHIVES = 'archive practice: 25 to 40 kg per m of single-sided shelf, 420 to 680 MJ per m (common practice)';

const ROOMS: readonly {
  readonly name: string;
  readonly size_m: readonly [number, number];
  readonly items: readonly Item[];
}[] = [
  {
    name: 'Bedroom',
    size_m: [4, 3.5],
    items: [
      { what: 'double bed', kind: 'double-bed', count: 1, published_MJ: [750, 1100], source: NIST_BEDS },
      {
        what: 'wardrobe, particleboard',
        kind: 'wardrobe-particleboard',
        count: 1,
        published_MJ: [1300, 1900],
        source: LAWSON,
      },
      {
        what: 'pillows',
        kind: 'pillow',
        count: 2,
        published_MJ: [4.4, 24.4],
        source: 'NIST Fire Calorimetry Database, pillows: polyester 4.4, foam 24.4 MJ',
      },
      {
        what: 'curtains',
        kind: 'curtains-cotton',
        count: 1,
        published_MJ: [25, 40],
        source: 'NBS curtain tests, pair of 1.9 kg (from memory)',
      },
    ],
  },
  {
    name: 'Living room',
    size_m: [5, 4.5],
    items: [
      {
        what: 'sofa, as tested',
        own: { mass_kg: 48.1, net_heat_MJ_kg: 15.04 },
        count: 1,
        published_MJ: [716, 731],
        source: FSRI,
      },
      { what: 'easy chairs, foam', kind: 'upholstered-chair', count: 2, published_MJ: [200, 500], source: NFPA921 },
      {
        what: 'bookcase, empty',
        kind: 'bookcase',
        count: 1,
        published_MJ: [500, 800],
        source: 'SFPE Handbook item table (from memory)',
      },
      { what: 'television', kind: 'television', count: 1, published_MJ: [150, 300], source: NFPA921 },
    ],
  },
  {
    name: 'Record office',
    size_m: [6, 4],
    items: [
      // Six shelf metres make one bay of the catalogue.
      {
        what: 'books on shelves, two bays of 6 m',
        kind: 'bookshelves',
        count: 2,
        published_MJ: [6 * 420, 6 * 680],
        source: ARCHIVES,
      },
      // A closed steel cabinet lets 0.85 of its content take part (DM 9 March 2007).
      {
        what: 'steel cabinets, full',
        kind: 'filing-cabinet',
        count: 2,
        published_MJ: [0.85 * 1500, 0.85 * 2400],
        source: 'archive practice: 90 to 140 kg of paper, 1500 to 2400 MJ (common practice)',
      },
      {
        what: 'desk with papers',
        kind: 'desk',
        count: 1,
        published_MJ: [1000, 2000],
        source: 'SFPE Handbook item table (from memory)',
      },
    ],
  },
];

describe('rooms put together from published items', () => {
  let app: TestApp;
  let inspector: TestPerson;
  let book: TestBook;
  let document: SurveyDocument;

  beforeAll(async () => {
    app = await TestApp.open();
    inspector = await app.person('Nell Farrow', 'Fire Office');
    book = await app.book(inspector);
    const answer = await inspector.visitor.get(`/api/surveys/${book.surveyId}/document`).expect(200);
    document = fromStored(surveyDocument.parse(answer.body));
  });
  afterAll(() => app.close());

  /** One gesture: the command, its change set sent as a browser sends it. */
  async function gesture<Input>(label: string, command: Command<Input>, input: Input): Promise<void> {
    const outcome = command(document, input);
    if (outcome.refused) throw new Error(outcome.message);
    const changes: Changes = outcome.changes;
    await inspector.visitor
      .post(`/api/surveys/${book.surveyId}/change-sets`, { id: randomUUID(), label, changes })
      .expect(201);
    document = applyChanges(document, changes);
  }

  function entry(room_id: string, item: Item, index: number): Entry {
    const place = {
      id: randomUUID(),
      room_id,
      x_m: 0,
      y_m: 0,
      recorded_by: inspector.name,
      recorded_at: app.clock.now().toISOString(),
    };
    const kind = kindByKey(item.kind ?? 'sofa');
    if (kind === undefined) throw new Error(`no kind ${item.kind}`);
    const made = newEntryFromKind(kind, materialByKey, place);
    const own = item.own;
    const parts =
      own === undefined
        ? made.parts
        : [
            {
              material: null,
              material_version: null,
              label: item.what,
              ...own,
              low_MJ_kg: own.net_heat_MJ_kg,
              high_MJ_kg: own.net_heat_MJ_kg,
              heat_source: item.source,
              moisture_pct: null,
            },
          ];
    const room = ROOMS.findIndex(({ items }) => items.includes(item));
    return {
      ...made,
      parts,
      label: item.what,
      count: item.count,
      width_m: 0.5,
      depth_m: 0.5,
      x_m: room * 10 + 0.6 + index * 0.7,
      y_m: 1,
    };
  }

  async function summaryOf(name: string): Promise<RoomSummary> {
    return vi.waitFor(
      async () => {
        const answer = await inspector.visitor.get(`/api/surveys/${book.surveyId}/room-summaries`).expect(200);
        const found = (answer.body as { items: RoomSummary[] }).items.find((row) => row.name === name);
        if (found === undefined || found.stale) throw new Error(`the summary of ${name} is still being computed`);
        return found;
      },
      { timeout: 10_000, interval: 50 },
    );
  }

  it.each(ROOMS.map((room, index) => [room.name, room, index] as const))(
    '%s: the total lies within the published heats',
    async (name, room, index) => {
      const room_id = randomUUID();
      const [width, depth] = room.size_m;
      const x = index * 10;
      const points = [
        [0, 0],
        [width, 0],
        [width, depth],
        [0, depth],
      ].map(([dx = 0, y_m = 0]) => ({ x_m: x + dx, y_m }));
      await gesture(`Draw ${name}`, drawRoom, {
        room_id,
        storey_id: book.storeyId,
        name,
        points,
        corner_ids: points.map(() => randomUUID()),
      });
      for (const [at, item] of room.items.entries())
        await gesture(`Record ${item.what}`, addEntries, { entries: [entry(room_id, item, at)] });

      const { load_total_MJ, load_per_floor_MJ_m2, entries } = await summaryOf(name);
      const sum = (which: 0 | 1): number =>
        room.items.reduce((total, item) => total + item.count * item.published_MJ[which], 0);
      expect(entries).toBe(room.items.length);
      expect(load_total_MJ).toBeGreaterThanOrEqual(sum(0));
      expect(load_total_MJ).toBeLessThanOrEqual(sum(1));
      // Walls have no thickness here, so the floor is the rectangle that was drawn.
      expect(load_per_floor_MJ_m2).toBeCloseTo((load_total_MJ ?? 0) / (width * depth), 6);
    },
  );
});
