import type { Limit } from '@embertally/shared/contracts/limits';
import type { RoomSummary } from '@embertally/shared/contracts/surveys';
import { roomInput } from '@embertally/shared/survey/room-input';
import { fromStored } from '@embertally/shared/survey/stored';
import type { SurveyDocument } from '@embertally/shared/survey/survey-document';
import { ENGINE } from '@embertally/shared/tally/engine';
import { estimateRoom } from '@embertally/shared/tally/estimate-room';
import type { Logger } from 'pino';
import type { Database } from '../repositories/database.ts';
import type { Clock } from '../clock.ts';
import { DocumentRepository } from '../repositories/document-repository.ts';
import { LimitRepository } from '../repositories/limit-repository.ts';
import { RoomSummaryRepository, type ComputedSummary } from '../repositories/room-summary-repository.ts';
import { worstStanding } from './worst-standing.ts';

/** Rooms computed between two looks at the queue, so that other requests get their turn. */
const AT_ONCE = 20;

interface SummaryParts {
  readonly database: Database;
  readonly clock: Clock;
  readonly log: Logger;
}

/**
 * Headlines of rooms: read, and computed again after a change with the code every screen uses. Marks live in the
 * database: what a stopped process left stale, the next one computes.
 */
export class SummaryService {
  private readonly parts: SummaryParts;
  private readonly running = new Map<string, Promise<void>>();
  private readonly again = new Set<string>();
  private stopping = false;

  constructor(parts: SummaryParts) {
    this.parts = parts;
  }

  async list(surveyId: string): Promise<RoomSummary[]> {
    return [...(await new RoomSummaryRepository(this.parts.database.statements).ofSurvey(surveyId))];
  }

  /** Computes a survey's stale rooms after the present turn; calls in quick succession become one run. */
  recomputeSoon(surveyId: string): void {
    if (this.stopping) return;
    if (this.running.has(surveyId)) {
      this.again.add(surveyId);
      return;
    }
    const run = this.recompute(surveyId)
      .catch((error: unknown) => this.parts.log.error({ err: error, surveyId }, 'summaries were not recomputed'))
      .finally(() => {
        this.running.delete(surveyId);
        if (this.again.delete(surveyId)) this.recomputeSoon(surveyId);
      });
    this.running.set(surveyId, run);
  }

  /** Takes up what is stale anywhere, and what an older engine computed. */
  async sweep(): Promise<void> {
    const summaries = new RoomSummaryRepository(this.parts.database.statements);
    await summaries.markOlderThan(ENGINE);
    for (const surveyId of await summaries.surveysWithStale()) this.recomputeSoon(surveyId);
  }

  /** Waits until nothing is being computed; used before results are read for good. */
  async settled(): Promise<void> {
    while (this.running.size > 0) await Promise.all(this.running.values());
  }

  async stop(): Promise<void> {
    this.stopping = true;
    await this.settled();
  }

  private async recompute(surveyId: string): Promise<void> {
    const { statements } = this.parts.database;
    const summaries = new RoomSummaryRepository(statements);
    for (;;) {
      // The marks are read before the rows: a change in between leaves its mark standing.
      const stale = await summaries.stale(surveyId, AT_ONCE);
      if (stale.length === 0 || this.stopping) return;
      const roomIds = stale.map((row) => row.room_id);
      const document = fromStored(await new DocumentRepository(statements).forTallies(surveyId, roomIds));
      const limits = await new LimitRepository(statements).ofRooms(surveyId, roomIds);
      const computed = stale
        .filter((row) => document.rooms.has(row.room_id))
        .map((row) => ({
          ...headline(
            document,
            row.room_id,
            limits.filter((limit) => limit.room_id === row.room_id),
          ),
          mark: row.mark,
        }));
      await summaries.store(surveyId, computed, this.parts.clock.now());
      if (computed.length === 0) return;
    }
  }
}

function headline(document: SurveyDocument, roomId: string, limits: readonly Limit[]): Omit<ComputedSummary, 'mark'> {
  const tally = estimateRoom(roomInput(document, roomId, limits), { spread: false });
  const { standing, ratio } = worstStanding(tally.limits);
  let entries = 0;
  for (const entry of document.entries.values()) if (entry.room_id === roomId) entries += 1;
  return {
    room_id: roomId,
    floor_area_m2: tally.room.floorArea.value,
    load_total_MJ: tally.load.total.value,
    load_per_floor_MJ_m2: tally.load.perFloor?.value ?? null,
    peak_kW: tally.growth.peak?.value ?? null,
    flashover_time_s: tally.room.flashover.time?.value ?? null,
    standing,
    ratio,
    entries,
    engine: tally.engine,
  };
}
