import type { Atoms } from './atoms.ts';

export interface Polymer {
  readonly name: string;
  /** Atoms of the repeat unit. */
  readonly unit: Partial<Atoms>;
  /** Gross heat by oxygen bomb, MJ/kg. */
  readonly gross: number;
  /** Gross heat in the literature that report compares with, MJ/kg. */
  readonly grossLiterature: number;
}

/**
 * Polymers by repeat unit. Gross heats: Walters, Hackbarth & Lyon, Heats of combustion of high temperature polymers (FAA), p. 10;
 * its oxygen method is good to 4.4 %. Its polyethylene and polystyrene read high; handbooks stand nearer to the literature
 * column. A handbook "net" of 30.8 MJ/kg for nylon equals this gross of 30.9 and is taken as gross.
 */
export const POLYMERS: readonly Polymer[] = [
  { name: 'polyethylene', unit: { C: 2, H: 4 }, gross: 47.7, grossLiterature: 46.2 },
  { name: 'polypropylene', unit: { C: 3, H: 6 }, gross: 45.8, grossLiterature: 46.4 },
  { name: 'polystyrene', unit: { C: 8, H: 8 }, gross: 43.7, grossLiterature: 42.5 },
  { name: 'PMMA', unit: { C: 5, H: 8, O: 2 }, gross: 26.8, grossLiterature: 26.6 },
  { name: 'polycarbonate', unit: { C: 16, H: 14, O: 3 }, gross: 31.3, grossLiterature: 31.0 },
  { name: 'PET', unit: { C: 10, H: 8, O: 4 }, gross: 24.1, grossLiterature: 22.2 },
  { name: 'nylon 6/6', unit: { C: 12, H: 22, O: 2, N: 2 }, gross: 30.9, grossLiterature: 29.6 },
  { name: 'poly(vinyl alcohol)', unit: { C: 2, H: 4, O: 1 }, gross: 23.3, grossLiterature: 25.0 },
  { name: 'PPO', unit: { C: 8, H: 8, O: 1 }, gross: 34.2, grossLiterature: 34.6 },
];
