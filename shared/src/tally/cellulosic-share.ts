import type { EstimateWarning } from '../methods/estimate.ts';
import type { EntryHeat } from './entry-heats.ts';

/** Below this share of the heat the parametric curve is not used; our own threshold from common practice. */
export const LEAST_CELLULOSIC = 0.8;

export const NOT_CELLULOSIC: EstimateWarning = {
  code: 'NOT_CELLULOSIC',
  text: 'More than a fifth of the heat is in liquids or plastics, which burn hotter and sooner than the method assumes.',
};

/** Share of the heat that is cellulosic, 0 to 1; 1 while nothing burns. */
export function cellulosicShare(heats: readonly EntryHeat[]): number {
  let cellulosic = 0;
  let all = 0;
  for (const { parts } of heats) {
    for (const { part, counted } of parts) {
      all += counted;
      if (part.cellulosic) cellulosic += counted;
    }
  }
  return all > 0 ? cellulosic / all : 1;
}
