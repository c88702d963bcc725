import PgBoss from 'pg-boss';
import type { Logger } from 'pino';
import { JOB_SCHEMA } from './job-schema.ts';
import type { JobQueue } from './job-queues.ts';
import type { Jobs } from './jobs.ts';

const POLL_s = 0.5;
const FIRST_RETRY_ms = 500;
const LAST_RETRY_ms = 10_000;

type Handle = (job: { readonly id: string; readonly data: unknown }) => Promise<void>;

/**
 * Jobs kept in PostgreSQL; the only file that knows the job library. When the database is away at the start, workers
 * begin as soon as it is back.
 */
export class DatabaseJobs implements Jobs {
  private readonly boss: PgBoss;
  private readonly log: Logger;
  private readonly handlers: [JobQueue, Handle][] = [];
  private started = false;
  private closed = false;
  private retry: NodeJS.Timeout | null = null;

  constructor(url: string, log: Logger) {
    this.log = log;
    this.boss = new PgBoss({
      connectionString: url,
      schema: JOB_SCHEMA,
      migrate: false,
      schedule: false,
      supervise: true,
      max: 3,
      application_name: 'embertally jobs',
    });
    this.boss.on('error', (error) => this.log.error({ err: error }, 'jobs'));
  }

  readonly open = (): Promise<void> => this.start(FIRST_RETRY_ms);

  readonly send = async (queue: JobQueue, id: string, data: object): Promise<void> => {
    await this.boss.send(queue, data, { id });
  };

  readonly work = async (queue: JobQueue, handle: Handle): Promise<void> => {
    this.handlers.push([queue, handle]);
    if (this.started) await this.begin(queue, handle);
  };

  readonly close = async (): Promise<void> => {
    this.closed = true;
    if (this.retry !== null) clearTimeout(this.retry);
    if (this.started) await this.boss.stop({ graceful: true, wait: true, timeout: 10_000 });
  };

  private async start(nextRetry_ms: number): Promise<void> {
    try {
      await this.boss.start();
      this.started = true;
      for (const [queue, handle] of this.handlers) await this.begin(queue, handle);
    } catch (error) {
      if (this.closed) return;
      this.log.warn({ err: error }, 'jobs cannot be taken yet; trying again');
      this.retry = setTimeout(() => void this.start(Math.min(nextRetry_ms * 2, LAST_RETRY_ms)), nextRetry_ms);
    }
  }

  private async begin(queue: JobQueue, handle: Handle): Promise<void> {
    await this.boss.work<unknown>(queue, { pollingIntervalSeconds: POLL_s, batchSize: 1 }, async (jobs) => {
      for (const job of jobs) await handle({ id: job.id, data: job.data });
    });
  }
}
