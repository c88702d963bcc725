import { distance } from '../../geometry/distance.ts';
import { nearestOnSegment } from '../../geometry/nearest-on-segment.ts';
import { ringEdges } from '../../geometry/ring-edges.ts';
import { roundToMillimetre } from '../../geometry/round-to-millimetre.ts';
import { ROUNDING_M, TOLERANCE_M } from '../../geometry/tolerance.ts';
import type { Refusal } from '../command.ts';
import { loopsOfRoom } from '../derive/loops-of-room.ts';
import { wallKey } from '../derive/wall-key.ts';
import { refuse } from '../refuse.ts';
import type { Corner, Opening } from '../survey-document.ts';
import { metres, openingWords } from '../words.ts';
import type { SurveyDraft } from './survey-draft.ts';

/** A wall split at corners on its line bends by no more than this at each, m. */
const STRAIGHT_M = 2 * TOLERANCE_M;

/**
 * Hangs every opening whose wall was split or joined on the stretch it stands in now. An opening whose wall is gone goes
 * with it; one with a corner inside it is refused by name.
 */
export function rehangOpenings(draft: SurveyDraft, storeyId: string): Refusal | null {
  const openings = draft.openingsOf(storeyId);
  if (openings.length === 0) return null;
  const loops = draft.roomsOf(storeyId).flatMap((room) => loopsOfRoom(room));
  const edges = new Set(loops.flatMap((loop) => ringEdges(loop).map(([a, b]) => wallKey(a, b))));
  for (const opening of openings) {
    if (edges.has(wallKey(...opening.wall))) continue;
    const chain = straightChain(draft, loops, opening.wall);
    if (chain === null) {
      draft.remove('opening', opening.id);
      continue;
    }
    const hung = hangOn(chain, opening);
    if ('refused' in hung) return hung;
    draft.put('opening', hung);
  }
  return null;
}

/** The corners from one end of a former wall to the other, when rings still run straight along it; null when not. */
function straightChain(
  draft: SurveyDraft,
  loops: readonly (readonly string[])[],
  [from, to]: readonly [string, string],
): Corner[] | null {
  const a = draft.get('corner', from);
  const b = draft.get('corner', to);
  if (a === undefined || b === undefined) return null;
  for (const loop of loops) {
    const start = loop.indexOf(from);
    const end = loop.indexOf(to);
    if (start < 0 || end < 0) continue;
    const turned = [...loop.slice(start), ...loop.slice(0, start)];
    const stop = turned.indexOf(to);
    const forward = turned.slice(0, stop + 1);
    const backward = [from, ...turned.slice(stop).reverse()];
    for (const path of [forward, backward]) {
      const corners = path.flatMap((id) => draft.get('corner', id) ?? []);
      if (corners.every((corner) => nearestOnSegment(corner, a, b).distance_m <= STRAIGHT_M)) return corners;
    }
  }
  return null;
}

function hangOn(chain: readonly Corner[], opening: Opening): Opening | Refusal {
  const slack = TOLERANCE_M + ROUNDING_M;
  let start_m = 0;
  for (let index = 0; index + 1 < chain.length; index += 1) {
    const a = chain[index] as Corner;
    const b = chain[index + 1] as Corner;
    const end_m = start_m + distance(a, b);
    if (opening.offset_m < end_m - slack) {
      const over_m = opening.offset_m + opening.width_m - end_m;
      if (over_m > slack && index + 2 < chain.length) {
        const message = `A corner would fall inside the ${openingWords(opening)}, ${metres(end_m - opening.offset_m)} from its edge; move one of them.`;
        return refuse('CORNER_IN_OPENING', message, { ids: [opening.id] });
      }
      const offset_m = Math.max(
        0,
        roundToMillimetre(Math.min(opening.offset_m - start_m, end_m - start_m - opening.width_m)),
      );
      return { ...opening, wall: [a.id, b.id], offset_m };
    }
    start_m = end_m;
  }
  const last = chain.at(-1) as Corner;
  const before = chain.at(-2) as Corner;
  const offset_m = Math.max(0, roundToMillimetre(distance(before, last) - opening.width_m));
  return { ...opening, wall: [before.id, last.id], offset_m };
}
