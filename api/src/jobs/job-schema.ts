import PgBoss from 'pg-boss';
import { JOB_QUEUES } from './job-queues.ts';

/** The schema in which the job library keeps its tables. */
export const JOB_SCHEMA = 'job';

/**
 * Makes or upgrades the tables of the job library and the queues; needs the owner's rights. Part of the migration.
 * @param url the owner's connection
 */
export async function migrateJobs(url: string): Promise<void> {
  const boss = new PgBoss({
    connectionString: url,
    schema: JOB_SCHEMA,
    supervise: false,
    schedule: false,
    max: 2,
    application_name: 'embertally migration',
  });
  const faults: Error[] = [];
  boss.on('error', (error) => faults.push(error));
  await boss.start();
  try {
    for (const queue of JOB_QUEUES) {
      if ((await boss.getQueue(queue.name)) === null) await boss.createQueue(queue.name, queue);
    }
  } finally {
    await boss.stop({ graceful: false, wait: true });
  }
  if (faults.length > 0) throw new AggregateError(faults, 'The job tables could not be made.');
}
