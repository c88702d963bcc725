import { readEquation } from '../chemistry/read-equation.ts';
import { ELEMENTS } from '../chemistry/atoms.ts';
import { figure } from '../methods/figure.ts';
import type { Composition } from './composition.ts';
import type { DraftOf } from './material-draft.ts';
import type { MaterialFault } from './material-fault.ts';

/** What does not fit in a stated equation: its sign, its balance, its moles, its fuel, the state of its water. */
export function equationFaults(draft: DraftOf<'equation'>, composition: Composition): MaterialFault[] {
  const { heat } = draft;
  if (heat.as !== 'equation') return [];
  const faults: MaterialFault[] = [];
  const add = (pointer: string, code: string, message: string) => faults.push({ pointer, code, message });
  if (!(heat.enthalpy_kJ < 0))
    add(
      '/heat/enthalpy_kJ',
      'sign',
      heat.enthalpy_kJ === 0
        ? 'An equation of combustion has a heat other than 0.'
        : `Heat that leaves is written with a minus sign: −${figure(heat.enthalpy_kJ)} kJ. As it stands the fuel would take heat up.`,
    );
  if (heat.text === undefined || heat.text.trim() === '') return faults;
  const read = readEquation(heat.text);
  if (!read.ok) {
    add('/heat/text', 'equation', read.message);
    return faults;
  }
  const { fuel, moles, water } = read.equation;
  if (ELEMENTS.some((element) => fuel[element] !== composition.atoms[element]))
    add('/formula', 'other_fuel', `The equation burns ${read.equation.formula}, not ${composition.name}.`);
  if (Math.abs(moles / heat.moles - 1) > 1e-6)
    add(
      '/heat/moles',
      'other_moles',
      `The equation is written for ${figure(moles)} mol of fuel, not for ${figure(heat.moles)}.`,
    );
  if (water !== null && water !== draft.water)
    add('/water', 'other_water', `The equation has its water as ${water}, not as ${draft.water}.`);
  return faults;
}
