import { regionArea } from '../../geometry/region-area.ts';
import type { SurveyDocument } from '../survey-document.ts';
import { clearRing } from './clear-ring.ts';

/**
 * Floor area of a room from its clear ring, m²; `measured_floor_area_m2`, where somebody gave one, stands instead. Null
 * for a room without a clear ring.
 */
export function roomArea(document: SurveyDocument, roomId: string): number | null {
  const measured = document.rooms.get(roomId)?.measured_floor_area_m2 ?? null;
  if (measured !== null) return measured;
  const clear = clearRing(document, roomId);
  return clear === null ? null : regionArea(clear);
}
