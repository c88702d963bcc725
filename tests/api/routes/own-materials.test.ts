import { randomUUID } from 'node:crypto';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { StoredFile } from '@embertally/shared/contracts/files';
import type { OwnMaterial, OwnMaterialSummary, OwnMaterialVersion } from '@embertally/shared/contracts/own-materials';
import type { MaterialDraft } from '@embertally/shared/materials/material-draft';
import { compositionDraft, formulaDraft, supplierDraft } from '../../support/sample-drafts.ts';
import { samplePdf } from '../../support/sample-files.ts';
import { TestApp, type TestPerson } from '../../support/test-app.ts';

let app: TestApp;
let author: TestPerson;
let second: TestPerson;
let stranger: TestPerson;
beforeAll(async () => {
  app = await TestApp.open();
  const admin = await app.person('Adda Lowe', 'Quayside Works');
  author = await app.colleague(admin, 'member', 'Mara Quill');
  second = await app.colleague(admin, 'member', 'Tobin Reed');
  stranger = await app.person('Stranger', 'Elsewhere');
  admins.push(admin);
});
afterAll(() => app.close());
const admins: TestPerson[] = [];

const BASE = '/api/own-materials';
const tagOf = ({ tag }: { tag: number }): string => `"v${tag}"`;

async function drafted(draft: MaterialDraft = supplierDraft(), evidence: string[] = []): Promise<OwnMaterialVersion> {
  const body = { id: randomUUID(), draft, evidence };
  return (await author.visitor.post(BASE, body).expect(201)).body as OwnMaterialVersion;
}
const at = ({ material_id, version }: OwnMaterialVersion, rest = ''): string =>
  `${BASE}/${material_id}/versions/${version}${rest}`;
const move = (who: TestPerson, version: OwnMaterialVersion, body: object) =>
  who.visitor.send('put', at(version, '/state'), body).set('If-Match', tagOf(version));
const moved = async (who: TestPerson, version: OwnMaterialVersion, body: object): Promise<OwnMaterialVersion> =>
  (await move(who, version, body).expect(200)).body as OwnMaterialVersion;
async function approved(draft: MaterialDraft = supplierDraft()): Promise<OwnMaterialVersion> {
  return moved(second, await moved(author, await drafted(draft), { state: 'put-forward' }), { state: 'approved' });
}
async function next(version: OwnMaterialVersion, draft: MaterialDraft): Promise<OwnMaterialVersion> {
  const body = { id: randomUUID(), draft, evidence: [] };
  const made = await author.visitor.post(`${BASE}/${version.material_id}/versions`, body).expect(201);
  return made.body as OwnMaterialVersion;
}
const own = async (who: TestPerson): Promise<{ key: string; net_heat_MJ_kg: number; own: object }[]> =>
  ((await who.visitor.get('/api/materials?of=own').expect(200)).body as { items: [] }).items;
const actions = async (materialId: string): Promise<string[]> =>
  (
    await app.owner.query<{ action: string }>(
      `SELECT record::json->>'action' AS action FROM audit_event
       WHERE chain_kind = 'organisation' AND record::json->'object'->>'id' = $1 ORDER BY position`,
      [materialId],
    )
  ).rows.map(({ action }) => action);

describe('a material of one’s own', () => {
  it('is derived by the server, with workings and the versions of its methods', async () => {
    const version = await drafted(formulaDraft());
    // Net heat of methane 50.0 MJ/kg, gross 55.5 MJ/kg: SFPE Handbook of Fire Protection Engineering, appendix 3.
    expect(version.derived.net_MJ_kg).toBeCloseTo(50.0, 1);
    expect(version.derived.gross_MJ_kg).toBeCloseTo(55.5, 1);
    expect(version.net_MJ_kg).toBe(version.derived.net_MJ_kg);
    expect(version.derived.methods.length).toBeGreaterThan(0);
    for (const method of version.derived.methods) expect(method).toMatch(/@\d+$/);
    expect(version.derived.workings.at(-1)).toHaveProperty('sources');
    expect(version).toMatchObject({
      version: 1,
      state: 'draft',
      author: 'Mara Quill',
      mine: true,
      way: 'formula',
      tag: 1,
    });
    const read = await second.visitor.get(at(version)).expect(200).expect('ETag', '"v1"');
    expect(read.body).toMatchObject({ mine: false, draft: formulaDraft() });
  });

  it('takes no value from who sends it', async () => {
    const body = { id: randomUUID(), draft: supplierDraft(), evidence: [], derived: { net_MJ_kg: 1 } };
    await author.visitor.post(BASE, body).expect(422);
    await author.visitor
      .post(BASE, { ...body, derived: undefined, draft: { ...supplierDraft(), net_MJ_kg: 1 } })
      .expect(422);
  });

  it('sent twice is made once; the same id for something else is refused', async () => {
    const body = { id: randomUUID(), draft: supplierDraft(), evidence: [] };
    const answers = await Promise.all([1, 2, 3].map(() => author.visitor.post(BASE, body).expect(201)));
    for (const { body: made } of answers) expect(made).toEqual(answers[0]?.body);
    await author.visitor.post(BASE, { ...body, draft: supplierDraft({ heat_MJ: 21 }) }).expect(409);
    await second.visitor.post(BASE, body).expect(409);
  });

  it.each([
    ['a formula that cannot be read', formulaDraft({ formula: 'Xq9(' }), '/draft/formula'],
    ['a way nobody knows', { ...supplierDraft(), way: 'guess' }, '/draft/way'],
    ['no name', supplierDraft({ label: '' }), '/draft/label'],
    ['a heat that is text', { ...supplierDraft(), heat_MJ: '20' }, '/draft/heat_MJ'],
    ['a heat of nothing', supplierDraft({ heat_MJ: 0 }), '/draft/heat_MJ'],
    [
      'a curve that goes back in time',
      supplierDraft({
        curve: {
          per: 'piece',
          points: [
            [0, 1],
            [9, 2],
            [5, 1],
          ],
        },
      }),
      '/draft/curve/points/2',
    ],
    [
      'a curve that takes heat in',
      supplierDraft({
        curve: {
          per: 'piece',
          points: [
            [0, 1],
            [9, -2],
          ],
        },
      }),
      '/draft/curve/points/1/1',
    ],
    [
      'made of something that is not there',
      compositionDraft([{ material: 'unobtainium', version: null, mass_pct: 100 }]),
      '/draft/parts/0/material',
    ],
    [
      'made of shares that are not the whole',
      compositionDraft([{ material: 'timber', version: null, mass_pct: 60 }]),
      '/draft/parts',
    ],
  ])('of %s is refused at its field and nothing is kept', async (_name, draft, pointer) => {
    const count = async () => (await app.owner.query('SELECT 1 FROM own_material')).rowCount;
    const before = await count();
    const answer = await author.visitor.post(BASE, { id: randomUUID(), draft, evidence: [] }).expect(422);
    const { errors } = answer.body as { errors: { pointer: string; message: string }[] };
    expect(errors.map((fault) => fault.pointer)).toContain(pointer);
    for (const { message } of errors) expect(message).toMatch(/\.$/);
    expect(await count()).toBe(before);
  });

  it('with a curve without end is refused', async () => {
    const body = {
      id: randomUUID(),
      draft: supplierDraft({
        curve: {
          per: 'piece',
          points: [
            [0, 1],
            [9, 7],
          ],
        },
      }),
      evidence: [],
    };
    const endless = JSON.stringify(body).replace('[9,7]', '[9,1e999]');
    const answer = await author.visitor
      .send('post', BASE)
      .set('Content-Type', 'application/json')
      .send(endless)
      .expect(422);
    expect(answer.body).toMatchObject({ errors: [{ pointer: '/draft/curve/points/1/1' }] });
  });

  it('keeps a measured curve as it was sent and finds its heat again', async () => {
    // A triangle of 100 s and 60 kW: 3 MJ.
    const version = await drafted(
      supplierDraft({
        curve: {
          per: 'piece',
          points: [
            [0, 0],
            [50, 60],
            [100, 0],
          ],
        },
      }),
    );
    expect(version.has_curve).toBe(true);
    expect(version.derived.curve).toMatchObject({ per: 'piece', peak: 60, peak_s: 50 });
    expect(version.derived.curve?.heat_MJ).toBeCloseTo(3, 9);
  });
});

describe('a version', () => {
  it('goes from draft to use by two people, and every step is in the history of the organisation', async () => {
    const draft = await drafted();
    const changed = await author.visitor
      .send('put', at(draft), { draft: supplierDraft({ heat_MJ: 21 }), evidence: [] })
      .set('If-Match', '"v1"')
      .expect(200)
      .expect('ETag', '"v2"');
    const forward = await moved(author, changed.body as OwnMaterialVersion, { state: 'put-forward' });
    expect(forward).toMatchObject({ state: 'put-forward', net_MJ_kg: 21, decided_by: null });
    expect(await own(author)).toEqual(
      expect.not.arrayContaining([expect.objectContaining({ key: draft.material_id })]),
    );
    const inUse = await moved(second, forward, { state: 'approved' });
    expect(inUse).toMatchObject({ state: 'approved', decided_by: 'Tobin Reed', mine: false });
    const material = (await author.visitor.get(`${BASE}/${draft.material_id}`).expect(200)).body as OwnMaterial;
    expect(material).toMatchObject({ in_force: 1, versions: [{ version: 1, state: 'approved', mine: true }] });
    expect(await actions(draft.material_id)).toEqual([
      'material.drafted',
      'material.edited',
      'material.put-forward',
      'material.approved',
    ]);
  });

  it('is never approved by who wrote it, and that they tried is written down', async () => {
    const forward = await moved(author, await drafted(), { state: 'put-forward' });
    const refused = await move(author, forward, { state: 'approved' }).expect(403);
    expect(refused.body).toMatchObject({ type: '/api/docs#own-version' });
    expect((await author.visitor.get(at(forward)).expect(200)).body).toEqual(forward);
    const found = await app.owner.query(
      `SELECT 1 FROM audit_event WHERE chain_id = $1 AND record::json->>'action' = 'access.refused'
         AND record::json->'facts'->>'wanted' = 'own-version'`,
      [author.organisationId],
    );
    expect(found.rowCount).toBe(1);
  });

  it('once put forward is never changed, thrown away or put forward again', async () => {
    const forward = await moved(author, await drafted(), { state: 'put-forward' });
    const put = (tag: string) =>
      author.visitor.send('put', at(forward), { draft: supplierDraft(), evidence: [] }).set('If-Match', tag);
    await put('"v1"').expect(412);
    await put(tagOf(forward)).expect(409);
    await author.visitor.delete(at(forward), tagOf(forward)).expect(409);
    const inUse = await moved(second, forward, { state: 'approved' });
    await put(tagOf(inUse)).expect(409);
    await move(author, inUse, { state: 'put-forward' }).expect(409);
    await move(second, inUse, { state: 'returned', reason: 'late' }).expect(409);
    for (const statement of [
      `UPDATE own_material_version SET draft = '{}' WHERE material_id = $1`,
      `UPDATE own_material_version SET derived = '{}' WHERE material_id = $1`,
      `UPDATE own_material_version SET "net_MJ_kg" = 1 WHERE material_id = $1`,
      `UPDATE own_material_version SET workings = '[]' WHERE material_id = $1`,
      `UPDATE own_material_version SET state = 'draft' WHERE material_id = $1`,
      `UPDATE own_material_version SET decided_by = author_id WHERE material_id = $1`,
      `DELETE FROM own_material_version WHERE material_id = $1`,
      `DELETE FROM own_material WHERE id = $1`,
    ]) {
      await expect(app.owner.query(statement, [inUse.material_id]), statement).rejects.toThrow(
        /never|not go|only|another/,
      );
    }
  });

  it('that is returned says why; its author makes the next one', async () => {
    const forward = await moved(author, await drafted(), { state: 'put-forward' });
    await move(second, forward, { state: 'returned' }).expect(422);
    await move(second, forward, { state: 'returned', reason: '  ' }).expect(422);
    const returned = await moved(second, forward, { state: 'returned', reason: 'Sheet is for the dry cloth.' });
    expect(returned).toMatchObject({ state: 'returned', decision_reason: 'Sheet is for the dry cloth.' });
    const again = await next(returned, supplierDraft({ heat_MJ: 18 }));
    expect(again).toMatchObject({ version: 2, state: 'draft', net_MJ_kg: 18 });
  });

  it('can be taken back by its author while nobody has decided', async () => {
    const forward = await moved(author, await drafted(), { state: 'put-forward' });
    expect(await moved(author, forward, { state: 'returned', reason: 'Wrong page.' })).toMatchObject({
      state: 'returned',
    });
  });

  it('that is withdrawn is placed no longer, nor is any before it', async () => {
    const first = await approved();
    const newer = await moved(author, await next(first, supplierDraft({ heat_MJ: 22 })), { state: 'put-forward' });
    const inForce = await moved(second, newer, { state: 'approved' });
    await move(author, { ...first, tag: inForce.tag }, { state: 'withdrawn', reason: 'old' }).expect(409);
    await moved(author, inForce, { state: 'withdrawn', reason: 'The weaver called it back.' });
    const material = (await author.visitor.get(`${BASE}/${first.material_id}`).expect(200)).body as OwnMaterial;
    expect(material.in_force).toBeNull();
    expect(material.versions.map(({ state, withdrawal_reason }) => [state, withdrawal_reason])).toEqual([
      ['withdrawn', 'The weaver called it back.'],
      ['withdrawn', 'The weaver called it back.'],
    ]);
    expect((await own(author)).map(({ key }) => key)).not.toContain(first.material_id);
    const third = await moved(author, await next(inForce, supplierDraft({ heat_MJ: 23 })), { state: 'put-forward' });
    await moved(second, third, { state: 'approved' });
    expect(await own(second)).toEqual(
      expect.arrayContaining([expect.objectContaining({ key: first.material_id, net_heat_MJ_kg: 23 })]),
    );
  });

  it('is the only open one of its material', async () => {
    const first = await approved();
    const results = await Promise.all(
      [author, second].map((who) =>
        who.visitor.post(`${BASE}/${first.material_id}/versions`, {
          id: randomUUID(),
          draft: supplierDraft(),
          evidence: [],
        }),
      ),
    );
    expect(results.map(({ status }) => status).sort()).toEqual([201, 409]);
    expect(results.find(({ status }) => status === 409)?.body).toMatchObject({ type: '/api/docs#version-open' });
  });

  it('sent twice is made once, also after it was decided', async () => {
    const first = await approved();
    const body = { id: randomUUID(), draft: supplierDraft({ heat_MJ: 25 }), evidence: [] };
    const path = `${BASE}/${first.material_id}/versions`;
    const made = (await author.visitor.post(path, body).expect(201)).body as OwnMaterialVersion;
    await moved(author, made, { state: 'put-forward' });
    const again = await author.visitor.post(path, body).expect(201);
    expect(again.body).toMatchObject({ version: 2, state: 'put-forward' });
  });

  it('that is a draft is thrown away by its author or an admin; the last one takes its material with it', async () => {
    const first = await approved();
    const draft = await next(first, supplierDraft({ label: 'Other name' }));
    await second.visitor.delete(at(draft), tagOf(draft)).expect(403);
    await author.visitor.delete(at(draft), '"v1"').expect(412);
    await author.visitor.delete(at(draft)).expect(428);
    await author.visitor.delete(at(draft), tagOf(draft)).expect(204);
    const material = (await author.visitor.get(`${BASE}/${first.material_id}`).expect(200)).body as OwnMaterial;
    expect(material).toMatchObject({ label: 'Stage drape', in_force: 1 });
    expect(material.versions).toHaveLength(1);
    const alone = await drafted();
    const [admin] = admins;
    await admin?.visitor.delete(at(alone), tagOf(alone)).expect(204);
    await author.visitor.get(`${BASE}/${alone.material_id}`).expect(404);
  });

  it('is drafted by its author only', async () => {
    const draft = await drafted();
    const body = { draft: supplierDraft({ heat_MJ: 1 }), evidence: [] };
    await second.visitor.send('put', at(draft), body).set('If-Match', tagOf(draft)).expect(403);
    await move(second, draft, { state: 'put-forward' }).expect(403);
    expect((await author.visitor.get(at(draft)).expect(200)).body).toEqual(draft);
  });
});

describe('two at once', () => {
  it('approve a version once; the other is told what it is now', async () => {
    const forward = await moved(author, await drafted(), { state: 'put-forward' });
    const [admin = second] = admins;
    const results = await Promise.all([second, admin].map((who) => move(who, forward, { state: 'approved' })));
    expect(results.map(({ status }) => status).sort()).toEqual([200, 412]);
    expect(results.find(({ status }) => status === 412)?.body).toMatchObject({ current: { state: 'approved' } });
    expect((await actions(forward.material_id)).filter((action) => action === 'material.approved')).toHaveLength(1);
  });

  it('approve and return: one of them counts', async () => {
    const forward = await moved(author, await drafted(), { state: 'put-forward' });
    const results = await Promise.all([
      move(second, forward, { state: 'approved' }),
      move(author, forward, { state: 'returned', reason: 'Wait.' }),
    ]);
    expect(results.map(({ status }) => status).sort()).toEqual([200, 412]);
  });

  it('edit and put forward: what was put forward is what was read', async () => {
    const draft = await drafted();
    const [edit, forward] = await Promise.all([
      author.visitor
        .send('put', at(draft), { draft: supplierDraft({ heat_MJ: 30 }), evidence: [] })
        .set('If-Match', tagOf(draft)),
      move(author, draft, { state: 'put-forward' }),
    ]);
    expect([edit.status, forward.status].sort()).toEqual([200, 412]);
  });

  it('an answer that was lost is given again to the same person', async () => {
    const draft = await drafted();
    const forward = await moved(author, draft, { state: 'put-forward' });
    expect(await moved(author, draft, { state: 'put-forward' })).toEqual(forward);
    const inUse = await moved(second, forward, { state: 'approved' });
    expect(await moved(second, forward, { state: 'approved' })).toEqual(inUse);
    expect(await actions(draft.material_id)).toHaveLength(3);
  });
});

describe('a material made of others', () => {
  it('rests on approved versions, and keeps to the one it names', async () => {
    const drape = await approved(supplierDraft({ heat_MJ: 20 }));
    const parts = (version: number) => [
      { material: drape.material_id, version, mass_pct: 50 },
      { material: 'timber', version: null, mass_pct: 50 },
    ];
    const timber = (
      (await author.visitor.get('/api/materials').expect(200)).body as {
        items: { key: string; net_heat_MJ_kg: number }[];
      }
    ).items.find(({ key }) => key === 'timber');
    const flat = await drafted(compositionDraft(parts(1)));
    expect(flat.net_MJ_kg).toBeCloseTo((20 + (timber?.net_heat_MJ_kg ?? NaN)) / 2, 9);
    const refused = { id: randomUUID(), draft: compositionDraft(parts(2)), evidence: [] };
    await author.visitor.post(BASE, refused).expect(422);
    const newer = await next(drape, supplierDraft({ heat_MJ: 40 }));
    await author.visitor.post(BASE, refused).expect(422);
    await moved(second, await moved(author, newer, { state: 'put-forward' }), { state: 'approved' });
    expect(((await author.visitor.get(at(flat)).expect(200)).body as OwnMaterialVersion).net_MJ_kg).toBe(
      flat.net_MJ_kg,
    );
    await author.visitor.post(BASE, { ...refused, id: randomUUID() }).expect(201);
  });

  it('is not approved when one of them was withdrawn meanwhile', async () => {
    const drape = await approved();
    const draft = compositionDraft([{ material: drape.material_id, version: 1, mass_pct: 100 }]);
    const forward = await moved(author, await drafted(draft), { state: 'put-forward' });
    await moved(second, drape, { state: 'withdrawn', reason: 'Wrong cloth.' });
    const refused = await move(second, forward, { state: 'approved' }).expect(409);
    expect(refused.body).toMatchObject({ type: '/api/docs#part-withdrawn' });
    await moved(second, forward, { state: 'returned', reason: 'Its cloth was withdrawn.' });
  });

  it('is never made of another organisation’s', async () => {
    const drape = await approved();
    const draft = compositionDraft([{ material: drape.material_id, version: 1, mass_pct: 100 }]);
    await stranger.visitor.post(BASE, { id: randomUUID(), draft, evidence: [] }).expect(422);
  });
});

describe('evidence', () => {
  const sent = async (who: TestPerson): Promise<StoredFile> => {
    const path = `/api/files?id=${randomUUID()}&name=report.pdf`;
    return (await who.visitor.send('post', path).set('Content-Type', 'application/pdf').send(samplePdf()).expect(201))
      .body as StoredFile;
  };

  it('stays with its version in its order, outlives the day, and cannot be exchanged later', async () => {
    const files = [await sent(author), await sent(second)];
    const ids = files.map(({ id }) => id);
    const draft = await drafted(supplierDraft(), ids);
    expect(draft.evidence.map(({ id }) => id)).toEqual(ids);
    const turned = await author.visitor
      .send('put', at(draft), { draft: supplierDraft(), evidence: [...ids].reverse() })
      .set('If-Match', tagOf(draft))
      .expect(200);
    const forward = await moved(author, turned.body as OwnMaterialVersion, { state: 'put-forward' });
    expect(forward.evidence.map(({ id }) => id)).toEqual([...ids].reverse());
    app.clock.forward(25);
    await app.house.services.files.sweep();
    const again = await app.signedIn(author.email);
    await again.visitor.get(`/api/files/${ids[0] ?? ''}`).expect(200);
    await expect(app.owner.query('DELETE FROM own_material_evidence WHERE file_id = $1', [ids[0]])).rejects.toThrow(
      /never changed/,
    );
    author = again;
    second = await app.signedIn(second.email);
    stranger = await app.signedIn(stranger.email);
  });

  it('of another organisation, or none, is refused at its place', async () => {
    const foreign = await sent(stranger);
    const mine = await sent(author);
    for (const id of [foreign.id, randomUUID()]) {
      const body = { id: randomUUID(), draft: supplierDraft(), evidence: [mine.id, id] };
      const refused = await author.visitor.post(BASE, body).expect(422);
      expect(refused.body).toMatchObject({ errors: [{ pointer: '/evidence/1', code: 'FILE_UNKNOWN' }] });
    }
    const many = { id: randomUUID(), draft: supplierDraft(), evidence: Array.from({ length: 11 }, () => mine.id) };
    await author.visitor.post(BASE, many).expect(422);
  });
});

describe('another organisation', () => {
  it('sees nothing of it anywhere', async () => {
    const version = await approved(supplierDraft({ label: 'Secret weave' }));
    const material = `${BASE}/${version.material_id}`;
    const body = { id: randomUUID(), draft: supplierDraft(), evidence: [] };
    await stranger.visitor.get(material).expect(404);
    await stranger.visitor.get(at(version)).expect(404);
    await stranger.visitor.post(`${material}/versions`, body).expect(404);
    await stranger.visitor
      .send('put', at(version), { ...body, id: undefined })
      .set('If-Match', tagOf(version))
      .expect(404);
    await stranger.visitor.delete(at(version), tagOf(version)).expect(404);
    await move(stranger, version, { state: 'withdrawn', reason: 'x' }).expect(404);
    for (const path of [BASE, '/api/materials', '/api/materials?of=own']) {
      const { text } = await stranger.visitor.get(path).expect(200);
      expect(text).not.toContain('Secret weave');
      expect(text).not.toContain(version.material_id);
    }
  });
});

describe('the lists', () => {
  it('find by two letters and state, page by page, in the order of names', async () => {
    const maker = await app.person('Maker', 'Lists');
    for (const label of ['beta felt', 'Alpha felt', 'gamma foam', 'Ça felt', 'alpha felt']) {
      await maker.visitor.post(BASE, { id: randomUUID(), draft: supplierDraft({ label }), evidence: [] }).expect(201);
    }
    const page = async (query: string) =>
      (await maker.visitor.get(`${BASE}?${query}`).expect(200)).body as {
        items: OwnMaterialSummary[];
        next_cursor: string | null;
      };
    const names: string[] = [];
    let cursor: string | null = '';
    while (cursor !== null) {
      const found = await page(`limit=2${cursor === '' ? '' : `&cursor=${cursor}`}`);
      names.push(...found.items.map(({ label }) => label));
      cursor = found.next_cursor;
    }
    expect(names).toHaveLength(5);
    expect(names.slice(0, 2).map((name) => name.toLowerCase())).toEqual(['alpha felt', 'alpha felt']);
    expect((await page('search=fe')).items).toHaveLength(4);
    expect((await page('search=FO')).items.map(({ label }) => label)).toEqual(['gamma foam']);
    expect((await page('search=%25')).items).toEqual([]);
    expect((await page('state=draft')).items).toHaveLength(5);
    expect((await page('state=approved')).items).toEqual([]);
    await maker.visitor.get(`${BASE}?cursor=x`).expect(422);
    await maker.visitor.get(`${BASE}?state=lost`).expect(422);
  });

  it('of what may be placed holds built-in and approved materials in one shape', async () => {
    const version = await approved(
      supplierDraft({
        label: 'Backdrop',
        synonyms: ['cloth'],
        group: 'textiles',
        density_kg_m3: 300,
        curve: {
          per: 'm2',
          points: [
            [0, 0],
            [10, 50],
          ],
        },
      }),
    );
    const all = (
      (await second.visitor.get('/api/materials').expect(200)).body as { items: { key: string; own: object | null }[] }
    ).items;
    const builtIn = (
      (await second.visitor.get('/api/materials?of=built-in').expect(200)).body as { items: { own: null }[] }
    ).items;
    expect(all.length).toBe(builtIn.length + (await own(second)).length);
    expect(builtIn.every((row) => row.own === null)).toBe(true);
    expect(all.find(({ key }) => key === version.material_id)).toMatchObject({
      label: 'Backdrop',
      synonyms: ['cloth'],
      group: 'textiles',
      net_heat_MJ_kg: 20,
      bulk_density_kg_m3: { typical: 300 },
      own: {
        version: 1,
        way: 'supplier',
        approved_by: 'Tobin Reed',
        curve: {
          per: 'm2',
          points: [
            [0, 0],
            [10, 50],
          ],
        },
      },
    });
    await second.visitor.get('/api/materials?of=all').expect(422);
  });

  it('ask the database the same few times however much there is', async () => {
    const maker = await app.person('Maker', 'Counts');
    const { statements } = app.house.database;
    const query = statements.query.bind(statements);
    let asked = 0;
    statements.query = ((sql: string, values?: unknown[]) => {
      asked += 1;
      return query(sql, values as never);
    }) as typeof statements.query;
    const count = async (work: () => Promise<unknown>): Promise<number> => {
      asked = 0;
      await work();
      return asked;
    };
    const { ownMaterials, materials } = app.house.services;
    const counts = async () => [
      await count(() => ownMaterials.list(maker, {})),
      await count(() => materials.listText(maker)),
    ];
    const before = await counts();
    for (let made = 0; made < 6; made += 1) {
      await maker.visitor.post(BASE, { id: randomUUID(), draft: supplierDraft(), evidence: [] }).expect(201);
    }
    expect(await counts()).toEqual(before);
    expect(before).toEqual([1, 1]);
    statements.query = query;
  });
});
