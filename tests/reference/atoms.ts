import type { Atoms } from '@embertally/shared/chemistry/atoms';

/** Counts of the elements named, 0 of the others. */
export function atoms(given: Partial<Atoms>): Atoms {
  return { C: 0, H: 0, O: 0, N: 0, S: 0, F: 0, Cl: 0, Br: 0, ...given };
}
