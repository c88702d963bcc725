import { randomBytes } from 'node:crypto';
import pg from 'pg';
import { inject } from 'vitest';

export interface TestDatabase {
  /** For migrations and for looking at rows from outside. */
  readonly ownerUrl: string;
  /** What the API runs with: no rights to change history. */
  readonly appUrl: string;
  readonly drop: () => Promise<void>;
}

async function asAdmin(statement: string): Promise<void> {
  const admin = new pg.Client({ connectionString: inject('database').adminUrl });
  await admin.connect();
  try {
    await admin.query(statement);
  } finally {
    await admin.end();
  }
}

/** A database of a test file's own, cloned from the migrated template. */
export async function createTestDatabase(): Promise<TestDatabase> {
  const { template, ownerUrl, appUrl } = inject('database');
  const name = `${template}_${randomBytes(4).toString('hex')}`;
  const owner = new URL(ownerUrl);
  const app = new URL(appUrl);
  await asAdmin(
    `CREATE DATABASE ${name} TEMPLATE ${template}${owner.username === 'embertally_owner' ? ' OWNER embertally_owner' : ''}`,
  );
  owner.pathname = `/${name}`;
  app.pathname = `/${name}`;
  return {
    ownerUrl: owner.toString(),
    appUrl: app.toString(),
    drop: () => asAdmin(`DROP DATABASE IF EXISTS ${name} WITH (FORCE)`),
  };
}
