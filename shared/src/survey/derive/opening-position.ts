import { distance } from '../../geometry/distance.ts';
import type { Point } from '../../geometry/point.ts';
import type { SurveyDocument } from '../survey-document.ts';

export interface OpeningPosition {
  /** The edge of the opening nearer to the wall's first corner, and the other one. */
  readonly from: Point;
  readonly to: Point;
  readonly centre: Point;
  /** Direction of the wall from its first corner, counter-clockwise from the x axis. */
  readonly angle_deg: number;
}

/** Where an opening stands on the plan, on the wall's centre line; null when it or its wall is not there. */
export function openingPosition(document: SurveyDocument, openingId: string): OpeningPosition | null {
  const opening = document.openings.get(openingId);
  const a = opening && document.corners.get(opening.wall[0]);
  const b = opening && document.corners.get(opening.wall[1]);
  if (opening === undefined || a === undefined || b === undefined) return null;
  const length = distance(a, b);
  if (length === 0) return null;
  const at = (along_m: number): Point => ({
    x_m: a.x_m + ((b.x_m - a.x_m) * along_m) / length,
    y_m: a.y_m + ((b.y_m - a.y_m) * along_m) / length,
  });
  return {
    from: at(opening.offset_m),
    to: at(opening.offset_m + opening.width_m),
    centre: at(opening.offset_m + opening.width_m / 2),
    angle_deg: (Math.atan2(b.y_m - a.y_m, b.x_m - a.x_m) * 180) / Math.PI,
  };
}
