import { randomBytes } from 'node:crypto';
import { chmodSync, mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import pg from 'pg';
import type { TestProject } from 'vitest/node';
import { migrate } from '../../api/src/migrate.ts';
import { ensurePostgres, serverUrl, startCluster } from '../../api/scripts/postgres.mjs';

declare module 'vitest' {
  interface ProvidedContext {
    database: { adminUrl: string; template: string; ownerUrl: string; appUrl: string };
  }
}

/**
 * One PostgreSQL for the whole run: a throw-away cluster, or the server of DATABASE_URL. A template database is migrated
 * once; every test file clones it (see `createTestDatabase`). Only the projects that touch a database run this.
 */
export async function setup(project: TestProject): Promise<() => Promise<void>> {
  const outside = process.env['DATABASE_URL'];
  const cluster = outside ? null : await throwaway();
  const adminUrl = outside ?? cluster?.adminUrl ?? '';
  const template = `embertally_test_${randomBytes(6).toString('hex')}`;
  const password = randomBytes(18).toString('base64url');

  const admin = new pg.Client({ connectionString: adminUrl });
  await admin.connect();
  const roles = await ensureRoles(admin, password, outside !== undefined);
  await admin.query(`CREATE DATABASE ${template} TEMPLATE template0 ${roles ? 'OWNER embertally_owner' : ''}`);
  await admin.end();

  const url = (user: string | null, database: string): string => {
    const made = new URL(adminUrl);
    made.pathname = `/${database}`;
    if (user !== null) {
      made.username = user;
      made.password = password;
    }
    return made.toString();
  };
  await migrate(url(roles ? 'embertally_owner' : null, template));

  project.provide('database', {
    adminUrl,
    template,
    ownerUrl: url(roles ? 'embertally_owner' : null, ''),
    appUrl: url(roles ? 'embertally_app' : null, ''),
  });

  return async () => {
    const last = new pg.Client({ connectionString: adminUrl });
    await last.connect();
    const left = await last.query<{ datname: string }>('SELECT datname FROM pg_database WHERE datname LIKE $1', [
      `${template}%`,
    ]);
    for (const { datname } of left.rows) await last.query(`DROP DATABASE IF EXISTS ${datname} WITH (FORCE)`);
    await last.end();
    cluster?.stop();
  };
}

async function throwaway(): Promise<{ adminUrl: string; stop: () => void }> {
  ensurePostgres();
  const base = mkdtempSync(join(tmpdir(), 'embertally-test-'));
  // Root starts the server as another user, who must be able to enter the folder above it.
  chmodSync(base, 0o755);
  const made = await startCluster({
    folder: join(base, 'postgres'),
    passwordFile: join(base, 'password'),
    throwaway: true,
  });
  return {
    adminUrl: serverUrl('postgres', made.password, made.port, 'postgres'),
    stop: () => {
      made.stop();
      rmSync(base, { recursive: true, force: true });
    },
  };
}

/** The two roles, when the server lets us make them; on somebody's server an existing role's password is not touched. */
async function ensureRoles(admin: pg.Client, password: string, outside: boolean): Promise<boolean> {
  const me = await admin.query<{ rolsuper: boolean }>('SELECT rolsuper FROM pg_roles WHERE rolname = current_user');
  if (me.rows[0]?.rolsuper !== true) return false;
  const known = await admin.query<{ rolname: string }>(
    "SELECT rolname FROM pg_roles WHERE rolname LIKE 'embertally\\_%'",
  );
  if (outside && known.rows.length > 0) return false;
  for (const role of ['embertally_owner', 'embertally_app']) {
    if (known.rows.some((row) => row.rolname === role)) continue;
    await admin.query(`CREATE ROLE ${role} LOGIN NOSUPERUSER NOBYPASSRLS PASSWORD ${admin.escapeLiteral(password)}`);
  }
  return true;
}
