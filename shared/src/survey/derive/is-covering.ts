import type { Entry } from '../survey-document.ts';

/** Thinner than this an entry is a covering of the floor, not a thing that stands on it, m. */
const COVERING_M = 0.05;

/** A carpet or vinyl: things stand on it, and the shading of the room shows through. */
export function isCovering(entry: Pick<Entry, 'height_m' | 'base_height_m'>): boolean {
  return entry.height_m <= COVERING_M && entry.base_height_m < COVERING_M;
}
