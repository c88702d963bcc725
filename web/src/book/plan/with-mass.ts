import type { EntryPart } from '@embertally/shared/survey/survey-document';

/**
 * The parts of an entry when one piece of it weighs so much: each part keeps its share. Parts that weighed nothing share
 * the mass evenly.
 * @param mass_kg of one piece
 */
export function withMass(parts: readonly EntryPart[], mass_kg: number): EntryPart[] {
  const before = parts.reduce((sum, part) => sum + part.mass_kg, 0);
  return parts.map((part) => ({
    ...part,
    mass_kg: before === 0 ? mass_kg / parts.length : (part.mass_kg * mass_kg) / before,
  }));
}
