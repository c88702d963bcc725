import pg from 'pg';
import type { ZodMiniObject } from 'zod/mini';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { rowSchemas } from '@embertally/shared/survey/row-schemas';
import { dataSource } from '../../../api/src/data-source.ts';
import { migrate } from '../../../api/src/migrate.ts';
import { ALL_MIGRATIONS } from '../../../api/src/migrations/all-migrations.ts';
import { ROW_COLUMNS } from '../../../api/src/repositories/row-columns.ts';
import { createTestDatabase, type TestDatabase } from '../../support/test-database.ts';

let database: TestDatabase;
let owner: pg.Client;
beforeAll(async () => {
  database = await createTestDatabase();
  owner = new pg.Client({ connectionString: database.ownerUrl });
  await owner.connect();
});
afterAll(async () => {
  await owner.end();
  await database.drop();
});

describe('the migrated database', () => {
  it('is what the entities say: nothing is left to change', async () => {
    const source = dataSource({ url: database.ownerUrl, poolSize: 1 });
    await source.initialize();
    try {
      const { upQueries } = await source.driver.createSchemaBuilder().log();
      expect(upQueries.map((query) => query.query)).toEqual([]);
    } finally {
      await source.destroy();
    }
  });

  it('stays as it is when migrated again, also by two at once', async () => {
    const migrations = async (): Promise<number | null> => (await owner.query('SELECT 1 FROM migration')).rowCount;
    const before = await migrations();
    await Promise.all([migrate(database.ownerUrl), migrate(database.ownerUrl)]);
    expect(await migrations()).toBe(before);
  }, 60_000);

  it('has an index in front of every foreign key', async () => {
    const unindexed = await owner.query<{ name: string }>(`
      SELECT c.conname AS name FROM pg_constraint c
      WHERE c.contype = 'f' AND c.connamespace = 'public'::regnamespace AND NOT EXISTS (
        SELECT 1 FROM pg_index i WHERE i.indrelid = c.conrelid AND i.indpred IS NULL
          AND (i.indkey::int2[])[0:array_length(c.conkey, 1) - 1] @> c.conkey)`);
    expect(unindexed.rows.map((row) => row.name)).toEqual([]);
  });

  it('states what happens to a row when the one it refers to goes', async () => {
    const silent = await owner.query<{ name: string }>(
      "SELECT conname AS name FROM pg_constraint WHERE contype = 'f' AND connamespace = 'public'::regnamespace AND confdeltype = 'a'",
    );
    expect(silent.rows.map((row) => row.name)).toEqual([]);
  });

  it.each(Object.keys(rowSchemas) as (keyof typeof rowSchemas)[])('has a column for every field of a %s', (kind) => {
    const schema = rowSchemas[kind] as unknown as ZodMiniObject;
    expect(Object.keys(ROW_COLUMNS[kind]).sort()).toEqual(Object.keys(schema.shape).sort());
  });

  it('goes down to nothing and up again', async () => {
    const other = await createTestDatabase();
    const source = dataSource({ url: other.ownerUrl, poolSize: 1 });
    await source.initialize();
    for (const _ of ALL_MIGRATIONS) await source.undoLastMigration({ transaction: 'each' });
    const left = await source.query<{ tablename: string }[]>(
      "SELECT tablename FROM pg_tables WHERE schemaname = 'public'",
    );
    expect(left.map((row) => row.tablename)).toEqual(['migration']);
    await source.destroy();
    await migrate(other.ownerUrl);
    await other.drop();
  }, 60_000);
});

describe('history in the database', () => {
  it('cannot be changed or deleted, not even by the owner, and the API’s role may not try', async () => {
    await owner.query(
      "INSERT INTO audit_event (chain_kind, chain_id, position, record, hash) VALUES ('site', gen_random_uuid(), 1, '{}', 'x')",
    );
    for (const statement of [
      "UPDATE audit_event SET record = '{1}'",
      'DELETE FROM audit_event',
      'TRUNCATE audit_event',
    ]) {
      await expect(owner.query(statement), statement).rejects.toThrow(/never changed or deleted/);
    }
    if (database.appUrl === database.ownerUrl) return;
    const app = new pg.Client({ connectionString: database.appUrl });
    await app.connect();
    for (const statement of [
      "UPDATE audit_event SET record = '{1}'",
      'DELETE FROM audit_event',
      'CREATE TABLE mine (id int)',
    ]) {
      await expect(app.query(statement), statement).rejects.toThrow(/permission denied/);
    }
    await app.end();
  });
});
