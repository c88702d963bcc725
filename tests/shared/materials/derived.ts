import { expect } from 'vitest';
import { deriveMaterial } from '@embertally/shared/materials/derive-material';
import type { DerivedMaterial } from '@embertally/shared/materials/derived-material';
import type { MaterialFault } from '@embertally/shared/materials/material-fault';
import type { OwnMaterialLookup } from '@embertally/shared/materials/material-lookup';
import { parseMaterialDraft } from '@embertally/shared/materials/parse-material-draft';

export const NO_OWN_MATERIALS: OwnMaterialLookup = () => null;

type Stated = Readonly<Record<string, unknown>>;

/** The material of a draft that has to give one; name and source are filled in. */
export function derived(stated: Stated, lookup = NO_OWN_MATERIALS): DerivedMaterial {
  const parsed = parseMaterialDraft({ label: 'Sample', source: 'Report 12', ...stated });
  expect(parsed.ok ? [] : parsed.faults).toEqual([]);
  if (!parsed.ok) throw new Error('The draft cannot be read.');
  const derivation = deriveMaterial(parsed.draft, lookup);
  expect(derivation.ok ? [] : derivation.faults).toEqual([]);
  if (!derivation.ok) throw new Error('The draft gives no material.');
  return derivation.value;
}

/** Every fault of a draft that must not give a material, whether its fields or their meaning are wrong. */
export function faultsOf(stated: Stated, lookup = NO_OWN_MATERIALS): readonly MaterialFault[] {
  const parsed = parseMaterialDraft({ label: 'Sample', source: 'Report 12', ...stated });
  if (!parsed.ok) return parsed.faults;
  const derivation = deriveMaterial(parsed.draft, lookup);
  return derivation.ok ? [] : derivation.faults;
}
