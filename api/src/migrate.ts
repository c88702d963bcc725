import pg from 'pg';
import { dataSource } from './data-source.ts';
import { JOB_SCHEMA, migrateJobs } from './jobs/job-schema.ts';

/** Any two processes that migrate the same database take turns on this lock. */
const MIGRATION_LOCK = 7_315_503_200;

/**
 * Brings a database to the present schema: tables, job tables, rights of the role the API runs with. Doing it again
 * changes nothing; a second process waits for the first.
 * @param url connection of the role that owns the tables
 */
export async function migrate(url: string): Promise<void> {
  const lock = new pg.Client({ connectionString: url, application_name: 'embertally migration' });
  await lock.connect();
  try {
    await lock.query('SELECT pg_advisory_lock($1)', [MIGRATION_LOCK]);
    const database = dataSource({ url, poolSize: 1 });
    await database.initialize();
    try {
      await database.runMigrations({ transaction: 'each' });
    } finally {
      await database.destroy();
    }
    await migrateJobs(url);
    await giveRights(lock);
  } finally {
    // Ending the connection gives the lock back.
    await lock.end();
  }
}

/** What `embertally_app` may do, stated as a whole after every migration; a server with one role only needs none. */
async function giveRights(owner: pg.Client): Promise<void> {
  const known = await owner.query("SELECT 1 FROM pg_roles WHERE rolname = 'embertally_app'");
  const me = await owner.query<{ me: string }>('SELECT current_user AS me');
  if (known.rowCount === 0 || me.rows[0]?.me === 'embertally_app') return;
  for (const schema of ['public', JOB_SCHEMA]) {
    await owner.query(`GRANT USAGE ON SCHEMA ${schema} TO embertally_app`);
    await owner.query(`GRANT SELECT, INSERT, UPDATE, DELETE ON ALL TABLES IN SCHEMA ${schema} TO embertally_app`);
    await owner.query(`GRANT EXECUTE ON ALL FUNCTIONS IN SCHEMA ${schema} TO embertally_app`);
  }
  await owner.query('REVOKE UPDATE, DELETE, TRUNCATE ON audit_event FROM embertally_app');
  await owner.query('REVOKE INSERT, UPDATE, DELETE ON migration FROM embertally_app');
}
