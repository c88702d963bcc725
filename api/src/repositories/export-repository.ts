import type { Export } from '@embertally/shared/contracts/exports';
import { SqlRepository } from './sql-repository.ts';

export interface ExportRow extends Omit<Export, 'created_at'> {
  readonly created_at: Date;
  readonly units: 'SI' | 'US';
  readonly file_key: string | null;
  readonly person_id: string;
  readonly person_name: string;
}

const SELECT = `SELECT e.id, e.survey_id, e.kind, e.room_id, e.state, e.progress, e.file_name, e.bytes, e.problem,
  e.created_at, e.units, e.file_key, e.person_id, p.name AS person_name FROM export e JOIN person p ON p.id = e.person_id`;

/** Exports and how far they are. A state only moves on from the states it may follow. */
export class ExportRepository extends SqlRepository {
  find(id: string): Promise<ExportRow | null> {
    return this.row<ExportRow>(`${SELECT} WHERE e.id = $1`, [id]);
  }

  async add(row: {
    readonly id: string;
    readonly survey_id: string;
    readonly kind: Export['kind'];
    readonly room_id: string | null;
    readonly units: 'SI' | 'US';
    readonly person_id: string;
    readonly at: Date;
  }): Promise<void> {
    await this.rows(
      `INSERT INTO export (id, survey_id, kind, room_id, units, state, progress, person_id, created_at, updated_at)
       VALUES ($1, $2, $3, $4, $5, 'waiting', 0, $6, $7, $7)`,
      [row.id, row.survey_id, row.kind, row.room_id, row.units, row.person_id, row.at],
    );
  }

  async hasRoom(surveyId: string, roomId: string): Promise<boolean> {
    return (await this.row('SELECT 1 AS yes FROM room WHERE survey_id = $1 AND id = $2', [surveyId, roomId])) !== null;
  }

  /** Unfinished exports of a person. */
  async countUnfinished(personId: string): Promise<number> {
    const found = await this.row<{ count: number }>(
      `SELECT count(*)::int AS count FROM export WHERE person_id = $1 AND state IN ('waiting', 'running')`,
      [personId],
    );
    return found?.count ?? 0;
  }

  /** @returns whether it is still wanted */
  async run(id: string, progress: number, at: Date): Promise<boolean> {
    const moved = await this.rows(
      `UPDATE export SET state = 'running', progress = $2, updated_at = $3 WHERE id = $1 AND state IN ('waiting', 'running') RETURNING id`,
      [id, progress, at],
    );
    return moved.length > 0;
  }

  /** @returns whether it was still wanted */
  async finish(
    id: string,
    file: { readonly key: string; readonly name: string; readonly bytes: number },
    at: Date,
  ): Promise<boolean> {
    const moved = await this.rows(
      `UPDATE export SET state = 'ready', progress = 1, file_key = $2, file_name = $3, bytes = $4, problem = NULL, updated_at = $5
       WHERE id = $1 AND state IN ('waiting', 'running') RETURNING id`,
      [id, file.key, file.name, file.bytes, at],
    );
    return moved.length > 0;
  }

  async fail(id: string, problem: string, at: Date): Promise<void> {
    await this.rows(
      `UPDATE export SET state = 'failed', problem = $2, updated_at = $3 WHERE id = $1 AND state IN ('waiting', 'running')`,
      [id, problem, at],
    );
  }

  /** Ends exports nobody has worked on since a moment; their progress is written down all the while somebody does. */
  async failUntouchedSince(moment: Date, problem: string, at: Date): Promise<void> {
    await this.rows(
      `UPDATE export SET state = 'failed', problem = $2, updated_at = $3 WHERE state IN ('waiting', 'running') AND updated_at < $1`,
      [moment, problem, at],
    );
  }

  async stop(id: string, at: Date): Promise<void> {
    await this.rows(
      `UPDATE export SET state = 'stopped', updated_at = $2 WHERE id = $1 AND state IN ('waiting', 'running')`,
      [id, at],
    );
  }
}
