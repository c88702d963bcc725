import { checkBasis, type BasisCheck } from '../chemistry/basis-check.ts';
import { combustionProducts } from '../chemistry/combustion-products.ts';
import { basisDetector } from '../methods/chemistry/basis-detector.ts';
import { netDry } from '../methods/heat/net-dry.ts';
import { basisProposal } from './basis-proposal.ts';
import { compareHeat } from './compare-heat.ts';
import type { Composition } from './composition.ts';
import type { MaterialBasis } from './derived-material.ts';
import type { MaterialWay } from './material-draft.ts';
import type { WayHeat } from './way-heat.ts';
import type { Workbook } from './workbook.ts';

/** What the check says before anybody took a proposal over. */
export type FoundBasis = Pick<MaterialBasis, 'finding' | 'text' | 'perOxygen_MJ_kg' | 'proposal'>;

/**
 * Holds a way's net heat against the oxygen its composition takes up, then against what else is known of it; nothing is
 * changed. Null where there is nothing to hold it against.
 */
export function materialBasis(book: Workbook, way: MaterialWay, heat: WayHeat): FoundBasis | null {
  if (!(heat.net_MJ_kg > 0)) return null;
  const byOxygen = heat.composition === null ? null : oxygenBasis(book, way, heat, heat.composition);
  // A slip in the moles explains more than anything else; what else the oxygen finds, a like material explains better.
  if (byOxygen?.finding === 'wrong-mole-basis') return byOxygen;
  const compared = compareHeat(heat);
  return compared === null ? byOxygen : { ...compared, perOxygen_MJ_kg: byOxygen?.perOxygen_MJ_kg ?? null };
}

function oxygenBasis(book: Workbook, way: MaterialWay, heat: WayHeat, composition: Composition): FoundBasis {
  const { atoms, mass_g, by } = composition;
  const dry =
    heat.state === 'received' && heat.water !== null
      ? netDry.run({ H_ar: heat.net_MJ_kg, w: heat.water })
      : heat.net_MJ_kg;
  const net = dry * mass_g;
  const covered = combustionProducts(atoms).ok;
  if (covered)
    book.outputs(basisDetector, { ...atoms, net }, { at: heat.pointer }, ['perOxygen'], {
      steps: by === 'elements' ? [{ text: 'Per 100 g of dry material instead of one mole' }] : [],
    });
  const check = checkBasis(atoms, net);
  const found = (finding: BasisCheck['finding'], text: string, factor: number | null): FoundBasis => ({
    finding,
    text,
    perOxygen_MJ_kg: check.perOxygen,
    proposal: factor === null ? null : basisProposal(heat, factor),
  });
  if (check.finding !== 'wrong-mole-basis' || check.factor === null)
    return found(check.finding, check.text, check.factor);
  // An enthalpy of formation is one term of a sum: no factor on the result mends it.
  if (way === 'formula')
    return found('implausible', `${timesText(check.factor, composition)} Check ${heat.suspects}.`, null);
  return found(
    'wrong-mole-basis',
    way === 'equation'
      ? `${timesText(check.factor, composition)} ${check.text} Check ${heat.suspects}.`
      : `${timesText(check.factor, composition)} Something was counted too often or too seldom: check ${heat.suspects}.`,
    factorOnNet(heat, check.factor),
  );
}

/** Measured gross, a slip is one of the gross heat: the heat in the water stays what it is. */
function factorOnNet({ measured, net_MJ_kg, gross_MJ_kg }: WayHeat, factor: number): number {
  if (measured === 'net' || gross_MJ_kg === null) return factor;
  return (factor * gross_MJ_kg - (gross_MJ_kg - net_MJ_kg)) / net_MJ_kg;
}

function timesText(factor: number, { name }: Composition): string {
  return factor < 1
    ? `By the oxygen that ${name} takes up, this heat is about ${Math.round(1 / factor)} times as high as it can be.`
    : `By the oxygen that ${name} takes up, this heat is only about 1/${factor} of what it should be.`;
}
