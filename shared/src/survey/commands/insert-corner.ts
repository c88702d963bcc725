import { nearestOnSegment } from '../../geometry/nearest-on-segment.ts';
import { ringEdges } from '../../geometry/ring-edges.ts';
import { roundToMillimetre } from '../../geometry/round-to-millimetre.ts';
import type { Command } from '../command.ts';
import { loopsOfRoom } from '../derive/loops-of-room.ts';
import { wallKey } from '../derive/wall-key.ts';
import { finishPlan } from '../draft/finish-plan.ts';
import { moveCorners } from '../draft/move-corners.ts';
import { rehangOpenings } from '../draft/rehang-openings.ts';
import { SurveyDraft } from '../draft/survey-draft.ts';
import { refuse } from '../refuse.ts';
import { rowRefusal } from '../row-fault.ts';

export interface InsertCornerInput {
  readonly storey_id: string;
  readonly wall: readonly [string, string];
  /** A new id. */
  readonly corner_id: string;
  /** Where the corner goes; beside the wall, the wall bends there. */
  readonly x_m: number;
  readonly y_m: number;
}

/** Puts a corner into a wall, for every room along it. */
export const insertCorner: Command<InsertCornerInput> = (document, input) => {
  const { storey_id, corner_id } = input;
  const [a, b] = input.wall.map((id) => document.corners.get(id));
  if (a === undefined || b === undefined) {
    return refuse('WALL_GONE', 'The wall is not in the survey any more.', { ids: [...input.wall] });
  }
  const wanted = { id: corner_id, storey_id, x_m: roundToMillimetre(input.x_m), y_m: roundToMillimetre(input.y_m) };
  const fault = rowRefusal('corner', wanted);
  if (fault !== null) return fault;

  const onWall = nearestOnSegment(wanted, a, b).point;
  const draft = new SurveyDraft(document);
  draft.put('corner', { ...wanted, x_m: roundToMillimetre(onWall.x_m), y_m: roundToMillimetre(onWall.y_m) });
  const key = wallKey(...input.wall);
  const split = (loop: readonly string[]): string[] =>
    ringEdges(loop).flatMap(([from, to]) => (wallKey(from, to) === key ? [from, corner_id] : [from]));
  for (const room of draft.roomsOf(storey_id)) {
    if (!loopsOfRoom(room).some((loop) => ringEdges(loop).some(([from, to]) => wallKey(from, to) === key))) continue;
    draft.put('room', { ...room, ring: split(room.ring), holes: room.holes.map(split) });
  }
  // The openings go to their half while the wall is still straight; only then does it bend.
  const hangs = rehangOpenings(draft, storey_id);
  if (hangs !== null) return hangs;
  return moveCorners(draft, storey_id, new Map([[corner_id, wanted]])) ?? finishPlan(draft, storey_id);
};
