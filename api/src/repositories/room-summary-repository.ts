import type { RoomSummary } from '@embertally/shared/contracts/surveys';
import { SqlRepository } from './sql-repository.ts';

export type ComputedSummary = Pick<
  RoomSummary,
  | 'room_id'
  | 'floor_area_m2'
  | 'load_total_MJ'
  | 'load_per_floor_MJ_m2'
  | 'peak_kW'
  | 'flashover_time_s'
  | 'standing'
  | 'ratio'
  | 'entries'
  | 'engine'
> & { readonly mark: number };

type SummaryRow = Omit<RoomSummary, 'computed_at'> & { computed_at: Date | null };

/** Headlines of rooms as last computed. */
export class RoomSummaryRepository extends SqlRepository {
  async ofSurvey(surveyId: string): Promise<readonly RoomSummary[]> {
    const rows = await this.rows<SummaryRow>(
      `SELECT m.room_id, r.storey_id, r.name, m.floor_area_m2, m."load_total_MJ", m."load_per_floor_MJ_m2", m."peak_kW",
         m.flashover_time_s, m.standing, m.ratio, m.entries, m.engine, m.stale, m.computed_at
       FROM room_summary m JOIN room r ON r.survey_id = m.survey_id AND r.id = m.room_id
       WHERE m.survey_id = $1 ORDER BY r.name, m.room_id`,
      [surveyId],
    );
    return rows.map((row) => ({ ...row, computed_at: row.computed_at?.toISOString() ?? null }));
  }

  async markStale(surveyId: string, roomIds: readonly string[]): Promise<void> {
    await this.rows(
      'UPDATE room_summary SET stale = true, mark = mark + 1 WHERE survey_id = $1 AND room_id = ANY($2::uuid[])',
      [surveyId, roomIds],
    );
  }

  /** Marks stale what another version of the engine computed. */
  async markOlderThan(engine: string): Promise<void> {
    await this.rows('UPDATE room_summary SET stale = true, mark = mark + 1 WHERE NOT stale AND engine <> $1', [engine]);
  }

  stale(surveyId: string, limit: number): Promise<readonly { readonly room_id: string; readonly mark: number }[]> {
    return this.rows('SELECT room_id, mark FROM room_summary WHERE survey_id = $1 AND stale LIMIT $2', [
      surveyId,
      limit,
    ]);
  }

  async surveysWithStale(): Promise<readonly string[]> {
    const rows = await this.rows<{ survey_id: string }>('SELECT DISTINCT survey_id FROM room_summary WHERE stale');
    return rows.map((row) => row.survey_id);
  }

  /** Stores results whose room has not been marked again since its state was read. */
  async store(surveyId: string, computed: readonly ComputedSummary[], at: Date): Promise<void> {
    await this.rows(
      `UPDATE room_summary AS t SET floor_area_m2 = r.floor_area_m2, "load_total_MJ" = r."load_total_MJ",
         "load_per_floor_MJ_m2" = r."load_per_floor_MJ_m2", "peak_kW" = r."peak_kW", flashover_time_s = r.flashover_time_s,
         standing = r.standing, ratio = r.ratio, entries = r.entries, engine = r.engine, stale = false, computed_at = $3
       FROM jsonb_to_recordset($2::jsonb) AS r(room_id uuid, floor_area_m2 float8, "load_total_MJ" float8,
         "load_per_floor_MJ_m2" float8, "peak_kW" float8, flashover_time_s float8, standing text, ratio float8, entries int,
         engine text, mark int)
       WHERE t.survey_id = $1 AND t.room_id = r.room_id AND t.mark = r.mark`,
      [surveyId, JSON.stringify(computed), at],
    );
  }
}
