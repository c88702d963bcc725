/** Parts of a sum Σ M·H, as lists of equal length, and terms of their own that add in quadrature. */
export interface FirstOrderInput {
  readonly M: readonly number[];
  readonly H: readonly number[];
  readonly u_M: readonly number[];
  readonly u_H: readonly number[];
  /** Parts with the same number share one error of mass. */
  readonly entry: readonly number[];
  /** Parts with the same number share one error of heat. */
  readonly material: readonly number[];
  readonly u_psi: readonly number[];
}

/**
 * Standard uncertainty of Σ M·H to first order. Errors that are shared add linearly before they are squared; the others
 * add in quadrature. Unit: that of M·H.
 */
export function firstOrder({ M, H, u_M, u_H, entry, material, u_psi }: FirstOrderInput): number {
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
}
