import type { Survey } from '@embertally/shared/contracts/surveys';
import { SqlRepository } from './sql-repository.ts';

interface SurveyRow {
  readonly id: string;
  readonly kind: 'working' | 'trial';
  readonly sequence: number;
  readonly building_id: string;
  readonly building_name: string;
  readonly site_id: string;
  readonly site_name: string;
  readonly time_zone: string;
}

/** Where surveys belong. */
export class SurveyRepository extends SqlRepository {
  async find(surveyId: string): Promise<Omit<Survey, 'my_role' | 'of_keeper'> | null> {
    const row = await this.row<SurveyRow>(
      `SELECT v.id, v.kind, v.sequence, b.id AS building_id, b.name AS building_name, s.id AS site_id, s.name AS site_name,
         s.time_zone FROM survey v JOIN building b ON b.id = v.building_id JOIN site s ON s.id = b.site_id WHERE v.id = $1`,
      [surveyId],
    );
    if (row === null) return null;
    return {
      id: row.id,
      kind: row.kind,
      sequence: row.sequence,
      building: { id: row.building_id, name: row.building_name },
      site: { id: row.site_id, name: row.site_name, time_zone: row.time_zone },
    };
  }

  async sequence(surveyId: string): Promise<number | null> {
    return (
      (await this.row<{ sequence: number }>('SELECT sequence FROM survey WHERE id = $1', [surveyId]))?.sequence ?? null
    );
  }
}
