import { completeCombustion } from '../../methods/chemistry/complete-combustion.ts';
import { heatFromEquation as equationMethod } from '../../methods/chemistry/heat-from-equation.ts';
import { substanceMass } from '../../methods/chemistry/substance-mass.ts';
import { figure } from '../../methods/figure.ts';
import { formulaComposition } from '../composition.ts';
import { DraftRefused } from '../draft-refused.ts';
import { equationFaults } from '../equation-faults.ts';
import { evidenceRange } from '../evidence-range.ts';
import type { DraftOf } from '../material-draft.ts';
import type { WayHeat } from '../way-heat.ts';
import type { Workbook } from '../workbook.ts';

/** From a thermochemical equation for n moles, or from a heat claimed for one mole: net and gross per kilogram, dry. */
export function heatFromEquation(book: Workbook, draft: DraftOf<'equation'>): WayHeat {
  const composition = formulaComposition(draft.formula);
  const { atoms } = composition;
  const place = { at: '/formula' };
  const faults = equationFaults(draft, composition);
  if (faults.length > 0) throw new DraftRefused(faults);
  book.run(substanceMass, atoms, place);
  book.outputs(completeCombustion, atoms, place, ['O2', 'oxygen', 'air']);
  const { heat } = draft;
  const asWritten = heat.as === 'equation';
  const at = asWritten ? '/heat/enthalpy_kJ' : '/heat/heat_kJ_mol';
  const { net, gross } = book.outputs(
    equationMethod,
    {
      ...atoms,
      n: asWritten ? heat.moles : 1,
      dH: asWritten ? heat.enthalpy_kJ : -heat.heat_kJ_mol,
      water: draft.water,
    },
    { at, inputs: { n: '/heat/moles' } },
    ['netPerMole', 'gross', 'net'],
    { origins: { n: 'given', dH: { origin: 'given', note: draft.source }, water: 'given' } },
  );
  return {
    state: 'dry',
    measured: draft.water === 'liquid' ? 'gross' : 'net',
    net_MJ_kg: net,
    gross_MJ_kg: gross,
    ...evidenceRange(net, 'exact'),
    water: null,
    composition,
    rests_on: asWritten
      ? `a thermochemical equation for ${figure(heat.moles)} mol of ${composition.name}, water as ${draft.water}`
      : `the heat of one mole of ${composition.name}, water as ${draft.water}`,
    pointer: at,
    suspects: asWritten
      ? 'how many moles of fuel the equation is written for'
      : 'whether the heat is for one mole, or for all the moles of the equation it was taken from',
  };
}
