import { randomUUID } from 'node:crypto';
import { afterAll, beforeAll, expect, it } from 'vitest';
import { dataSource } from '../../../api/src/data-source.ts';
import { migrate } from '../../../api/src/migrate.ts';
import { ALL_MIGRATIONS } from '../../../api/src/migrations/all-migrations.ts';
import { OwnMaterialWorkings1764676800000 } from '../../../api/src/migrations/own-material-workings.ts';
import { formulaDraft } from '../../support/sample-drafts.ts';
import { TestApp } from '../../support/test-app.ts';

let app: TestApp;
beforeAll(async () => {
  app = await TestApp.open();
});
afterAll(() => app.close());

it('versions made before say the same after, and are kept as well as before', async () => {
  const author = await app.person();
  const id = randomUUID();
  const path = `/api/own-materials/${id}/versions/1`;
  await author.visitor.post('/api/own-materials', { id, draft: formulaDraft(), evidence: [] }).expect(201);
  await author.visitor.send('put', `${path}/state`, { state: 'put-forward' }).set('If-Match', '"v1"').expect(200);
  const before = (await author.visitor.get(path).expect(200)).body as object;
  const change = (): Promise<unknown> => app.owner.query(`UPDATE own_material_version SET derived = '{}'`);

  const source = dataSource({ url: app.database.ownerUrl, poolSize: 1 });
  await source.initialize();
  const since = ALL_MIGRATIONS.indexOf(OwnMaterialWorkings1764676800000);
  for (const _ of ALL_MIGRATIONS.slice(since)) await source.undoLastMigration({ transaction: 'each' });
  await source.destroy();
  const old = await app.owner.query<{ derived: object }>('SELECT derived FROM own_material_version');
  expect(old.rows[0]?.derived).toEqual((before as { derived: object }).derived);
  await expect(change()).rejects.toThrow(/never changed/);

  await migrate(app.database.ownerUrl);
  expect((await author.visitor.get(path).expect(200)).body).toEqual(before);
  await expect(change()).rejects.toThrow(/never changed/);
}, 60_000);
