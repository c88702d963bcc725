import { defineMethod } from '../define-method.ts';
import { definition } from '../sources.ts';

/** Gas constant, kJ/(mol K). */
const R = 8.314462618e-3;
const inputs = {
  dn: { symbol: 'Δn', unit: '', quantity: 'Change of the moles of gas', valid: [-1000, 1000] },
  T: { symbol: 'T', unit: 'K', quantity: 'Temperature', valid: [250, 350] },
} as const;
const SOURCES = [definition('first law, ideal gas; R = 8.314462618 J/(mol K)')] as const;

/** Enthalpy from a bomb's change of internal energy, kJ/mol; negative where heat is released. */
export const constantPressure = defineMethod({
  id: 'calorimetry.constant-pressure',
  version: 1,
  title: 'From constant volume to constant pressure',
  symbol: 'ΔH',
  unit: 'kJ/mol',
  inputs: {
    dU: { symbol: 'ΔU', unit: 'kJ/mol', quantity: 'Change of internal energy', valid: [-1e6, 1e6] },
    ...inputs,
  },
  equation: 'ΔH = ΔU + Δn R T',
  sources: SOURCES,
  assumptions: ['Water liquid before and after.'],
  why: 'A bomb works at constant volume, tables and fires at constant pressure.',
  outOfRange: 'refuse',
  run: ({ dU, dn, T }) => dU + dn * R * T,
});

/** The change of internal energy a bomb would show, kJ/mol, from the enthalpy of tables. */
export const constantVolume = defineMethod({
  id: 'calorimetry.constant-volume',
  version: 1,
  title: 'From constant pressure to constant volume',
  symbol: 'ΔU',
  unit: 'kJ/mol',
  inputs: { dH: { symbol: 'ΔH', unit: 'kJ/mol', quantity: 'Enthalpy', valid: [-1e6, 1e6] }, ...inputs },
  equation: 'ΔU = ΔH − Δn R T',
  sources: SOURCES,
  assumptions: ['Water liquid before and after.'],
  why: 'To compare a table with a bomb.',
  outOfRange: 'refuse',
  run: ({ dH, dn, T }) => dH - dn * R * T,
});
