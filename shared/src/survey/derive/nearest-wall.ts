import { nearestOnSegment } from '../../geometry/nearest-on-segment.ts';
import type { Point } from '../../geometry/point.ts';
import type { SurveyDocument } from '../survey-document.ts';
import { walls, type Wall } from './walls.ts';

export interface NearestWall {
  readonly wall: Wall;
  /** The place on the wall's centre line, and how far along from the wall's first corner it is. */
  readonly point: Point;
  readonly along_m: number;
  readonly distance_m: number;
}

/** The wall of a storey nearest to a place; null on a storey without rooms. */
export function nearestWall(document: SurveyDocument, storeyId: string, point: Point): NearestWall | null {
  let best: NearestWall | null = null;
  for (const wall of walls(document, storeyId)) {
    const a = document.corners.get(wall.a);
    const b = document.corners.get(wall.b);
    if (a === undefined || b === undefined) continue;
    const near = nearestOnSegment(point, a, b);
    if (best !== null && best.distance_m <= near.distance_m) continue;
    best = { wall, point: near.point, along_m: near.t * wall.length_m, distance_m: near.distance_m };
  }
  return best;
}
