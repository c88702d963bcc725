import { bounds, boundsOverlap, type Bounds } from '../../geometry/bounds.ts';
import { footprint } from '../../geometry/footprint.ts';
import { interiorPoint } from '../../geometry/interior-point.ts';
import type { Point } from '../../geometry/point.ts';
import { ringInRegion } from '../../geometry/ring-in-region.ts';
import { roundToMillimetre } from '../../geometry/round-to-millimetre.ts';
import type { Entry, SurveyDocument } from '../survey-document.ts';
import { clearRing } from './clear-ring.ts';
import { entriesOfRoom } from './entries-of-room.ts';

type Size = Pick<Entry, 'width_m' | 'depth_m' | 'rotation_deg'>;

/** Rows of places tried across the longer side of a room. */
const MOST_ROWS = 40;
const LEAST_STEP_M = 0.1;

/**
 * A place for the middle of a footprint where it stands in the room and over no entry, row by row from the lower left;
 * where nothing is free, a place well inside the room. Null for a room without floor.
 *
 * @param also footprints to keep clear of that are not recorded yet
 */
export function freePlace(
  document: SurveyDocument,
  roomId: string,
  size: Size,
  also: readonly (Size & Point)[] = [],
): Point | null {
  const clear = clearRing(document, roomId);
  if (clear === null) return null;
  const taken = [...entriesOfRoom(document, roomId), ...also].map((entry) => bounds(footprint(entry)));
  const own = bounds(footprint({ ...size, x_m: 0, y_m: 0 }));
  const room = bounds(clear.ring);
  const longer = Math.max(room.maxX_m - room.minX_m, room.maxY_m - room.minY_m);
  const step = Math.max(LEAST_STEP_M, longer / MOST_ROWS);
  for (let y_m = room.minY_m - own.minY_m; y_m <= room.maxY_m - own.maxY_m + 1e-9; y_m += step) {
    for (let x_m = room.minX_m - own.minX_m; x_m <= room.maxX_m - own.maxX_m + 1e-9; x_m += step) {
      const place = { x_m: roundToMillimetre(x_m), y_m: roundToMillimetre(y_m) };
      if (taken.some((box) => boundsOverlap(box, shifted(own, place)))) continue;
      if (ringInRegion(footprint({ ...size, ...place }), clear)) return place;
    }
  }
  const inside = interiorPoint(clear);
  return inside && { x_m: roundToMillimetre(inside.x_m), y_m: roundToMillimetre(inside.y_m) };
}

function shifted(box: Bounds, by: Point): Bounds {
  return {
    minX_m: box.minX_m + by.x_m,
    maxX_m: box.maxX_m + by.x_m,
    minY_m: box.minY_m + by.y_m,
    maxY_m: box.maxY_m + by.y_m,
  };
}
