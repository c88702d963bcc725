import { parseQuantity } from '@embertally/shared/units/parse-quantity';
import type { UnitSystem } from '@embertally/shared/units/unit-system';

interface TypedQuantity {
  readonly name: string;
  readonly unit: string;
  readonly system: UnitSystem;
  readonly minimum?: number;
  readonly maximum?: number;
}

export type ReadQuantity = { readonly value: number } | { readonly error: string };

/** A quantity typed into a form, in SI, or what to put right. */
export function readQuantity(text: string, field: TypedQuantity): ReadQuantity {
  const read = parseQuantity(text, field);
  return read.ok ? { value: read.value } : { error: read.message };
}
