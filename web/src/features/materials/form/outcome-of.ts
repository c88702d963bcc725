import { deriveMaterial } from '@embertally/shared/materials/derive-material';
import type { DerivedMaterial } from '@embertally/shared/materials/derived-material';
import type { OwnMaterialLookup } from '@embertally/shared/materials/material-lookup';
import type { ReadDraft } from './read-draft.ts';

export type Outcome =
  | { readonly kind: 'unfinished'; readonly messages: readonly string[] }
  | { readonly kind: 'refused'; readonly messages: readonly string[] }
  | { readonly kind: 'derived'; readonly derived: DerivedMaterial };

/** What a draft comes to while it is being typed. Name and source are not needed to see its heat. */
export function outcomeOf(read: ReadDraft, lookup: OwnMaterialLookup): Outcome {
  if (!read.ok) return { kind: 'unfinished', messages: Object.values(read.errors) };
  const derived = deriveMaterial(read.draft, lookup);
  if (derived.ok) return { kind: 'derived', derived: derived.value };
  return { kind: 'refused', messages: derived.faults.map(({ message }) => message) };
}
