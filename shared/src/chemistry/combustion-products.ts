import type { Atoms } from './atoms.ts';

/** Moles per mole of fuel. */
export interface CombustionProducts {
  readonly O2: number;
  readonly CO2: number;
  readonly H2O: number;
  readonly N2: number;
  readonly SO2: number;
  readonly HF: number;
  readonly HCl: number;
  readonly HBr: number;
}

/** Less oxygen than this per mole is taken as none. */
const LEAST_OXYGEN = 1e-9;

export type Combustion =
  { readonly ok: true; readonly products: CombustionProducts } | { readonly ok: false; readonly message: string };

/**
 * Complete combustion of CaHbOcNdSeXf to CO2, H2O, N2, SO2 and HX: ν = a + e + (b − f)/4 − c/2 mol of oxygen.
 * Not covered, and said so: more halogen than hydrogen, and a substance that needs no oxygen.
 */
export function combustionProducts(atoms: Atoms): Combustion {
  const halogen = atoms.F + atoms.Cl + atoms.Br;
  const hydrogen = atoms.H - halogen;
  if (hydrogen < 0)
    return {
      ok: false,
      message: `Hydrogen runs out: ${halogen} halogen atoms against ${atoms.H} of hydrogen. Such substances are not covered; give a measured heat.`,
    };
  const O2 = atoms.C + atoms.S + hydrogen / 4 - atoms.O / 2;
  if (!(O2 > LEAST_OXYGEN))
    return {
      ok: false,
      message:
        'By this formula it takes up no oxygen: it does not burn, or it burns on oxygen of its own. Not covered.',
    };
  const products = {
    O2,
    CO2: atoms.C,
    H2O: hydrogen / 2,
    N2: atoms.N / 2,
    SO2: atoms.S,
    HF: atoms.F,
    HCl: atoms.Cl,
    HBr: atoms.Br,
  };
  return { ok: true, products };
}
