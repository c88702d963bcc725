import type { UnitSystem } from '@embertally/shared/units/unit-system';
import type { OwnMaterialVersion } from '../api/material-version.ts';
import { ACCEPTED, CURVE, EVIDENCE } from './extras.ts';
import type { Values } from './field-spec.ts';
import { valuesOfDraft } from './values-of-draft.ts';

/** A version as it would have been typed: its fields, its curve, the correction that was taken over, its files. */
export function valuesOfVersion(
  version: OwnMaterialVersion,
  units: UnitSystem,
  nameOf: (key: string) => string,
): Values {
  const { draft, evidence } = version;
  return {
    ...valuesOfDraft(draft, units, nameOf),
    ...(draft.curve === undefined ? {} : { [CURVE]: JSON.stringify(draft.curve) }),
    ...(draft.accepted === undefined ? {} : { [ACCEPTED]: JSON.stringify(draft.accepted) }),
    ...(evidence.length === 0 ? {} : { [EVIDENCE]: JSON.stringify(evidence.map(({ id, name }) => ({ id, name }))) }),
  };
}
