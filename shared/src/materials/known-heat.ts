import { materialByKey } from '../catalogue/materials.ts';
import type { KnownHeat, OwnMaterialLookup } from './material-lookup.ts';

/** A material by its key (built in) or its id and version (own); null where there is none. */
export function knownHeat(material: string, version: number | null, lookup: OwnMaterialLookup): KnownHeat | null {
  if (version !== null) return lookup(material, version);
  const row = materialByKey(material);
  if (row === undefined) return null;
  const dryBasis = row.moisture_pct_dry;
  return {
    label: row.label,
    net_MJ_kg: row.net_heat_MJ_kg,
    low_MJ_kg: row.low_MJ_kg,
    high_MJ_kg: row.high_MJ_kg,
    gross_MJ_kg: row.gross_heat_MJ_kg,
    cellulosic: row.cellulosic,
    moisture_pct_wet: dryBasis === null ? null : dryBasis / (1 + dryBasis / 100),
    radiative_fraction: row.radiative_fraction,
  };
}
