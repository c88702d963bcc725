import type { Entry } from '@embertally/shared/survey/survey-document';

/** Mass of one piece of an entry, kg. */
export function entryMass(entry: Pick<Entry, 'parts'>): number {
  return entry.parts.reduce((sum, part) => sum + part.mass_kg, 0);
}
