import type { Entry } from './survey-document.ts';

export interface CopyMaker {
  readonly recorded_by: string | null;
  readonly recorded_at: string | null;
}

/** An entry like another, recorded anew: nobody has confirmed it and the photos show the other one. */
export function entryCopy(entry: Entry, id: string, { recorded_by, recorded_at }: CopyMaker): Entry {
  return { ...entry, id, photos: [], recorded_by, recorded_at, confirmed_by: null, confirmed_at: null };
}
