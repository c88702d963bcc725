import { randomUUID } from 'node:crypto';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { TestApp, type TestBook, type TestPerson } from '../../support/test-app.ts';

let app: TestApp;
let manager: TestPerson;
let book: TestBook;
beforeAll(async () => {
  app = await TestApp.open();
  manager = await app.person('Mara Quill', 'Tern Yard');
  book = await app.book(manager);
});
afterAll(() => app.close());

const newSite = (more: object = {}) => ({
  id: randomUUID(),
  name: 'Quay',
  address: '',
  time_zone: 'Europe/London',
  ...more,
});

describe('making a site', () => {
  it('makes its maker manager, in the keeper organisation', async () => {
    const site = newSite({ name: 'North Quay' });
    const answer = await manager.visitor.post('/api/sites', site).expect(201).expect('ETag', '"v1"');
    expect(answer.body).toMatchObject({
      name: 'North Quay',
      my_role: 'manager',
      of_keeper: true,
      keeper: { name: 'Tern Yard' },
      people: [{ name: 'Mara Quill', role: 'manager' }],
      building_list: [],
    });
  });

  it('sent again gets the stored answer; another body or another person is a conflict', async () => {
    const site = newSite();
    const first = await manager.visitor.post('/api/sites', site).expect(201);
    const again = await manager.visitor.post('/api/sites', site).expect(201);
    expect(again.body).toEqual(first.body);
    await manager.visitor.post('/api/sites', { ...site, name: 'Other' }).expect(409);
    const other = await app.person();
    await other.visitor.post('/api/sites', site).expect(409);
  });

  it('sent twice at once makes one', async () => {
    const site = newSite();
    const answers = await Promise.all([1, 2, 3].map(() => manager.visitor.post('/api/sites', site)));
    expect(answers.map((answer) => answer.status)).toEqual([201, 201, 201]);
  });

  it.each([
    ['no name', { name: '  ' }, '/name'],
    ['a time zone nobody knows', { time_zone: 'Mars/Olympus' }, '/time_zone'],
    ['a field of the server', { version: 7 }, '/version'],
    ['an organisation', { organisation_id: randomUUID() }, '/organisation_id'],
  ])('with %s is refused at its field', async (_name, more, pointer) => {
    const answer = await manager.visitor.post('/api/sites', newSite(more)).expect(422);
    expect(answer.body).toMatchObject({ errors: [{ pointer }] });
  });
});

describe('editing a site', () => {
  it('needs the version it builds on and says what there is now when that is old', async () => {
    const site = newSite();
    await manager.visitor.post('/api/sites', site).expect(201);
    const path = `/api/sites/${site.id}`;
    await manager.visitor.patch(path, { name: 'A' }).expect(428);
    await manager.visitor.patch(path, { name: 'A' }, '"v1"').expect(200).expect('ETag', '"v2"');
    const stale = await manager.visitor.patch(path, { name: 'B' }, '"v1"').expect(412);
    expect(stale.body).toMatchObject({ current: { name: 'A', version: 2 } });
    await manager.visitor.patch(path, { name: 'B' }, 'W/"v2"').expect(412);
    await manager.visitor.patch(path, { name: 'B' }, '*').expect(428);
    await manager.visitor.patch(path, { name: 'B', my_role: 'viewer' }, '"v2"').expect(422);
  });

  it('from one version by two at once lets one through', async () => {
    const site = newSite();
    await manager.visitor.post('/api/sites', site).expect(201);
    const answers = await Promise.all(
      ['A', 'B', 'C', 'D'].map((name) => manager.visitor.patch(`/api/sites/${site.id}`, { name }, '"v1"')),
    );
    expect(answers.map((answer) => answer.status).sort()).toEqual([200, 412, 412, 412]);
  });
});

describe('the list of sites', () => {
  it('is paged by name without gaps or repeats, and searched as typed', async () => {
    const person = await app.person();
    const names = ['Beta', 'alpha', 'Gamma', 'alpha', '100% wool', 'under_score', 'Émile'];
    for (const name of names) await person.visitor.post('/api/sites', newSite({ name })).expect(201);
    const seen: string[] = [];
    let cursor = '';
    for (let page = 0; page < 10; page += 1) {
      const query = cursor === '' ? '' : `&cursor=${cursor}`;
      const { body } = (await person.visitor.get(`/api/sites?limit=2${query}`).expect(200)) as {
        body: { items: { name: string }[]; next_cursor: string | null };
      };
      seen.push(...body.items.map((item) => item.name));
      if (body.next_cursor === null) break;
      cursor = body.next_cursor;
    }
    expect([...seen].sort()).toEqual([...names].sort());
    const found = async (search: string): Promise<string[]> => {
      const { body } = (await person.visitor.get(`/api/sites?search=${encodeURIComponent(search)}`).expect(200)) as {
        body: { items: { name: string }[] };
      };
      return body.items.map((item) => item.name);
    };
    expect(await found('%')).toEqual(['100% wool']);
    expect(await found('_')).toEqual(['under_score']);
    expect(await found('GAM')).toEqual(['Gamma']);
    expect(await found("'; drop table site;--")).toEqual([]);
  });

  it('refuses a place in the list that was never handed out', async () => {
    for (const cursor of ['x', 'W10', Buffer.from('["a","b"]').toString('base64url')]) {
      await manager.visitor.get(`/api/sites?cursor=${cursor}`).expect(422);
    }
    await manager.visitor.get('/api/sites?sort=id').expect(422);
    await manager.visitor.get('/api/sites?limit=1000').expect(422);
  });

  it('asks the database as often for many sites as for one', async () => {
    const person = await app.person();
    const counted = async (): Promise<number> => {
      const asked: string[] = [];
      const { statements } = app.house.database;
      const query = statements.query.bind(statements);
      statements.query = ((sql: string, values?: unknown[]) => {
        asked.push(sql);
        return query(sql, values as never);
      }) as typeof statements.query;
      await person.visitor.get('/api/sites').expect(200);
      statements.query = query;
      return asked.length;
    };
    await app.book(person);
    const one = await counted();
    for (let site = 0; site < 5; site += 1) await app.book(person);
    expect(await counted()).toBe(one);
    expect(one).toBeLessThanOrEqual(4);
  });
});

describe('roles on a site', () => {
  it('are given to people of any organisation, one at a time each', async () => {
    const guest = await app.person('Gus Holm', 'Harbour Office');
    const path = `/api/sites/${book.siteId}/roles`;
    const body = { id: randomUUID(), email: guest.email.toUpperCase(), role: 'viewer' };
    const given = await manager.visitor.post(path, body).expect(201);
    expect(given.body).toMatchObject({
      id: body.id,
      name: 'Gus Holm',
      organisation_name: 'Harbour Office',
      role: 'viewer',
    });
    await guest.visitor.get(`/api/sites/${book.siteId}`).expect(200);
    await manager.visitor.post(path, { id: randomUUID(), email: guest.email, role: 'inspector' }).expect(201);
    const site = (await guest.visitor.get(`/api/sites/${book.siteId}`).expect(200)) as {
      body: { people: { name: string; role: string }[] };
    };
    expect(site.body.people.filter((person) => person.name === 'Gus Holm')).toEqual([
      expect.objectContaining({ role: 'inspector' }),
    ]);
  });

  it('for an address nobody has are refused at the field', async () => {
    const answer = await manager.visitor
      .post(`/api/sites/${book.siteId}/roles`, { id: randomUUID(), email: 'nobody@nowhere.example', role: 'viewer' })
      .expect(422);
    expect(answer.body).toMatchObject({ errors: [{ pointer: '/email', code: 'PERSON_UNKNOWN' }] });
  });

  it('keep a manager of the keeper: the last one can neither go nor be lowered, also not by two at once', async () => {
    const first = await app.person('First', 'Two Masters');
    const second = await app.colleague(first, 'member', 'Second');
    const { siteId } = await app.book(first);
    const roles = `/api/sites/${siteId}/roles`;
    const own =
      ((await first.visitor.get(`/api/sites/${siteId}`)) as { body: { people: { id: string }[] } }).body.people[0]
        ?.id ?? '';
    await first.visitor.delete(`${roles}/${own}`).expect(409);
    await first.visitor.post(roles, { id: randomUUID(), email: first.email, role: 'viewer' }).expect(409);
    // A manager from elsewhere cannot give roles, so does not count.
    const guest = await app.person('Guest', 'Elsewhere');
    await app.give(first, siteId, guest, 'manager');
    await first.visitor.delete(`${roles}/${own}`).expect(409);
    const other = await app.give(first, siteId, second, 'manager');
    const answers = await Promise.all([
      first.visitor.delete(`${roles}/${other}`),
      second.visitor.delete(`${roles}/${own}`),
    ]);
    const [through, kept] = answers.map((answer) => answer.status).sort();
    expect(through).toBe(204);
    // Whoever comes second is the last manager, or, when their own role went before they were let in, a stranger.
    expect([404, 409]).toContain(kept);
  });

  it('of another site cannot be taken through this one', async () => {
    const other = await app.book(manager);
    const roleId = await app.give(manager, other.siteId, await app.person(), 'viewer');
    await manager.visitor.delete(`/api/sites/${book.siteId}/roles/${roleId}`).expect(404);
  });
});

describe('a building', () => {
  it('is made with its working survey and first storey, once', async () => {
    const body = {
      id: randomUUID(),
      survey_id: randomUUID(),
      storey_id: randomUUID(),
      name: 'Annex',
      storey_name: 'Ground floor',
    };
    const path = `/api/sites/${book.siteId}/buildings`;
    const made = await manager.visitor.post(path, body).expect(201);
    expect(made.body).toMatchObject({ id: body.id, survey_id: body.survey_id, storeys: 1, rooms: 0 });
    expect((await manager.visitor.post(path, body).expect(201)).body).toEqual(made.body);
    await manager.visitor.post(path, { ...body, id: randomUUID() }).expect(409);
    const document = await manager.visitor
      .get(`/api/surveys/${body.survey_id}/document`)
      .expect(200)
      .expect('ETag', '"s0"');
    expect(document.body).toMatchObject({
      sequence: 0,
      storeys: [{ id: body.storey_id, name: 'Ground floor', height_m: 3 }],
    });
    const survey = await manager.visitor.get(`/api/surveys/${body.survey_id}`).expect(200);
    expect(survey.body).toMatchObject({
      kind: 'working',
      building: { name: 'Annex' },
      my_role: 'manager',
      of_keeper: true,
    });
  });

  it('is renamed from the version read', async () => {
    const path = `/api/buildings/${book.buildingId}`;
    await manager.visitor.patch(path, { name: 'Shed' }, '"v1"').expect(200).expect('ETag', '"v2"');
    const stale = await manager.visitor.patch(path, { name: 'Barn' }, '"v1"').expect(412);
    expect(stale.body).toMatchObject({ current: { name: 'Shed' } });
  });
});
