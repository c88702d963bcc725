import { randomUUID } from 'node:crypto';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { box, crate, groundFloor, uid, withEntries, withRoom } from '../../support/survey-builder.ts';
import { TestApp, creating, type TestBook, type TestPerson } from '../../support/test-app.ts';

let app: TestApp;
let manager: TestPerson;
let inspector: TestPerson;
let book: TestBook;
beforeAll(async () => {
  app = await TestApp.open();
  manager = await app.person('Mara Quill');
  inspector = await app.person('Ines Farrow', 'Fire Office');
  book = await app.book(manager);
  await app.give(manager, book.siteId, inspector, 'inspector');
  // 10 × 10 m of floor, 100 pieces of 10 kg at 17 MJ/kg: 170 MJ/m².
  const floor = groundFloor({ id: book.storeyId });
  const room = withRoom(floor, 'dock', box(0, 0, 10, 10), { storey_id: book.storeyId });
  await app.change(
    manager,
    book.surveyId,
    creating(withEntries(room, crate('crate', 'dock', 2, 2, { count: 100 })), [book.storeyId]),
  );
});
afterAll(() => app.close());

const limit = (more: object = {}) => ({
  id: randomUUID(),
  room_id: uid('dock'),
  quantity: 'load_per_floor_MJ_m2',
  bound: 200,
  source: 'permit',
  set_by: 'permit 12/7, clause 4',
  since: '2030-01-31',
  ...more,
});
const path = () => `/api/buildings/${book.buildingId}/limits`;
const standing = async (): Promise<{ standing: string; ratio: number | null }> => {
  await app.house.services.summaries.settled();
  const { body } = (await manager.visitor.get(`/api/surveys/${book.surveyId}/room-summaries`).expect(200)) as {
    body: { items: { standing: string; ratio: number | null }[] };
  };
  return body.items[0] ?? { standing: 'no room', ratio: null };
};

describe('a limit', () => {
  it('of a permit or a policy is set by an inspector, a house rule also by a manager', async () => {
    await manager.visitor.post(path(), limit()).expect(403);
    await manager.visitor.post(path(), limit({ source: 'policy' })).expect(403);
    const made = await inspector.visitor.post(path(), limit()).expect(201).expect('ETag', '"v1"');
    const { id } = made.body as { id: string };
    expect(made.body).toMatchObject({ bound: 200, entered_by: 'Ines Farrow', since: '2030-01-31', version: 1 });
    await manager.visitor.patch(`/api/limits/${id}`, { bound: 9000 }, '"v1"').expect(403);
    await manager.visitor.delete(`/api/limits/${id}`, '"v1"').expect(403);
    const own = await manager.visitor.post(path(), limit({ source: 'house-rule', bound: 500 })).expect(201);
    await manager.visitor.delete(`/api/limits/${(own.body as { id: string }).id}`, '"v1"').expect(204);
    await inspector.visitor.delete(`/api/limits/${id}`, '"v1"').expect(204);
  });

  it('decides how the room stands: within, near from 90 %, over, and none again', async () => {
    expect(await standing()).toMatchObject({ standing: 'no limit set', ratio: null });
    const made = await inspector.visitor.post(path(), limit({ bound: 200 })).expect(201);
    const { id } = made.body as { id: string };
    expect((await standing()).standing).toBe('within');
    expect((await standing()).ratio).toBeCloseTo(170 / 200, 9);
    await inspector.visitor.patch(`/api/limits/${id}`, { bound: 180 }, '"v1"').expect(200);
    expect((await standing()).standing).toBe('near');
    await inspector.visitor.patch(`/api/limits/${id}`, { bound: 160 }, '"v2"').expect(200);
    expect((await standing()).standing).toBe('over');
    const site = await manager.visitor.get(`/api/sites/${book.siteId}`).expect(200);
    expect(site.body).toMatchObject({ rooms: 1, rooms_over: 1, rooms_near: 0, building_list: [{ rooms_over: 1 }] });
    await inspector.visitor.delete(`/api/limits/${id}`, '"v3"').expect(204);
    expect(await standing()).toMatchObject({ standing: 'no limit set', ratio: null });
  });

  it('is edited from the version read; an old one gets the present limit back', async () => {
    const { id } = (await inspector.visitor.post(path(), limit()).expect(201)).body as { id: string };
    await inspector.visitor
      .patch(`/api/limits/${id}`, { set_by: 'permit 13' }, '"v1"')
      .expect(200)
      .expect('ETag', '"v2"');
    const stale = await inspector.visitor.patch(`/api/limits/${id}`, { bound: 5 }, '"v1"').expect(412);
    expect(stale.body).toMatchObject({ current: { set_by: 'permit 13', version: 2, bound: 200 } });
    await inspector.visitor.delete(`/api/limits/${id}`, '"v1"').expect(412);
    await inspector.visitor.delete(`/api/limits/${id}`).expect(428);
    await inspector.visitor.delete(`/api/limits/${id}`, '"v2"').expect(204);
    await inspector.visitor.delete(`/api/limits/${id}`, '"v2"').expect(404);
  });

  it.each([
    ['on a room that is not there', { room_id: randomUUID() }, '/room_id'],
    ['of nothing', { bound: 0 }, '/bound'],
    ['below nothing', { bound: -1 }, '/bound'],
    ['that is text', { bound: '200' }, '/bound'],
    ['on a quantity nobody computes', { quantity: 'colour' }, '/quantity'],
    ['by nobody', { set_by: ' ' }, '/set_by'],
    ['since no day', { since: '2030-02-30' }, '/since'],
  ])('%s is refused at its field', async (_name, more, pointer) => {
    const answer = await inspector.visitor.post(path(), limit(more)).expect(422);
    expect(answer.body).toMatchObject({ errors: [{ pointer }] });
  });

  it('sleeps while its room is deleted and is back when the room is', async () => {
    const other = await app.book(manager);
    const floor = groundFloor({ id: other.storeyId });
    const changes = creating(withRoom(floor, 'loft', box(0, 0, 5, 5), { storey_id: other.storeyId }), [other.storeyId]);
    await app.change(manager, other.surveyId, changes);
    const limits = `/api/buildings/${other.buildingId}/limits`;
    await manager.visitor.post(limits, limit({ room_id: uid('loft'), source: 'house-rule' })).expect(201);
    const count = async (): Promise<number> =>
      ((await manager.visitor.get(limits).expect(200)).body as { items: object[] }).items.length;
    const gone = changes.map(({ kind, id, after }) => ({ kind, id, before: after, after: null }));
    await app.change(manager, other.surveyId, gone);
    expect(await count()).toBe(0);
    await app.change(manager, other.surveyId, changes);
    expect(await count()).toBe(1);
  });
});
