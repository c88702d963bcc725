import { randomUUID } from 'node:crypto';
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import type { Change } from '@embertally/shared/survey/change';
import type { SurveyDocument } from '@embertally/shared/survey/survey-document';
import { newOpening } from '@embertally/shared/survey/new-opening';
import {
  box,
  cornerAt,
  crate,
  groundFloor,
  uid,
  wallBetween,
  withEntries,
  withRoom,
} from '../../support/survey-builder.ts';
import { TestApp, creating, type TestBook, type TestPerson } from '../../support/test-app.ts';

let app: TestApp;
let manager: TestPerson;
let inspector: TestPerson;
let book: TestBook;
let drawn: SurveyDocument;

beforeAll(async () => {
  app = await TestApp.open();
  manager = await app.person('Mara Quill');
  inspector = await app.person('Ines Farrow', 'Fire Office');
});
afterAll(() => app.close());

/** Two rooms side by side sharing a wall, a crate in the first. */
beforeEach(async () => {
  book = await app.book(manager);
  await app.give(manager, book.siteId, inspector, 'inspector');
  const floor = groundFloor({ id: book.storeyId });
  const on = { storey_id: book.storeyId };
  drawn = withEntries(
    withRoom(withRoom(floor, 'dock', box(0, 0, 6, 4), on), 'loft', box(6, 0, 4, 4), on),
    crate('crate', 'dock', 2, 2),
  );
  await app.change(manager, book.surveyId, creating(drawn, [book.storeyId]));
});

interface Sent {
  id?: string;
  changes: readonly Change[] | readonly object[];
  label?: string;
}
const send = (person: TestPerson, { id = randomUUID(), changes, label = 'test' }: Sent, surveyId = book.surveyId) =>
  person.visitor.post(`/api/surveys/${surveyId}/change-sets`, { id, label, changes });
const edit = (kind: Change['kind'], id: string, before: object, after: object): Change =>
  ({ kind, id, before, after }) as Change;
const rows = async (table: string, id: string): Promise<Record<string, unknown> | undefined> => {
  const found = await app.owner.query<Record<string, unknown>>(
    `SELECT * FROM "${table}" WHERE survey_id = $1 AND id = $2`,
    [book.surveyId, id],
  );
  return found.rows[0];
};
const sequence = async (): Promise<number> =>
  (await app.owner.query<{ sequence: number }>('SELECT sequence FROM survey WHERE id = $1', [book.surveyId])).rows[0]
    ?.sequence ?? -1;

describe('two people on one entry', () => {
  it('both keep what they did when they touched different fields', async () => {
    await send(manager, { changes: [edit('entry', uid('crate'), { count: 1 }, { count: 5 })] }).expect(201);
    const second = await send(inspector, {
      changes: [edit('entry', uid('crate'), { note: '' }, { note: 'damp' })],
    }).expect(201);
    expect(second.body).toMatchObject({ sequence: 3 });
    expect(await rows('entry', uid('crate'))).toMatchObject({ count: 5, note: 'damp', version: 3 });
  });

  it('are told of each other when they touched the same field: both values, who and when, nothing applied', async () => {
    await send(manager, { changes: [edit('entry', uid('crate'), { count: 1 }, { count: 5 })] }).expect(201);
    const answer = await send(inspector, {
      changes: [
        edit('entry', uid('crate'), { count: 1 }, { count: 9 }),
        edit('room', uid('dock'), { notes: '' }, { notes: 'not to be kept' }),
      ],
    }).expect(409);
    expect(answer.headers['content-type']).toContain('application/problem+json');
    expect((answer.body as { clashes: object[] }).clashes).toEqual([
      expect.objectContaining({
        reason: 'field',
        kind: 'entry',
        id: uid('crate'),
        field: 'count',
        base: 1,
        theirs: 5,
        mine: 9,
        by: 'Mara Quill',
        at: expect.stringMatching(/^\d{4}-\d\d-\d\dT.*Z$/) as string,
      }),
    ]);
    expect(await rows('room', uid('dock'))).toMatchObject({ notes: '' });
    expect(await sequence()).toBe(2);
  });

  it('agree silently when both typed the same', async () => {
    const change = edit('entry', uid('crate'), { count: 1 }, { count: 5 });
    await send(manager, { changes: [change] }).expect(201);
    await send(inspector, { changes: [change] }).expect(201);
    expect(await rows('entry', uid('crate'))).toMatchObject({ count: 5 });
  });

  it('clash when one deletes what the other edited, in either order', async () => {
    const whole = { ...drawn.entries.get(uid('crate')) };
    await send(manager, { changes: [edit('entry', uid('crate'), { count: 1 }, { count: 5 })] }).expect(201);
    const late = await send(inspector, {
      changes: [{ kind: 'entry', id: uid('crate'), before: whole, after: null }],
    }).expect(409);
    expect(late.body).toMatchObject({ clashes: [{ reason: 'edited', id: uid('crate'), by: 'Mara Quill' }] });
    await send(inspector, {
      changes: [{ kind: 'entry', id: uid('crate'), before: { ...whole, count: 5 }, after: null }],
    }).expect(201);
    const gone = await send(manager, { changes: [edit('entry', uid('crate'), { count: 5 }, { count: 6 })] }).expect(
      409,
    );
    expect(gone.body).toMatchObject({ clashes: [{ reason: 'gone', id: uid('crate'), by: 'Ines Farrow' }] });
  });
});

describe('two people on one plan', () => {
  it('clash when each is right alone and both together are not', async () => {
    const wall = wallBetween(drawn, [6, 0], [6, 4]);
    const opening = (id: string) => newOpening({ id, storey_id: book.storeyId, kind: 'door', wall, offset_m: 1 });
    await send(manager, {
      changes: [{ kind: 'opening', id: uid('d1'), before: null, after: { ...opening(uid('d1')) } }],
    }).expect(201);
    const answer = await send(inspector, {
      changes: [{ kind: 'opening', id: uid('d2'), before: null, after: { ...opening(uid('d2')) } }],
    }).expect(409);
    expect(answer.body).toMatchObject({ clashes: [{ reason: 'geometry', kind: 'opening' }] });
    expect(await rows('opening', uid('d2'))).toBeUndefined();
  });

  it('cannot leave an entry outside its room by moving a wall past it', async () => {
    const [a, b] = [cornerAt(drawn, 6, 0), cornerAt(drawn, 6, 4)];
    const answer = await send(inspector, {
      changes: [a, b].map((id) => edit('corner', id, { x_m: 6 }, { x_m: 1 })),
    }).expect(409);
    expect(answer.body).toMatchObject({ clashes: [{ reason: 'geometry', kind: 'entry' }] });
    expect(await rows('corner', a)).toMatchObject({ x_m: 6 });
  });

  it('makes every summary the wall bounds stale and computes them again', async () => {
    await app.house.services.summaries.settled();
    const [a, b] = [cornerAt(drawn, 6, 0), cornerAt(drawn, 6, 4)];
    await send(inspector, { changes: [a, b].map((id) => edit('corner', id, { x_m: 6 }, { x_m: 5 })) }).expect(201);
    await app.house.services.summaries.settled();
    const answer = await inspector.visitor.get(`/api/surveys/${book.surveyId}/room-summaries`).expect(200);
    expect((answer.body as { items: object[] }).items).toEqual([
      expect.objectContaining({ name: 'dock', floor_area_m2: 20, stale: false }),
      expect.objectContaining({ name: 'loft', floor_area_m2: 20, stale: false }),
    ]);
  });
});

describe('the id of a change set', () => {
  const change = edit('entry', uid('crate'), { count: 1 }, { count: 5 });

  it('gets the stored answer when the same is sent again, even after others moved on', async () => {
    const id = randomUUID();
    const first = await send(manager, { id, changes: [change] }).expect(201);
    await send(inspector, { changes: [edit('entry', uid('crate'), { count: 5 }, { count: 7 })] }).expect(201);
    const again = await send(manager, { id, changes: [change] }).expect(201);
    expect(again.body).toEqual(first.body);
    expect(await rows('entry', uid('crate'))).toMatchObject({ count: 7 });
    expect(await sequence()).toBe(3);
  });

  it('has one effect when sent several times at once', async () => {
    const id = randomUUID();
    const answers = await Promise.all(Array.from({ length: 6 }, () => send(manager, { id, changes: [change] })));
    expect(answers.map((answer) => answer.status)).toEqual([201, 201, 201, 201, 201, 201]);
    expect(new Set(answers.map((answer) => JSON.stringify(answer.body))).size).toBe(1);
    expect(await sequence()).toBe(2);
  });

  it('is refused with another body', async () => {
    const id = randomUUID();
    await send(manager, { id, changes: [change] }).expect(201);
    const answer = await send(manager, {
      id,
      changes: [edit('entry', uid('crate'), { count: 5 }, { count: 6 })],
    }).expect(422);
    expect(answer.body).toMatchObject({ errors: [{ pointer: '/id', code: 'CHANGE_SET_ID_USED' }] });
    expect(await rows('entry', uid('crate'))).toMatchObject({ count: 5 });
  });

  it('is refused when another survey has it', async () => {
    const id = randomUUID();
    await send(manager, { id, changes: [change] }).expect(201);
    const other = await app.book(manager);
    await send(manager, { id, changes: [change] }, other.surveyId).expect(422);
  });
});

describe('bad input', () => {
  const entry = (more: object) => [
    { kind: 'entry', id: uid('bad'), before: null, after: { ...crate('bad', 'dock', 1, 1), ...more } },
  ];
  const part = crate('bad', 'dock', 1, 1).parts[0];

  it.each([
    ['a negative mass', entry({ parts: [{ ...part, mass_kg: -5 }] }), '/changes/0/after/parts/0/mass_kg'],
    ['a mass over 1,000 t', entry({ parts: [{ ...part, mass_kg: 1_000_001 }] }), '/changes/0/after/parts/0/mass_kg'],
    ['text for a number', entry({ count: 'NaN' }), '/changes/0/after/count'],
    ['a label of 10,000 characters', entry({ label: 'x'.repeat(10_000) }), '/changes/0/after/label'],
    ['an unknown field', entry({ owner: 'me' }), '/changes/0/after'],
    ['an id that differs from its change', entry({ id: uid('other') }), '/changes/0/after/id'],
    ['NUL in a label', entry({ label: 'a\0b' }), '/changes/0/after/label'],
    ['half a surrogate pair', entry({ label: 'a\ud800b' }), '/changes/0/after/label'],
    ['an unknown kind', [{ kind: 'person', id: uid('bad'), before: null, after: {} }], '/changes/0/kind'],
    ['neither before nor after', [{ kind: 'entry', id: uid('crate'), before: null, after: null }], '/changes/0'],
    ['nothing', [], '/changes'],
  ])('%s: 422 at its place, and nothing is lost', async (_name, changes, pointer) => {
    const answer = await send(manager, { changes }).expect(422);
    expect((answer.body as { errors: { pointer: string }[] }).errors.map((error) => error.pointer)).toContain(pointer);
    expect(await rows('entry', uid('bad'))).toBeUndefined();
    expect(await sequence()).toBe(1);
  });

  it('lists every fault, not the first', async () => {
    const answer = await send(manager, { changes: entry({ count: -1, width_m: 0, label: '' }) }).expect(422);
    expect((answer.body as { errors: object[] }).errors.length).toBeGreaterThanOrEqual(3);
  });

  it.each([
    ['in a room that is not there', { room_id: uid('nowhere') }],
    ['outside its room', { x_m: 50 }],
    ['in a room of another survey', { room_id: uid('elsewhere') }],
  ])('an entry %s is a clash with a sentence', async (_name, more) => {
    const answer = await send(manager, { changes: entry(more) }).expect(409);
    expect((answer.body as { clashes: { message: string }[] }).clashes[0]?.message).toMatch(/\.$/);
    expect(await rows('entry', uid('bad'))).toBeUndefined();
  });

  it('rooms that overlap are a clash that names both', async () => {
    const over = withRoom(groundFloor({ id: book.storeyId }), 'over', box(1, 1, 3, 2), { storey_id: book.storeyId });
    const answer = await send(manager, { changes: creating(over, [book.storeyId]) }).expect(409);
    const message = (answer.body as { clashes: { message: string }[] }).clashes[0]?.message ?? '';
    expect(message).toContain('dock');
    expect(message).toContain('over');
  });

  it('names in any script and with emoji come back as they were', async () => {
    for (const label of ['🔥 stage “left”', 'ארגז תפאורה', 'cafe\u0301', 'a\u202eb', '<img src=x onerror=alert(1)>']) {
      const id = randomUUID();
      await send(manager, {
        changes: [{ kind: 'entry', id, before: null, after: { ...crate('n', 'dock', 1, 1), id, label } }],
      }).expect(201);
      expect(await rows('entry', id)).toMatchObject({ label });
    }
  });

  it('takes 2,000 changes at once and no more', async () => {
    const many = (count: number) =>
      Array.from({ length: count }, () => {
        const id = randomUUID();
        return { kind: 'entry', id, before: null, after: { ...crate('n', 'dock', 1, 1), id } };
      });
    const slim = Array.from({ length: 2001 }, (_, index) =>
      edit('entry', randomUUID(), { count: index }, { count: 1 }),
    );
    await send(manager, { changes: slim }).expect(422);
    await send(manager, { changes: many(2000) }).expect(201);
    const found = await app.owner.query('SELECT 1 FROM entry WHERE survey_id = $1', [book.surveyId]);
    expect(found.rowCount).toBe(2001);
  });

  it('refuses more than 2 MB as too large', async () => {
    const id = randomUUID();
    const note = 'n'.repeat(2 * 1024 * 1024);
    await send(manager, {
      changes: [{ kind: 'entry', id, before: null, after: { ...crate('n', 'dock', 1, 1), id, note } }],
    }).expect(413);
  });
});

describe('many people at once', () => {
  it('lose nothing: 20 writers, 10 sets each, every acknowledged one is there once and in sequence', async () => {
    const writers = Array.from({ length: 20 }, (_, writer) => (writer % 2 === 0 ? manager : inspector));
    const acknowledged = await Promise.all(
      writers.map(async (writer) => {
        const got: { id: string; sequence: number }[] = [];
        for (let set = 0; set < 10; set += 1) {
          const id = randomUUID();
          const after = { ...crate('n', 'dock', 1, 1), id };
          const answer = await send(writer, { id, changes: [{ kind: 'entry', id, before: null, after }] });
          if (answer.status === 201) got.push(answer.body as { id: string; sequence: number });
        }
        return got;
      }),
    );
    const all = acknowledged.flat();
    expect(all).toHaveLength(200);
    const fed = await app.owner.query<{ id: string; sequence: number }>(
      'SELECT id, sequence FROM change_set WHERE survey_id = $1 AND sequence > 1 ORDER BY sequence',
      [book.surveyId],
    );
    expect(fed.rows.map((row) => row.sequence)).toEqual(Array.from({ length: 200 }, (_, index) => index + 2));
    expect(new Map(fed.rows.map((row) => [row.id, row.sequence]))).toEqual(
      new Map(all.map((row) => [row.id, row.sequence])),
    );
    const kept = await app.owner.query('SELECT 1 FROM entry WHERE survey_id = $1', [book.surveyId]);
    expect(kept.rowCount).toBe(201);
  }, 60_000);
});

describe('deleting', () => {
  it('a room takes its entries and unused corners along and keeps the neighbour’s', async () => {
    const row = (kind: Change['kind'], id: string, value: object | undefined): object => ({
      kind,
      id,
      before: { ...value },
      after: null,
    });
    const gone = [cornerAt(drawn, 0, 0), cornerAt(drawn, 0, 4)];
    await send(manager, {
      changes: [
        row('entry', uid('crate'), drawn.entries.get(uid('crate'))),
        row('room', uid('dock'), drawn.rooms.get(uid('dock'))),
        ...gone.map((id) => row('corner', id, drawn.corners.get(id))),
      ],
    }).expect(201);
    const document = await manager.visitor.get(`/api/surveys/${book.surveyId}/document`).expect(200);
    expect(document.body).toMatchObject({ rooms: [{ name: 'loft' }], entries: [] });
    expect((document.body as { corners: object[] }).corners).toHaveLength(4);
    const summaries = await manager.visitor.get(`/api/surveys/${book.surveyId}/room-summaries`).expect(200);
    expect((summaries.body as { items: object[] }).items).toHaveLength(1);
  });

  it('a room without its entries is refused: nobody’s entry goes silently', async () => {
    const gone = [cornerAt(drawn, 0, 0), cornerAt(drawn, 0, 4)];
    const row = (kind: Change['kind'], id: string, value: object | undefined): object => ({
      kind,
      id,
      before: { ...value },
      after: null,
    });
    await send(manager, {
      changes: [
        row('room', uid('dock'), drawn.rooms.get(uid('dock'))),
        ...gone.map((id) => row('corner', id, drawn.corners.get(id))),
      ],
    }).expect(409);
    expect(await rows('entry', uid('crate'))).toBeDefined();
  });

  it('a storey that still has rooms is refused', async () => {
    const storey = drawn.storeys.get(book.storeyId);
    await send(manager, {
      changes: [{ kind: 'storey', id: book.storeyId, before: { ...storey }, after: null }],
    }).expect(409);
    expect(await rows('storey', book.storeyId)).toBeDefined();
  });
});
