import { deriveMaterial } from '@embertally/shared/materials/derive-material';
import type { DerivedMaterial } from '@embertally/shared/materials/derived-material';
import type { MaterialDraft } from '@embertally/shared/materials/material-draft';
import type { KnownHeat } from '@embertally/shared/materials/material-lookup';
import { Fault } from '../fault.ts';
import { OwnMaterialRepository } from '../repositories/own-material-repository.ts';
import type { Statements } from '../repositories/database.ts';

interface PartVersion {
  readonly material: string;
  readonly version: number;
}

const keyOf = (material: string, version: number): string => `${material.toLowerCase()}@${version}`;

/**
 * What a draft gives, computed here and never taken from who sent it.
 * @throws Fault 422 with every reason at its field
 */
export async function deriveOwnMaterial(
  statements: Statements,
  organisationId: string,
  draft: MaterialDraft,
): Promise<DerivedMaterial> {
  const known = await knownParts(statements, organisationId, draft);
  const derivation = deriveMaterial(draft, (material, version) => known.get(keyOf(material, version)) ?? null);
  if (derivation.ok) return derivation.value;
  throw Fault.invalid(derivation.faults.map((fault) => ({ ...fault, pointer: `/draft${fault.pointer}` })));
}

/** Whether every own material that a draft is made of is still approved in the version it names. */
export async function partsStand(
  statements: Statements,
  organisationId: string,
  draft: MaterialDraft,
): Promise<boolean> {
  const wanted = new Set(ownParts(draft).map(({ material, version }) => keyOf(material, version)));
  return (await knownParts(statements, organisationId, draft)).size === wanted.size;
}

function ownParts(draft: MaterialDraft): PartVersion[] {
  if (draft.way !== 'composition') return [];
  return draft.parts.flatMap(({ material, version }) => (version === null ? [] : [{ material, version }]));
}

async function knownParts(
  statements: Statements,
  organisationId: string,
  draft: MaterialDraft,
): Promise<ReadonlyMap<string, KnownHeat>> {
  const parts = ownParts(draft).map(({ material, version }) => ({ material: material.toLowerCase(), version }));
  if (parts.length === 0) return new Map();
  const rows = await new OwnMaterialRepository(statements).approved(organisationId, parts);
  return new Map(
    rows.map(({ material_id, version, draft: { label }, derived }) => [
      keyOf(material_id, version),
      {
        label,
        net_MJ_kg: derived.net_MJ_kg,
        low_MJ_kg: derived.low_MJ_kg,
        high_MJ_kg: derived.high_MJ_kg,
        gross_MJ_kg: derived.gross_MJ_kg,
        cellulosic: derived.cellulosic,
        moisture_pct_wet: derived.moisture_pct_wet,
        radiative_fraction: derived.radiative_fraction,
      },
    ]),
  );
}
