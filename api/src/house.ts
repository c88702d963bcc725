import type { Express } from 'express';
import { join } from 'node:path';
import type { Logger } from 'pino';
import { Database } from './repositories/database.ts';
import { createApp } from './app.ts';
import { PasswordHashes } from './auth/password-hashes.ts';
import { Sessions } from './auth/sessions.ts';
import { systemClock, type Clock } from './clock.ts';
import { dataSource } from './data-source.ts';
import type { Env } from './env.ts';
import { EstimateThreads, type EstimateThreadsOptions } from './estimates/estimate-threads.ts';
import { SurveyFeed } from './events/survey-feed.ts';
import { FolderFileStore } from './files/folder-file-store.ts';
import { SurveyEvents } from './http/survey-events.ts';
import { DatabaseJobs } from './jobs/database-jobs.ts';
import { makeReportInWorker } from './reports/make-report-in-worker.ts';
import type { ReportMaker } from './services/report-maker.ts';
import { services, type Services } from './services/services.ts';

const HOUSEKEEPING_ms = 10 * 60 * 1000;
const RETRY_ms = 1000;

export interface HouseOptions {
  readonly clock?: Clock;
  readonly makeReport?: ReportMaker;
  readonly estimates?: EstimateThreadsOptions;
  /** Time between heartbeats of event streams, ms. */
  readonly heartbeat_ms?: number;
}

/** One process of the product: its connections, services and app, opened and closed together. */
export class House {
  readonly app: Express;
  readonly services: Services;
  readonly database: Database;
  private readonly feed: SurveyFeed;
  private readonly jobs: DatabaseJobs;
  private readonly events: SurveyEvents;
  private readonly sessions: Sessions;
  private readonly estimates: EstimateThreads;
  private readonly log: Logger;
  private housekeeping: NodeJS.Timeout | null = null;
  private retry: NodeJS.Timeout | null = null;
  private closed = false;

  constructor(env: Env, log: Logger, options: HouseOptions = {}) {
    const clock = options.clock ?? systemClock;
    this.log = log;
    this.database = new Database(dataSource({ url: env.databaseUrl, poolSize: env.databasePool }));
    this.sessions = new Sessions(this.database, clock);
    this.feed = new SurveyFeed(env.databaseUrl, log);
    this.jobs = new DatabaseJobs(env.databaseUrl, log);
    this.estimates = new EstimateThreads(options.estimates);
    this.services = services({
      database: this.database,
      clock,
      log,
      sessions: this.sessions,
      hashes: new PasswordHashes({ memory_KiB: env.hashMemory_KiB, passes: env.hashPasses }),
      files: new FolderFileStore(join(env.dataDir, 'files')),
      fileQuota_bytes: env.filesPerOrganisation_bytes,
      jobs: this.jobs,
      makeReport: options.makeReport ?? makeReportInWorker,
      makeEstimate: (task, signal) => this.estimates.make(task, signal),
    });
    this.events = new SurveyEvents({
      feed: this.feed,
      surveys: this.services.surveys,
      sessions: this.sessions,
      access: this.services.access,
      log,
      ...(options.heartbeat_ms === undefined ? {} : { heartbeat_ms: options.heartbeat_ms }),
    });
    this.app = createApp({
      services: this.services,
      sessions: this.sessions,
      events: this.events,
      clock,
      log,
      baseUrl: env.baseUrl,
      trustProxy: env.trustProxy,
      webDist: env.webDist,
      checkAnswers: env.mode !== 'production',
    });
  }

  /** Connects; a database that is away is waited for in the background and answered 503 meanwhile. */
  async open(): Promise<void> {
    await this.connect();
    this.housekeeping = setInterval(() => void this.tidy(), HOUSEKEEPING_ms);
    this.housekeeping.unref();
  }

  /** Ends event streams, so that open connections drain. */
  endStreams(): void {
    this.events.close();
  }

  /** Finishes what is running and closes every connection. */
  async close(): Promise<void> {
    this.closed = true;
    if (this.housekeeping !== null) clearInterval(this.housekeeping);
    if (this.retry !== null) clearTimeout(this.retry);
    this.events.close();
    await this.estimates.close();
    await this.jobs.close();
    await this.services.summaries.stop();
    await this.feed.close();
    await this.database.close();
  }

  private async connect(): Promise<void> {
    try {
      await this.database.open();
    } catch (error) {
      if (this.closed) return;
      this.log.error({ err: error }, 'the database does not answer; trying again');
      this.retry = setTimeout(() => void this.connect(), RETRY_ms);
      return;
    }
    await this.feed.open();
    await this.services.exports.work();
    await this.jobs.open();
    await this.services.summaries
      .sweep()
      .catch((error: unknown) => this.log.error({ err: error }, 'stale summaries were not taken up'));
  }

  private async tidy(): Promise<void> {
    try {
      await this.sessions.removeExpired();
      await this.services.throttle.forgetOld();
      await this.services.exports.failAbandoned();
      await this.services.files.sweep();
      await this.services.summaries.sweep();
    } catch (error) {
      this.log.warn({ err: error }, 'housekeeping was put off');
    }
  }
}
