import { defineMethod } from '../define-method.ts';
import { gum } from '../sources.ts';

/** Standard uncertainty of a fire load, MJ, first order, with heat values shared between parts. */
export const fireLoadUncertainty = defineMethod({
  id: 'uncertainty.fire-load',
  version: 1,
  title: 'Standard uncertainty of the fire load',
  symbol: 'u(Q)',
  unit: 'MJ',
  inputs: {
    M: { symbol: 'M_i ψ_i', unit: 'kg', quantity: 'Mass that counts', valid: [0, Infinity], list: true },
    H: { symbol: 'H_i', unit: 'MJ/kg', quantity: 'Net heat', valid: [0, 150], list: true },
    u_M: {
      symbol: 'u(M_i) ψ_i',
      unit: 'kg',
      quantity: 'Standard uncertainty of the mass',
      valid: [0, Infinity],
      list: true,
    },
    u_H: { symbol: 'u(H_i)', unit: 'MJ/kg', quantity: 'Standard uncertainty of the heat', valid: [0, 150], list: true },
    entry: { symbol: '', unit: '', quantity: 'Which parts were measured together', valid: [0, Infinity], list: true },
    material: { symbol: '', unit: '', quantity: 'Which parts share one heat value', valid: [0, Infinity], list: true },
    u_psi: { symbol: 'u_ψ', unit: 'MJ', quantity: 'Uncertainty from cabinets', valid: [0, Infinity], list: true },
  },
  equation: 'u²(Q) = Σ_entries (Σ H u_M)² + Σ_materials (Σ M u_H)² + Σ u_ψ²',
  sources: [gum('5.1.2 independent, 5.2.2 correlated inputs')],
  assumptions: [
    'Parts of one entry were measured together; parts of one material share one heat value.',
    'First order: the product terms of two uncertainties are left out.',
  ],
  why: 'Treating a shared heat value as independent would understate the uncertainty.',
  outOfRange: 'refuse',
  run({ M, H, u_M, u_H, entry, material, u_psi }) {
    // What is shared adds linearly before it is squared; everything else adds in quadrature.
    const byEntry = new Map<number, number>();
    const byMaterial = new Map<number, number>();
    for (let i = 0; i < M.length; i += 1) {
      byEntry.set(entry[i]!, (byEntry.get(entry[i]!) ?? 0) + H[i]! * u_M[i]!);
      byMaterial.set(material[i]!, (byMaterial.get(material[i]!) ?? 0) + M[i]! * u_H[i]!);
    }
    let variance = 0;
    for (const term of byEntry.values()) variance += term * term;
    for (const term of byMaterial.values()) variance += term * term;
    for (const term of u_psi) variance += term * term;
    return Math.sqrt(variance);
  },
});
