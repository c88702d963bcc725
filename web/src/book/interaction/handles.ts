import { footprint } from '@embertally/shared/geometry/footprint';
import type { Point } from '@embertally/shared/geometry/point';
import type { Entry } from '@embertally/shared/survey/survey-document';
import { plus, turned } from './vector.ts';

/** What a handle of a picked entry does: one of the four corners resizes, the knob above turns it. */
export interface Handle {
  readonly action: 'resize' | 'turn';
  /** For resize: which way from the centre, in the entry's own directions. */
  readonly sx: -1 | 0 | 1;
  readonly sy: -1 | 0 | 1;
  readonly at: Point;
}

const SIGNS = [
  [-1, -1],
  [1, -1],
  [1, 1],
  [-1, 1],
] as const;

/** Distance of the turning knob from the entry's edge, px. */
export const KNOB_PX = 26;

/** The handles of an entry; `pxPerM` places the knob at a fixed distance on screen. */
export function handlesOf(entry: Entry, pxPerM: number): readonly Handle[] {
  const corners = footprint(entry).map((at, index): Handle => {
    const [sx, sy] = SIGNS[index] ?? SIGNS[0];
    return { action: 'resize', sx, sy, at };
  });
  const out = turned({ x_m: 0, y_m: entry.depth_m / 2 + KNOB_PX / pxPerM }, entry.rotation_deg);
  return [...corners, { action: 'turn', sx: 0, sy: 1, at: plus(entry, out) }];
}
