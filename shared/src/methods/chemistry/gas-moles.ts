import { defineMethod } from '../define-method.ts';
import { definition } from '../sources.ts';
import { ATOM_INPUTS } from './atom-inputs.ts';
import { burn } from './burn.ts';

/** Change of the moles of gas when one mole burns to liquid water. */
export const gasMoles = defineMethod({
  id: 'chemistry.gas-moles',
  version: 1,
  title: 'Change of the moles of gas',
  symbol: 'Δn',
  unit: '',
  inputs: { ...ATOM_INPUTS, phase: { symbol: '', quantity: 'The fuel is', choices: ['gas', 'liquid', 'solid'] } },
  equation: 'Δn = a + d/2 + e + f − ν, less 1 for a fuel that is a gas',
  sources: [definition('mole balance, water liquid, acids of halogens as gas')],
  assumptions: ['All water is liquid, as in a bomb after its run.'],
  why: 'It is what separates a bomb’s constant-volume heat from the constant-pressure heat of tables.',
  outOfRange: 'refuse',
  run({ phase, ...atoms }) {
    const { O2, CO2, N2, SO2, HF, HCl, HBr } = burn(atoms);
    return CO2 + N2 + SO2 + HF + HCl + HBr - O2 - (phase === 'gas' ? 1 : 0);
  },
});
