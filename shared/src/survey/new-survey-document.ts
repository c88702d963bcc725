import type { SurveyDocument } from './survey-document.ts';

/** A survey in which nothing has been drawn yet. */
export function newSurveyDocument(surveyId: string): SurveyDocument {
  return {
    surveyId,
    sequence: 0,
    storeys: new Map(),
    corners: new Map(),
    rooms: new Map(),
    openings: new Map(),
    entries: new Map(),
  };
}
