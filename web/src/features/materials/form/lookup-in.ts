import type { OwnMaterialLookup } from '@embertally/shared/materials/material-lookup';
import type { CatalogueMaterial } from '../../../lib/catalogue-materials.ts';

/** Finds own materials by id and version among those that may be placed. */
export function lookupIn(materials: readonly CatalogueMaterial[]): OwnMaterialLookup {
  const own = new Map(
    materials.flatMap((row) => (row.own === null ? [] : [[`${row.key} ${row.own.version}`, row] as const])),
  );
  return (material, version) => {
    const row = own.get(`${material} ${version}`);
    return row === undefined
      ? null
      : {
          label: row.label,
          net_MJ_kg: row.net_heat_MJ_kg,
          low_MJ_kg: row.low_MJ_kg,
          high_MJ_kg: row.high_MJ_kg,
          gross_MJ_kg: row.gross_heat_MJ_kg,
          cellulosic: row.cellulosic,
          moisture_pct_wet: row.own?.moisture_pct_wet ?? null,
          radiative_fraction: row.radiative_fraction,
        };
  };
}
