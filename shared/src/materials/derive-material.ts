import { combustionProducts } from '../chemistry/combustion-products.ts';
import { OutOfRangeError } from '../methods/estimate.ts';
import { OXYGEN_G_MOL } from '../chemistry/molar-mass.ts';
import { combustionFactorOf } from './combustion-factor-of.ts';
import { deriveCurve } from './derive-curve.ts';
import type { DerivedMaterial } from './derived-material.ts';
import { DraftRefused } from './draft-refused.ts';
import type { MaterialDraft } from './material-draft.ts';
import type { MaterialFault } from './material-fault.ts';
import type { OwnMaterialLookup } from './material-lookup.ts';
import { settleHeat } from './settle-heat.ts';
import type { WayHeat } from './way-heat.ts';
import { heatFromBomb } from './ways/heat-from-bomb.ts';
import { heatFromComposition } from './ways/heat-from-composition.ts';
import { heatFromEquation } from './ways/heat-from-equation.ts';
import { heatFromFormula } from './ways/heat-from-formula.ts';
import { heatFromSupplier } from './ways/heat-from-supplier.ts';
import { heatFromUltimate } from './ways/heat-from-ultimate.ts';
import { Workbook } from './workbook.ts';

export type Derivation =
  | { readonly ok: true; readonly value: DerivedMaterial }
  | { readonly ok: false; readonly faults: readonly MaterialFault[] };

const USUAL_RADIATIVE = 0.35;
const LONGEST_SOURCE = 500;
/** Groups whose materials are taken for cellulosic while nobody says otherwise. */
const CELLULOSIC_GROUPS: ReadonlySet<string> = new Set(['wood and board', 'paper']);

/**
 * Everything the book needs of an own material, from what a person states of it. The same draft gives the same material in
 * the browser and on the server. A draft that gives none comes back with every reason, each at its field.
 *
 * @param lookup finds own materials that a composition is made of; only approved versions
 */
export function deriveMaterial(draft: MaterialDraft, lookup: OwnMaterialLookup): Derivation {
  const book = new Workbook();
  try {
    const heat = heatOf(book, draft, lookup);
    const settled = settleHeat(book, draft, heat);
    const curve = draft.curve === undefined ? null : deriveCurve(book, draft.curve);
    const cellulosic = draft.cellulosic ?? heat.cellulosic ?? CELLULOSIC_GROUPS.has(draft.group ?? '');
    return {
      ok: true,
      value: {
        ...settled,
        range_basis: heat.range_basis,
        heat_source: `Net, as received, from ${heat.rests_on}. ${draft.source}`.slice(0, LONGEST_SOURCE),
        moisture_pct_wet: heat.water === null ? null : 100 * heat.water,
        oxygen_kg_kg: oxygenOf(heat),
        cellulosic,
        combustion_factor: combustionFactorOf(cellulosic),
        ignition_class: draft.ignition_class ?? 'normal',
        radiative_fraction: draft.radiative_fraction ?? heat.radiative_fraction ?? USUAL_RADIATIVE,
        warnings: book.warnings,
        workings: book.workings,
        methods: [...new Set(book.workings.map(({ method }) => method))],
        curve,
      },
    };
  } catch (error) {
    if (error instanceof DraftRefused) return { ok: false, faults: error.faults };
    if (error instanceof OutOfRangeError)
      return { ok: false, faults: [{ pointer: '', code: 'not_possible', message: error.message }] };
    throw error;
  }
}

function heatOf(book: Workbook, draft: MaterialDraft, lookup: OwnMaterialLookup): WayHeat {
  switch (draft.way) {
    case 'formula':
      return heatFromFormula(book, draft);
    case 'equation':
      return heatFromEquation(book, draft);
    case 'bomb':
      return heatFromBomb(book, draft);
    case 'ultimate':
      return heatFromUltimate(book, draft);
    case 'supplier':
      return heatFromSupplier(book, draft, lookup);
    case 'composition':
      return heatFromComposition(book, draft, lookup);
  }
}

/** Oxygen per kg as it lies there; null without a composition that burns completely. */
function oxygenOf({ composition, water }: WayHeat): number | null {
  const combustion = composition === null ? null : combustionProducts(composition.atoms);
  if (composition === null || combustion?.ok !== true) return null;
  const dry = (OXYGEN_G_MOL * combustion.products.O2) / composition.mass_g;
  return dry * (1 - (water ?? 0));
}
