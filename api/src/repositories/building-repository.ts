import type { BuildingSummary } from '@embertally/shared/contracts/sites';
import type { Storey } from '@embertally/shared/survey/survey-document';
import { SqlRepository } from './sql-repository.ts';

type BuildingRow = Omit<BuildingSummary, 'updated_at'> & { updated_at: Date };

const SELECT = `SELECT b.id, b.site_id, b.name, v.id AS survey_id,
    (SELECT count(*)::int FROM storey t WHERE t.survey_id = v.id) AS storeys,
    m.rooms, m.rooms_over, m.rooms_near, b.version, greatest(b.updated_at, v.updated_at) AS updated_at
  FROM building b JOIN survey v ON v.building_id = b.id AND v.kind = 'working'
  CROSS JOIN LATERAL (
    SELECT count(*)::int AS rooms, (count(*) FILTER (WHERE standing = 'over'))::int AS rooms_over,
      (count(*) FILTER (WHERE standing = 'near'))::int AS rooms_near
    FROM room_summary WHERE survey_id = v.id) m`;

/** Buildings with their one working survey. Callers have found the site through the actor's role. */
export class BuildingRepository extends SqlRepository {
  async ofSite(siteId: string): Promise<readonly BuildingSummary[]> {
    return (await this.rows<BuildingRow>(`${SELECT} WHERE b.site_id = $1 ORDER BY lower(b.name), b.id`, [siteId])).map(
      summary,
    );
  }

  async find(siteId: string, id: string): Promise<BuildingSummary | null> {
    const row = await this.row<BuildingRow>(`${SELECT} WHERE b.site_id = $1 AND b.id = $2`, [siteId, id]);
    return row === null ? null : summary(row);
  }

  async add(id: string, siteId: string, name: string, at: Date): Promise<void> {
    await this.rows(
      'INSERT INTO building (id, site_id, name, version, created_at, updated_at) VALUES ($1, $2, $3, 1, $4, $4)',
      [id, siteId, name, at],
    );
  }

  /** The working survey as it begins: one storey, sequence 0. */
  async addWorkingSurvey(surveyId: string, buildingId: string, storey: Storey, at: Date): Promise<void> {
    await this.rows(
      `INSERT INTO survey (id, building_id, kind, sequence, created_at, updated_at) VALUES ($1, $2, 'working', 0, $3, $3)`,
      [surveyId, buildingId, at],
    );
    await this.rows(
      `INSERT INTO storey (survey_id, id, name, level_m, height_m, wall_thickness_m, plan_picture, north_deg, version)
       VALUES ($1, $2, $3, $4, $5, $6, NULL, NULL, 1)`,
      [surveyId, storey.id, storey.name, storey.level_m, storey.height_m, storey.wall_thickness_m],
    );
  }

  /** @returns whether the version was the present one */
  async rename(id: string, version: number, name: string, at: Date): Promise<boolean> {
    const changed = await this.rows(
      'UPDATE building SET name = $3, version = version + 1, updated_at = $4 WHERE id = $1 AND version = $2 RETURNING id',
      [id, version, name, at],
    );
    return changed.length > 0;
  }
}

function summary(row: BuildingRow): BuildingSummary {
  return { ...row, updated_at: row.updated_at.toISOString() };
}
