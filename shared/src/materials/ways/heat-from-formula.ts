import { completeCombustion } from '../../methods/chemistry/complete-combustion.ts';
import { heatFromFormation } from '../../methods/chemistry/heat-from-formation.ts';
import { substanceMass } from '../../methods/chemistry/substance-mass.ts';
import { formulaComposition } from '../composition.ts';
import { evidenceRange } from '../evidence-range.ts';
import type { DraftOf } from '../material-draft.ts';
import type { WayHeat } from '../way-heat.ts';
import type { Workbook } from '../workbook.ts';

/** From the formula and the enthalpy of formation: net and gross per kilogram, dry. */
export function heatFromFormula(book: Workbook, draft: DraftOf<'formula'>): WayHeat {
  const composition = formulaComposition(draft.formula);
  const { atoms } = composition;
  const place = { at: '/formula' };
  book.run(substanceMass, atoms, place);
  book.outputs(completeCombustion, atoms, place, ['O2', 'oxygen', 'air']);
  const { net, gross } = book.outputs(
    heatFromFormation,
    { ...atoms, dH_f: draft.formation_kJ_mol },
    { at: '/formula', inputs: { dH_f: '/formation_kJ_mol' } },
    ['netPerMole', 'gross', 'net'],
    { origins: { dH_f: { origin: 'given', note: `${draft.phase}; ${draft.source}` } } },
  );
  return {
    state: 'dry',
    measured: 'net',
    net_MJ_kg: net,
    gross_MJ_kg: gross,
    ...evidenceRange(net, 'exact'),
    water: null,
    composition,
    rests_on: `the formula ${composition.name} (${draft.phase}) and its enthalpy of formation`,
    pointer: '/formation_kJ_mol',
    suspects: 'the sign of the enthalpy of formation, whether it is for one mole, the phase and the formula',
  };
}
