export interface PoolFuel {
  readonly key: string;
  readonly name: string;
  /** Burning rate of a very large pool, kg/m²s. */
  readonly rate: number;
  /** kβ, 1/m; null: the rate does not depend on the diameter above 0.6 m. */
  readonly kBeta: number | null;
  /** kg/m³ */
  readonly density: number;
  /** Net heat of the table, MJ/kg; the catalogue of materials may know better. */
  readonly heat: number;
}

/**
 * Pool fires: Babrauskas, Estimating large pool fire burning rates, Fire Technology 19 (1983) 251, and later reprints; all from
 * memory. Known slips: reprints show "kβ = 100" for alcohols, which is a code for "independent"; liquid hydrogen as 0.017;
 * acetone 25.8 is an old heat (28.5 from formation enthalpies); transformer oil 46.4 looks gross; diesel is not in the 1983
 * table but in later ones.
 */
export const POOL_FUELS: readonly PoolFuel[] = [
  { key: 'methanol', name: 'Methanol', rate: 0.017, kBeta: null, density: 796, heat: 20.0 },
  { key: 'ethanol', name: 'Ethanol', rate: 0.015, kBeta: null, density: 794, heat: 26.8 },
  { key: 'butane', name: 'Butane', rate: 0.078, kBeta: 2.7, density: 573, heat: 45.7 },
  { key: 'benzene', name: 'Benzene', rate: 0.085, kBeta: 2.7, density: 874, heat: 40.1 },
  { key: 'hexane', name: 'Hexane', rate: 0.074, kBeta: 1.9, density: 650, heat: 44.7 },
  { key: 'heptane', name: 'Heptane', rate: 0.101, kBeta: 1.1, density: 675, heat: 44.6 },
  { key: 'xylene', name: 'Xylene', rate: 0.09, kBeta: 1.4, density: 870, heat: 40.8 },
  { key: 'acetone', name: 'Acetone', rate: 0.041, kBeta: 1.9, density: 791, heat: 25.8 },
  { key: 'dioxane', name: 'Dioxane', rate: 0.018, kBeta: 5.4, density: 1035, heat: 26.2 },
  { key: 'diethyl-ether', name: 'Diethyl ether', rate: 0.085, kBeta: 0.7, density: 714, heat: 34.2 },
  { key: 'benzine', name: 'Benzine', rate: 0.048, kBeta: 3.6, density: 740, heat: 44.7 },
  { key: 'gasoline', name: 'Petrol', rate: 0.055, kBeta: 2.1, density: 740, heat: 43.7 },
  { key: 'kerosene', name: 'Kerosene', rate: 0.039, kBeta: 3.5, density: 820, heat: 43.2 },
  { key: 'diesel', name: 'Diesel', rate: 0.045, kBeta: 2.1, density: 918, heat: 44.4 },
  { key: 'jp-4', name: 'JP-4', rate: 0.051, kBeta: 3.6, density: 760, heat: 43.5 },
  { key: 'jp-5', name: 'JP-5', rate: 0.054, kBeta: 1.6, density: 810, heat: 43.0 },
  { key: 'transformer-oil', name: 'Transformer oil', rate: 0.039, kBeta: 0.7, density: 760, heat: 46.4 },
  { key: 'heavy-fuel-oil', name: 'Heavy fuel oil', rate: 0.035, kBeta: 1.7, density: 970, heat: 39.7 },
  { key: 'crude-oil', name: 'Crude oil', rate: 0.034, kBeta: 2.8, density: 855, heat: 42.6 },
  { key: 'pmma', name: 'PMMA', rate: 0.02, kBeta: 3.3, density: 1184, heat: 24.9 },
  { key: 'lng', name: 'LNG', rate: 0.078, kBeta: 1.1, density: 415, heat: 50.0 },
  { key: 'lpg', name: 'LPG', rate: 0.099, kBeta: 1.4, density: 585, heat: 46.0 },
  { key: 'liquid-hydrogen', name: 'Liquid hydrogen', rate: 0.169, kBeta: 6.1, density: 70, heat: 120.0 },
];
