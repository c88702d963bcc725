import type { Atoms } from '../../chemistry/atoms.ts';
import { combustionProducts, type CombustionProducts } from '../../chemistry/combustion-products.ts';
import { OutOfRangeError } from '../estimate.ts';

/** Products of complete combustion. @throws OutOfRangeError where the formula is not covered. */
export function burn(atoms: Atoms): CombustionProducts {
  const combustion = combustionProducts(atoms);
  if (!combustion.ok) throw new OutOfRangeError(combustion.message);
  return combustion.products;
}
