import type { CombustionProducts } from './combustion-products.ts';

/**
 * Enthalpies of formation at 298.15 K of what leaves a fire, kJ/mol, as read in the open data set `chemicals` 1.5.2 (CRC
 * Handbook, CODATA). HF is given between −272.5 and −273.3. The column `TRC` of that set holds 0 K values: never used here.
 */
const FORMATION_KJ_MOL = {
  CO2: -393.51,
  waterVapour: -241.826,
  waterLiquid: -285.83,
  SO2: -296.81,
  HF: -273.3,
  HCl: -92.31,
  HBr: -36.29,
} as const;

/** Heat of vaporisation of water at 25 °C, kJ/mol: what separates gross from net. */
export const VAPORISATION_KJ_MOL = FORMATION_KJ_MOL.waterVapour - FORMATION_KJ_MOL.waterLiquid;

/** Enthalpy of formation of all products of one mole of fuel with the water as vapour, kJ/mol; N2 counts nothing. */
export function formationOfProducts(products: CombustionProducts): number {
  return (
    products.CO2 * FORMATION_KJ_MOL.CO2 +
    products.H2O * FORMATION_KJ_MOL.waterVapour +
    products.SO2 * FORMATION_KJ_MOL.SO2 +
    products.HF * FORMATION_KJ_MOL.HF +
    products.HCl * FORMATION_KJ_MOL.HCl +
    products.HBr * FORMATION_KJ_MOL.HBr
  );
}
