import type { SurveyDocument } from './survey-document.ts';
import { SCHEMA_VERSION, type SurveyDocumentV2 } from './versions/v2.ts';

function byId<R extends { readonly id: string }>(rows: readonly R[]): ReadonlyMap<string, R> {
  return new Map(rows.map((row) => [row.id, row]));
}

/** The document as commands and the tally see it, from its stored and sent form. */
export function fromStored(stored: SurveyDocumentV2): SurveyDocument {
  return {
    surveyId: stored.survey_id,
    sequence: stored.sequence,
    storeys: byId(stored.storeys),
    corners: byId(stored.corners),
    rooms: byId(stored.rooms),
    openings: byId(stored.openings),
    entries: byId(stored.entries),
  };
}

/** The stored and sent form of the document; rows keep the order they stand in. */
export function toStored(document: SurveyDocument): SurveyDocumentV2 {
  return {
    schema_version: SCHEMA_VERSION,
    survey_id: document.surveyId,
    sequence: document.sequence,
    storeys: [...document.storeys.values()],
    corners: [...document.corners.values()],
    rooms: [...document.rooms.values()],
    openings: [...document.openings.values()],
    entries: [...document.entries.values()],
  };
}
