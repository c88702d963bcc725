import type { SurveyDocumentV2 } from '@embertally/shared/survey/versions/v2';
import type { Statements } from '../repositories/database.ts';
import { DocumentRepository } from '../repositories/document-repository.ts';
import type { ExportRow } from '../repositories/export-repository.ts';
import { LimitRepository } from '../repositories/limit-repository.ts';
import { SurveyRepository } from '../repositories/survey-repository.ts';
import type { ReportInput } from '../reports/report-input.ts';

/** Everything a report of an export is made from, read at one moment. */
export async function reportInput(statements: Statements, row: ExportRow): Promise<ReportInput> {
  const survey = await new SurveyRepository(statements).find(row.survey_id);
  const text = await new DocumentRepository(statements).text(row.survey_id);
  if (survey === null || text === null) throw new Error('The survey of the export is not there any more.');
  const limits = await new LimitRepository(statements).ofBuilding(survey.building.id);
  return {
    kind: row.kind,
    room_id: row.room_id,
    site: survey.site.name,
    building: survey.building.name,
    made_by: row.person_name,
    made_at: row.created_at.toISOString(),
    time_zone: survey.site.time_zone,
    units: row.units,
    document: JSON.parse(text) as SurveyDocumentV2,
    limits: limits.map(({ room_id, quantity, bound, source, set_by, since }) => ({
      room_id,
      quantity,
      bound,
      source,
      set_by,
      since,
    })),
  };
}
