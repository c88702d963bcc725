import { useByKey } from '../catalogue/uses.ts';
import type { RoomInput } from './room-input.ts';

/** Coefficient of variation behind EN 1991-1-2 Table E.4, for uses without a survey of their own. */
const USUAL_VARIATION = 0.3;

/** What the surveyed amount stands for, and how much rooms of the use differ. */
export function loadBasis({ room, options }: RoomInput) {
  const use = room.use == null ? undefined : useByKey(room.use);
  return { basis: options?.load_basis ?? 'as_surveyed', V: use?.distribution?.cov ?? USUAL_VARIATION };
}
