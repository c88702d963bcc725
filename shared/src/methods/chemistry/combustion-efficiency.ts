import { defineMethod } from '../define-method.ts';
import { recalled } from '../sources.ts';

/** Share of the net heat that is really released, and the share of that which is radiated. */
export const combustionEfficiency = defineMethod({
  id: 'chemistry.combustion-efficiency',
  version: 1,
  title: 'Combustion efficiency and radiative fraction',
  symbol: 'χ',
  unit: '',
  inputs: {
    dH_T: { symbol: 'ΔH_T', unit: 'MJ/kg', quantity: 'Net heat of complete combustion', valid: [0.1, 150] },
    dH_ch: { symbol: 'ΔH_ch', unit: 'MJ/kg', quantity: 'Chemical heat', valid: [0.1, 150] },
    dH_rad: { symbol: 'ΔH_rad', unit: 'MJ/kg', quantity: 'Radiated heat', valid: [0, 150] },
  },
  equation: 'χ = ΔH_ch/ΔH_T;  χ_r = ΔH_rad/ΔH_ch',
  sources: [recalled('Tewarson, SFPE Handbook of Fire Protection Engineering', 'definitions and tables of yields')],
  assumptions: [
    'Well ventilated.',
    'χ, the factor m = 0.8 of EN 1991-1-2 and an effective heat all describe incomplete combustion: only one is used.',
  ],
  why: 'Radiation to neighbours is a share of the chemical heat, not of the net heat.',
  outOfRange: 'refuse',
  outputs: {
    chi: { symbol: 'χ', unit: '', quantity: 'Combustion efficiency' },
    radiative: { symbol: 'χ_r', unit: '', quantity: 'Radiative fraction' },
  },
  run: ({ dH_T, dH_ch, dH_rad }) => ({ chi: dH_ch / dH_T, radiative: dH_rad / dH_ch }),
});
