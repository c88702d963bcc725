/** A material that a composition or a comparison refers to, as it stands in the catalogue or in an approved version. */
export interface KnownHeat {
  readonly label: string;
  readonly net_MJ_kg: number;
  readonly low_MJ_kg: number;
  readonly high_MJ_kg: number;
  readonly gross_MJ_kg: number | null;
  readonly cellulosic: boolean;
  /** Water that the heats include, percent of wet mass; null where it does not apply. */
  readonly moisture_pct_wet: number | null;
  readonly radiative_fraction: number;
}

/** Finds an own material of an approved version; built-in ones are found without it. Null: not there, or not approved. */
export type OwnMaterialLookup = (material: string, version: number) => KnownHeat | null;
