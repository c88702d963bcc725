import { ATOMIC_WEIGHTS, molarMass } from '../chemistry/molar-mass.ts';
import type { Atoms } from '../chemistry/atoms.ts';
import { parseFormula } from '../chemistry/parse-formula.ts';
import { figure } from '../methods/figure.ts';
import { DraftRefused } from './draft-refused.ts';
import type { ElementsDraft } from './drafts/elements-draft.ts';

/** What the dry material is made of: one mole by its formula, or 100 g by an analysis. */
export interface Composition {
  readonly by: 'formula' | 'elements';
  readonly name: string;
  readonly pointer: string;
  readonly atoms: Atoms;
  /** Mass that these atoms, and ash beside them, stand for, g. */
  readonly mass_g: number;
}

/** Shares of the dry mass, kg/kg. */
export interface Shares {
  readonly w_C: number;
  readonly w_H: number;
  readonly w_O: number;
  readonly w_N: number;
  readonly w_S: number;
  readonly w_Cl: number;
  readonly w_ash: number;
}

/** How far an analysis with measured oxygen may miss 100 %. */
const SUM_GAP_PCT = 2;
/** Less than nothing by rounding. */
const ROUNDING_PCT = 0.5;

/** @throws DraftRefused where the formula cannot be read */
export function formulaComposition(formula: string, pointer = '/formula'): Composition {
  const parsed = parseFormula(formula);
  if (!parsed.ok) throw DraftRefused.at(pointer, 'formula', parsed.message);
  return { by: 'formula', name: formula.trim(), pointer, atoms: parsed.atoms, mass_g: molarMass(parsed.atoms) };
}

/**
 * Shares of an analysis as fractions; oxygen by difference where it is not stated.
 * @param others percent of the same whole that are neither element nor ash, such as water
 * @throws DraftRefused where the shares do not add up to 100 %
 */
export function sharesOf(elements: ElementsDraft, pointer = '/elements', others = 0): Shares {
  const { carbon_pct, hydrogen_pct, nitrogen_pct = 0, sulfur_pct = 0, chlorine_pct = 0, ash_pct = 0 } = elements;
  const named = carbon_pct + hydrogen_pct + nitrogen_pct + sulfur_pct + chlorine_pct + ash_pct + others;
  const rest = 100 - named;
  const sum = named + (elements.oxygen_pct ?? 0);
  if (elements.oxygen_pct === undefined ? rest < -ROUNDING_PCT : Math.abs(sum - 100) > SUM_GAP_PCT)
    throw DraftRefused.at(
      pointer,
      'sum',
      elements.oxygen_pct === undefined
        ? `Without oxygen the shares already add up to ${figure(named)} %. Check them, and what they are shares of.`
        : `The shares add up to ${figure(sum)} %, not 100 %. Check them, or leave oxygen out: it is then the rest.`,
    );
  if (carbon_pct + hydrogen_pct + sulfur_pct === 0)
    throw DraftRefused.at(pointer, 'nothing_burns', 'There is no carbon, hydrogen or sulfur: nothing in it burns.');
  return {
    w_C: carbon_pct / 100,
    w_H: hydrogen_pct / 100,
    w_O: Math.max(0, elements.oxygen_pct ?? rest) / 100,
    w_N: nitrogen_pct / 100,
    w_S: sulfur_pct / 100,
    w_Cl: chlorine_pct / 100,
    w_ash: ash_pct / 100,
  };
}

/** 100 g of the dry material, as atoms. */
export function elementsComposition(shares: Shares, pointer = '/elements'): Composition {
  const { C, H, O, N, S, Cl } = ATOMIC_WEIGHTS;
  const atoms: Atoms = {
    C: (100 * shares.w_C) / C,
    H: (100 * shares.w_H) / H,
    O: (100 * shares.w_O) / O,
    N: (100 * shares.w_N) / N,
    S: (100 * shares.w_S) / S,
    F: 0,
    Cl: (100 * shares.w_Cl) / Cl,
    Br: 0,
  };
  return { by: 'elements', name: 'this composition', pointer, atoms, mass_g: 100 };
}

/** Hydrogen that leaves as water, kg per kg of dry material; what is bound as acid of a halogen is taken off. */
export function waterHydrogen({ atoms, mass_g, pointer }: Composition): number {
  const moles = atoms.H - atoms.F - atoms.Cl - atoms.Br;
  if (moles < 0)
    throw DraftRefused.at(
      pointer,
      'hydrogen_runs_out',
      'Hydrogen runs out: there is more halogen than hydrogen to bind it. Such materials are not covered; state a measured net heat.',
    );
  return (moles * ATOMIC_WEIGHTS.H) / mass_g;
}
