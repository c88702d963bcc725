/** Elements whose combustion products are known to this book. */
export const ELEMENTS = ['C', 'H', 'O', 'N', 'S', 'F', 'Cl', 'Br'] as const;
export type Element = (typeof ELEMENTS)[number];

/** Atoms of each element in one mole of a substance; fractions stand for mean compositions such as wood. */
export type Atoms = Readonly<Record<Element, number>>;
