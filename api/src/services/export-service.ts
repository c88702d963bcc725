import type { Export } from '@embertally/shared/contracts/exports';
import { randomUUID } from 'node:crypto';
import type { Logger } from 'pino';
import type { Database } from '../repositories/database.ts';
import type { Actor, SiteAccess, Trail } from '../actor.ts';
import type { Clock } from '../clock.ts';
import { Fault } from '../fault.ts';
import type { FileStore } from '../files/file-store.ts';
import type { Jobs } from '../jobs/jobs.ts';
import { ExportRepository, type ExportRow } from '../repositories/export-repository.ts';
import { recordEvent } from './audit-record.ts';
import { claimId } from './claim-id.ts';
import { exportFileName } from './export-file-name.ts';
import type { ReportMaker } from './report-maker.ts';
import { reportInput } from './report-input-of.ts';

const UNFINISHED_PER_PERSON = 5;
/** How often progress is written down and a wish to stop is noticed, ms. */
const CHECK_ms = 400;
/** Longer than all tries of a job together, ms. */
const ABANDONED_ms = 20 * 60 * 1000;
const QUEUE = 'make-export';
const NOT_MADE = 'The file could not be made. The survey is untouched; try again, and report it if it fails again.';

interface ExportParts {
  readonly database: Database;
  readonly clock: Clock;
  readonly log: Logger;
  readonly files: FileStore;
  readonly jobs: Jobs;
  readonly makeReport: ReportMaker;
}

interface ExportInput {
  readonly id: string;
  readonly kind: Export['kind'];
  readonly room_id: string | null;
  readonly units: 'SI' | 'US';
}

/** Files made off the request thread: asked for, watched, stopped, fetched. */
export class ExportService {
  private readonly parts: ExportParts;

  constructor(parts: ExportParts) {
    this.parts = parts;
  }

  /** Starts taking jobs; making the same export twice gives one file. */
  work(): Promise<void> {
    return this.parts.jobs.work(QUEUE, (job) => this.make(job.id));
  }

  async create(actor: Actor, access: SiteAccess, surveyId: string, input: ExportInput, trail: Trail): Promise<Export> {
    const { database, clock, jobs } = this.parts;
    const at = clock.now();
    await database.transaction(async (statements) => {
      if (!(await claimId(statements, actor, input, at))) return;
      const exports = new ExportRepository(statements);
      await checkRoom(exports, surveyId, input);
      if ((await exports.countUnfinished(actor.personId)) >= UNFINISHED_PER_PERSON) {
        throw new Fault(
          'too-many',
          'too-many-exports',
          `${UNFINISHED_PER_PERSON} of your files are being made already. Nothing was started; wait for one or stop one.`,
          { retryAfter_s: 10 },
        );
      }
      await exports.add({ ...input, survey_id: surveyId, person_id: actor.personId, at });
      await recordEvent(statements, {
        chain: { kind: 'site', id: access.siteId },
        actor,
        action: 'export.asked-for',
        object: { kind: 'survey', id: surveyId },
        facts: { kind: input.kind },
        trail,
        at,
      });
    });
    // Sent after the commit; sending the same id again adds nothing, so a repeated request heals a lost send.
    await jobs.send(QUEUE, input.id, {});
    return this.read(input.id);
  }

  async read(id: string): Promise<Export> {
    return present(await this.find(id));
  }

  async stop(actor: Actor, access: SiteAccess, id: string, trail: Trail): Promise<void> {
    const { database, clock } = this.parts;
    const at = clock.now();
    await database.transaction(async (statements) => {
      await new ExportRepository(statements).stop(id, at);
      await recordEvent(statements, {
        chain: { kind: 'site', id: access.siteId },
        actor,
        action: 'export.stopped',
        object: { kind: 'export', id },
        trail,
        at,
      });
    });
  }

  async readFile(id: string): Promise<{ name: string; bytes: Uint8Array }> {
    const row = await this.find(id);
    if (row.state !== 'ready' || row.file_key === null) {
      throw new Fault(
        'conflict',
        'export-not-ready',
        'This file is not there yet; ask how far it is and come back when it is ready.',
      );
    }
    const bytes = await this.parts.files.get(row.file_key);
    if (bytes === null)
      throw new Fault('conflict', 'export-lost', 'This file is not on the server any more; ask for a new one.');
    return { name: row.file_name ?? 'report.pdf', bytes };
  }

  /** Says of exports whose process died, and whose tries are used up, that they failed. */
  async failAbandoned(): Promise<void> {
    const now = this.parts.clock.now();
    const moment = new Date(now.getTime() - ABANDONED_ms);
    await new ExportRepository(this.parts.database.statements).failUntouchedSince(moment, NOT_MADE, now);
  }

  private async find(id: string): Promise<ExportRow> {
    const row = await new ExportRepository(this.parts.database.statements).find(id);
    if (row === null) throw Fault.notFound();
    return row;
  }

  private async make(id: string): Promise<void> {
    const { database, clock, files, makeReport, log } = this.parts;
    const exports = new ExportRepository(database.statements);
    const row = await exports.find(id);
    if (row === null || !(await exports.run(id, 0, clock.now()))) return;
    const stopping = new AbortController();
    let progress = 0;
    const watch = setInterval(() => {
      exports
        .run(id, progress, clock.now())
        .then((wanted) => {
          if (!wanted) stopping.abort();
        })
        .catch((error: unknown) => log.warn({ err: error, exportId: id }, 'progress was not written down'));
    }, CHECK_ms);
    try {
      const input = await reportInput(database.statements, row);
      const bytes = await makeReport(
        input,
        (fraction) => (progress = Math.min(0.99, Math.max(progress, fraction))),
        stopping.signal,
      );
      const key = `export-${id}-${randomUUID()}.pdf`;
      await files.put(key, bytes);
      const file = { key, name: exportFileName(input), bytes: bytes.byteLength };
      if (!(await exports.finish(id, file, clock.now()))) await files.remove(key);
    } catch (error) {
      if (stopping.signal.aborted) return;
      log.error({ err: error, exportId: id }, 'an export failed');
      await exports.fail(id, NOT_MADE, clock.now());
    } finally {
      clearInterval(watch);
    }
  }
}

async function checkRoom(exports: ExportRepository, surveyId: string, input: ExportInput): Promise<void> {
  const needs = input.kind === 'room-tally';
  if (needs && input.room_id !== null && (await exports.hasRoom(surveyId, input.room_id))) return;
  if (!needs && input.room_id === null) return;
  throw Fault.invalid([
    {
      pointer: '/room_id',
      code: needs ? 'ROOM_UNKNOWN' : 'ROOM_NOT_WANTED',
      message: needs ? 'Choose a room of this survey.' : 'A report of the whole survey names no room.',
    },
  ]);
}

function present(row: ExportRow): Export {
  return {
    id: row.id,
    survey_id: row.survey_id,
    kind: row.kind,
    room_id: row.room_id,
    state: row.state,
    progress: row.progress,
    file_name: row.file_name,
    bytes: row.bytes,
    problem: row.problem,
    created_at: row.created_at.toISOString(),
  };
}
