import type { CatalogueSource, Hazard, IgnitionClass, Material, MaterialGroup } from './catalogue-row.ts';

/** typical, low, high */
type Triple = readonly [number, number, number];

interface MaterialDraft {
  readonly key: string;
  readonly label: string;
  readonly synonyms?: readonly string[];
  readonly heat_MJ_kg: Triple;
  readonly gross_MJ_kg?: number;
  readonly formula?: string;
  readonly ignition: IgnitionClass;
  readonly radiative?: number;
  readonly soot?: number;
  readonly co?: number;
  readonly density_kg_m3?: Triple;
  readonly moisture_pct_dry?: number;
  readonly hazards?: readonly Hazard[];
  readonly source: CatalogueSource;
}

/** What the rows of one group share. */
interface MaterialFamily {
  readonly group: MaterialGroup;
  readonly cellulosic: boolean;
  readonly radiative: number;
  readonly hazards?: readonly Hazard[];
}

/**
 * Writes out the rows of one family of materials: the combustion factor follows from `cellulosic` (EN 1991-1-2 E.3: 0.8
 * for mainly cellulosic goods, 1 for all others), and a row without a figure of its own takes the family's.
 */
export function materialRows(family: MaterialFamily, drafts: readonly MaterialDraft[]): readonly Material[] {
  return drafts.map((draft) => ({
    key: draft.key,
    label: draft.label,
    synonyms: draft.synonyms ?? [],
    group: family.group,
    net_heat_MJ_kg: draft.heat_MJ_kg[0],
    low_MJ_kg: draft.heat_MJ_kg[1],
    high_MJ_kg: draft.heat_MJ_kg[2],
    gross_heat_MJ_kg: draft.gross_MJ_kg ?? null,
    formula: draft.formula ?? null,
    cellulosic: family.cellulosic,
    combustion_factor: family.cellulosic ? 0.8 : 1,
    ignition_class: draft.ignition,
    radiative_fraction: draft.radiative ?? family.radiative,
    soot_yield: draft.soot ?? null,
    co_yield: draft.co ?? null,
    bulk_density_kg_m3:
      draft.density_kg_m3 === undefined
        ? null
        : { typical: draft.density_kg_m3[0], low: draft.density_kg_m3[1], high: draft.density_kg_m3[2] },
    moisture_pct_dry: draft.moisture_pct_dry ?? null,
    hazards: draft.hazards ?? family.hazards ?? [],
    source: draft.source,
  }));
}
