import { distance } from '../../geometry/distance.ts';
import { nearestOnSegment } from '../../geometry/nearest-on-segment.ts';
import { TOLERANCE_M } from '../../geometry/tolerance.ts';
import type { Corner, SurveyDocument } from '../survey-document.ts';
import { walls } from './walls.ts';

/**
 * The corners of the whole straight wall that a stretch between two corners is part of: the stretch, and every further
 * stretch that goes on from it in the same line, whichever rooms it bounds.
 */
export function wallRun(
  document: SurveyDocument,
  storeyId: string,
  wall: readonly [string, string],
): readonly string[] {
  const a = document.corners.get(wall[0]);
  const b = document.corners.get(wall[1]);
  if (a === undefined || b === undefined) return [];
  const beside = new Map<string, string[]>();
  for (const one of walls(document, storeyId)) {
    beside.set(one.a, [...(beside.get(one.a) ?? []), one.b]);
    beside.set(one.b, [...(beside.get(one.b) ?? []), one.a]);
  }
  const run = new Set([a.id, b.id]);
  const open = [a.id, b.id];
  for (let id = open.pop(); id !== undefined; id = open.pop()) {
    for (const next of beside.get(id) ?? []) {
      const corner = document.corners.get(next);
      if (corner === undefined || run.has(next) || !isInLine(corner, a, b)) continue;
      run.add(next);
      open.push(next);
    }
  }
  return [...run];
}

/** Rounding to the millimetre tilts a short slanted stretch, so the further a corner is the more it may be off its line. */
function isInLine(corner: Corner, a: Corner, b: Corner): boolean {
  const length = distance(a, b);
  if (length === 0) return false;
  const reach = 1 + Math.max(distance(corner, a), distance(corner, b)) / length;
  const stretched = (from: Corner, to: Corner) => ({
    x_m: from.x_m + (to.x_m - from.x_m) * reach,
    y_m: from.y_m + (to.y_m - from.y_m) * reach,
  });
  return nearestOnSegment(corner, stretched(b, a), stretched(a, b)).distance_m <= TOLERANCE_M * reach;
}
