import pg from 'pg';
import type { Logger } from 'pino';

type Wake = () => void;

/** How soon a lost connection is tried again, ms; doubled up to the last. */
const FIRST_RETRY_ms = 200;
const LAST_RETRY_ms = 5000;

/**
 * Tells who watches a survey that it has moved on, whichever process took the change. Notices carry the survey and its
 * sequence only; watchers read the feed, so a notice lost with a connection costs nothing: after a reconnect everybody
 * is woken once.
 */
export class SurveyFeed {
  private readonly url: string;
  private readonly log: Logger;
  private readonly watchers = new Map<string, Set<Wake>>();
  private client: pg.Client | null = null;
  private retry: NodeJS.Timeout | null = null;
  private closed = false;

  constructor(url: string, log: Logger) {
    this.url = url;
    this.log = log;
  }

  /** Listens, now or as soon as the database answers. */
  async open(): Promise<void> {
    await this.connect(FIRST_RETRY_ms);
  }

  /** @returns how to stop watching */
  watch(surveyId: string, wake: Wake): () => void {
    const watching = this.watchers.get(surveyId) ?? new Set<Wake>();
    this.watchers.set(surveyId, watching.add(wake));
    return () => {
      watching.delete(wake);
      if (watching.size === 0 && this.watchers.get(surveyId) === watching) this.watchers.delete(surveyId);
    };
  }

  async close(): Promise<void> {
    this.closed = true;
    if (this.retry !== null) clearTimeout(this.retry);
    const { client } = this;
    this.client = null;
    if (client !== null) await client.end();
  }

  private async connect(nextRetry_ms: number): Promise<void> {
    const client = new pg.Client({
      connectionString: this.url,
      connectionTimeoutMillis: 3000,
      keepAlive: true,
      application_name: 'embertally feed',
    });
    let lost = false;
    const again = (error: unknown): void => {
      if (lost || this.closed) return;
      lost = true;
      if (this.client === client) this.client = null;
      this.log.warn({ err: error }, 'the feed lost the database and tries again');
      this.retry = setTimeout(() => void this.connect(Math.min(nextRetry_ms * 2, LAST_RETRY_ms)), nextRetry_ms);
    };
    client.on('error', again);
    client.on('end', () => again(new Error('the connection ended')));
    client.on('notification', ({ payload }) => this.wake(payload?.split(' ')[0] ?? ''));
    try {
      await client.connect();
      await client.query('LISTEN survey_change');
    } catch (error) {
      again(error);
      return;
    }
    if (this.closed) {
      await client.end();
      return;
    }
    this.client = client;
    // What was said while nobody listened is in the feed: let everybody look.
    for (const surveyId of [...this.watchers.keys()]) this.wake(surveyId);
  }

  private wake(surveyId: string): void {
    for (const wake of [...(this.watchers.get(surveyId) ?? [])]) wake();
  }
}
