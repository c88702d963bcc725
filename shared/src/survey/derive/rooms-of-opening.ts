import type { Opening, SurveyDocument } from '../survey-document.ts';
import { wallKey } from './wall-key.ts';
import { wallsByKey } from './walls.ts';

/** The rooms an opening bounds: two for one in an internal wall, one for one that leads outside. */
export function roomsOfOpening(
  document: SurveyDocument,
  opening: Pick<Opening, 'storey_id' | 'wall'>,
): readonly string[] {
  return wallsByKey(document, opening.storey_id).get(wallKey(...opening.wall))?.roomIds ?? [];
}
