import type { Limit } from '@embertally/shared/contracts/limits';
import { SqlRepository } from './sql-repository.ts';

type LimitRow = Omit<Limit, 'entered_at'> & { entered_at: Date };
export type LimitValues = Pick<Limit, 'room_id' | 'quantity' | 'bound' | 'source' | 'set_by' | 'since'>;

const SELECT = `SELECT l.id, l.building_id, l.room_id, l.quantity, l.bound, l.source, l.set_by,
    to_char(l.since, 'YYYY-MM-DD') AS since, p.name AS entered_by, l.entered_at, l.version
  FROM room_limit l JOIN person p ON p.id = l.entered_by`;

/** Limits on rooms. One whose room is deleted sleeps until the room is brought back. */
export class LimitRepository extends SqlRepository {
  async ofBuilding(buildingId: string): Promise<readonly Limit[]> {
    const rows = await this.rows<LimitRow>(
      `${SELECT} JOIN survey v ON v.building_id = l.building_id AND v.kind = 'working'
       JOIN room r ON r.survey_id = v.id AND r.id = l.room_id
       WHERE l.building_id = $1 ORDER BY l.room_id, l.quantity, l.id`,
      [buildingId],
    );
    return rows.map(limit);
  }

  /** Limits on some rooms of the building a survey belongs to. */
  async ofRooms(surveyId: string, roomIds: readonly string[]): Promise<readonly Limit[]> {
    const rows = await this.rows<LimitRow>(
      `${SELECT} JOIN survey v ON v.building_id = l.building_id
       WHERE v.id = $1 AND l.room_id = ANY($2::uuid[]) ORDER BY l.room_id, l.quantity, l.id`,
      [surveyId, roomIds],
    );
    return rows.map(limit);
  }

  async find(id: string): Promise<Limit | null> {
    const row = await this.row<LimitRow>(`${SELECT} WHERE l.id = $1`, [id]);
    return row === null ? null : limit(row);
  }

  /** The working survey in which the building has the room; null when it has none. */
  async surveyOfRoom(buildingId: string, roomId: string): Promise<string | null> {
    const found = await this.row<{ id: string }>(
      `SELECT v.id FROM survey v JOIN room r ON r.survey_id = v.id
       WHERE v.building_id = $1 AND v.kind = 'working' AND r.id = $2`,
      [buildingId, roomId],
    );
    return found?.id ?? null;
  }

  async add(id: string, buildingId: string, values: LimitValues, personId: string, at: Date): Promise<void> {
    await this.rows(
      `INSERT INTO room_limit (id, building_id, room_id, quantity, bound, source, set_by, since, entered_by, entered_at, version)
       VALUES ($1, $2, $3, $4, $5, $6, $7, $8, $9, $10, 1)`,
      [
        id,
        buildingId,
        values.room_id,
        values.quantity,
        values.bound,
        values.source,
        values.set_by,
        values.since,
        personId,
        at,
      ],
    );
  }

  /** @returns whether the version was the present one */
  async edit(
    id: string,
    version: number,
    patch: {
      readonly bound?: number | undefined;
      readonly set_by?: string | undefined;
      readonly since?: string | undefined;
    },
  ): Promise<boolean> {
    const changed = await this.rows(
      `UPDATE room_limit SET bound = coalesce($3, bound), set_by = coalesce($4, set_by), since = coalesce($5, since),
         version = version + 1 WHERE id = $1 AND version = $2 RETURNING id`,
      [id, version, patch.bound ?? null, patch.set_by ?? null, patch.since ?? null],
    );
    return changed.length > 0;
  }

  /** @returns whether the version was the present one */
  async remove(id: string, version: number): Promise<boolean> {
    const removed = await this.rows('DELETE FROM room_limit WHERE id = $1 AND version = $2 RETURNING id', [
      id,
      version,
    ]);
    return removed.length > 0;
  }
}

function limit(row: LimitRow): Limit {
  return { ...row, entered_at: row.entered_at.toISOString() };
}
