import type { DerivedMaterial } from './derived-material.ts';
import type { MaterialDraft } from './material-draft.ts';
import type { MaterialFault } from './material-fault.ts';
import type { OwnMaterialLookup } from './material-lookup.ts';

export type Derivation =
  | { readonly ok: true; readonly value: DerivedMaterial }
  | { readonly ok: false; readonly faults: readonly MaterialFault[] };

export function deriveMaterial(draft: MaterialDraft, lookup: OwnMaterialLookup): Derivation {
  void lookup;
  return {
    ok: false,
    faults: [{ pointer: '/way', code: 'not_covered', message: `The way ${draft.way} is not ready.` }],
  };
}
