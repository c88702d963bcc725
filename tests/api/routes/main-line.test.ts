import { randomUUID } from 'node:crypto';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { PASSWORD, TestApp, creating } from '../../support/test-app.ts';
import { box, crate, groundFloor, uid, withEntries, withRoom } from '../../support/survey-builder.ts';

let app: TestApp;
beforeAll(async () => {
  app = await TestApp.open();
});
afterAll(() => app.close());

describe('the main line, as the web client walks it', () => {
  it('signs up, signs in, makes a book, draws, places and reads the density', async () => {
    const visitor = app.visitor();
    const email = 'maud@tern.example';
    const signUp = { id: randomUUID(), organisation_name: 'Tern Yard', name: 'Maud Fenn', email, password: PASSWORD };
    await visitor.post('/api/organisations', signUp).expect(202, { accepted: true });
    const me = await visitor.post('/api/sessions', { email, password: PASSWORD }).expect(201);
    expect(me.body).toMatchObject({ person: { name: 'Maud Fenn', email, units: 'SI' } });

    const [siteId, buildingId, surveyId] = [randomUUID(), randomUUID(), randomUUID()];
    const site = { id: siteId, name: 'Yard', address: 'Tern Lane', time_zone: 'Europe/Paris' };
    await visitor.post('/api/sites', site).expect(201);
    const building = {
      id: buildingId,
      survey_id: surveyId,
      storey_id: uid('ground'),
      name: 'Shed',
      storey_name: 'Floor',
    };
    await visitor.post(`/api/sites/${siteId}/buildings`, building).expect(201);

    // 6 m × 4 m of floor and 10 kg at 17 MJ/kg: 170 MJ on 24 m².
    const drawn = withEntries(withRoom(groundFloor(), 'dock', box(0, 0, 6, 4)), crate('crate', 'dock', 2, 2));
    const changes = creating(drawn, [uid('ground')]);
    await visitor
      .post(`/api/surveys/${surveyId}/change-sets`, { id: randomUUID(), label: 'draw', changes })
      .expect(201);
    await app.house.services.summaries.settled();

    const summaries = await visitor.get(`/api/surveys/${surveyId}/room-summaries`).expect(200);
    expect(summaries.body).toMatchObject({
      items: [{ name: 'dock', floor_area_m2: 24, load_total_MJ: 170, entries: 1 }],
    });
    const [summary] = (summaries.body as { items: { load_per_floor_MJ_m2: number; stale: boolean }[] }).items;
    expect(summary?.load_per_floor_MJ_m2).toBeCloseTo(170 / 24, 10);
    expect(summary?.stale).toBe(false);

    const document = await visitor.get(`/api/surveys/${surveyId}/document`).expect(200).expect('ETag', '"s1"');
    expect((document.body as { entries: object[] }).entries).toEqual([drawn.entries.get(uid('crate'))]);
    await visitor.get(`/api/surveys/${surveyId}/document`).set('If-None-Match', '"s1"').expect(304);

    await visitor.delete('/api/sessions/current').expect(204);
    await visitor.get('/api/sites').expect(401);
  });
});
