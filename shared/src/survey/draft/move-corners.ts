import { distance } from '../../geometry/distance.ts';
import type { Point } from '../../geometry/point.ts';
import { roundToMillimetre } from '../../geometry/round-to-millimetre.ts';
import { TOLERANCE_M } from '../../geometry/tolerance.ts';
import type { Refusal } from '../command.ts';
import { rowRefusal } from '../row-fault.ts';
import type { Corner, Opening } from '../survey-document.ts';
import type { SurveyDraft } from './survey-draft.ts';

/**
 * Puts corners elsewhere. Openings keep their place on the plan when their wall only gets longer or shorter, and their
 * distance from the wall's first corner when it turns; they slide along as far as it takes to stay in the wall.
 */
export function moveCorners(draft: SurveyDraft, storeyId: string, places: ReadonlyMap<string, Point>): Refusal | null {
  const before = new Map<string, Corner>();
  for (const [id, place] of places) {
    const corner = draft.get('corner', id);
    if (corner === undefined) continue;
    before.set(id, corner);
    const moved = { ...corner, x_m: roundToMillimetre(place.x_m), y_m: roundToMillimetre(place.y_m) };
    const fault = rowRefusal('corner', moved);
    if (fault !== null) return fault;
    draft.put('corner', moved);
  }
  for (const opening of draft.openingsOf(storeyId)) {
    if (!opening.wall.some((id) => before.has(id))) continue;
    const offset_m = offsetAfter(draft, opening, before);
    if (offset_m !== opening.offset_m) draft.put('opening', { ...opening, offset_m });
  }
  return null;
}

function offsetAfter(draft: SurveyDraft, opening: Opening, before: ReadonlyMap<string, Corner>): number {
  const [aId, bId] = opening.wall;
  const a = draft.get('corner', aId);
  const b = draft.get('corner', bId);
  const oldA = before.get(aId) ?? a;
  const oldB = before.get(bId) ?? b;
  if (a === undefined || b === undefined || oldA === undefined || oldB === undefined) return opening.offset_m;
  let offset_m = opening.offset_m;
  if (!before.has(bId)) {
    const length = distance(oldA, oldB);
    const ux = (oldB.x_m - oldA.x_m) / length;
    const uy = (oldB.y_m - oldA.y_m) / length;
    const dx = a.x_m - oldA.x_m;
    const dy = a.y_m - oldA.y_m;
    if (Math.abs(dx * uy - dy * ux) <= TOLERANCE_M) offset_m -= dx * ux + dy * uy;
  }
  const last_m = distance(a, b) - opening.width_m;
  return Math.max(0, roundToMillimetre(Math.min(offset_m, last_m)));
}
