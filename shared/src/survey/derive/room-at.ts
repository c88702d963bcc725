import type { Point } from '../../geometry/point.ts';
import { pointInRegion } from '../../geometry/point-in-region.ts';
import type { Room, SurveyDocument } from '../survey-document.ts';
import { roomRegion } from './room-region.ts';
import { roomsOfStorey } from './rooms-of-storey.ts';

/** The room at a place of a storey's plan; on a wall between two, the one that comes first; null outside all rooms. */
export function roomAt(document: SurveyDocument, storeyId: string, point: Point): Room | null {
  let touched: Room | null = null;
  for (const room of roomsOfStorey(document, storeyId)) {
    const region = roomRegion(document.corners, room);
    if (region === null) continue;
    const where = pointInRegion(point, region);
    if (where === 'inside') return room;
    if (where === 'on') touched ??= room;
  }
  return touched;
}
