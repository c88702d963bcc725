import type {
  CatalogueSource,
  GrowthClass,
  Hazard,
  IgnitionClass,
  Kind,
  KindGroup,
  KindMeasure,
  MeasureBy,
} from './catalogue-row.ts';

interface KindDraft {
  readonly key: string;
  readonly label: string;
  readonly synonyms?: readonly string[];
  /** Material key → kg in the piece as placed. */
  readonly parts: Readonly<Record<string, number>>;
  /** Plausible mass of the whole piece, low and high. */
  readonly mass_kg: readonly [number, number];
  /** Width, depth, height. */
  readonly size_m: readonly [number, number, number];
  readonly growth: GrowthClass | null;
  readonly peak_kW?: number;
  readonly radiative?: number;
  readonly ignition: IgnitionClass;
  readonly enclosure?: Kind['enclosure'];
  readonly keeping?: Kind['keeping'];
  readonly measure?: readonly [MeasureBy, number];
  readonly hazards?: readonly Hazard[];
  readonly source: CatalogueSource;
}

const ONE_PIECE: KindMeasure = { by: 'pieces', quantity: 1 };

/** Writes out the rows of one group of kinds. Unless the draft says otherwise: stored, open, counted by the piece. */
export function kindRows(group: KindGroup, drafts: readonly KindDraft[]): readonly Kind[] {
  return drafts.map((draft) => ({
    key: draft.key,
    label: draft.label,
    synonyms: draft.synonyms ?? [],
    group,
    parts: Object.entries(draft.parts).map(([material, mass_kg]) => ({ material, mass_kg })),
    mass_low_kg: draft.mass_kg[0],
    mass_high_kg: draft.mass_kg[1],
    width_m: draft.size_m[0],
    depth_m: draft.size_m[1],
    height_m: draft.size_m[2],
    growth: draft.growth,
    peak_kW: draft.peak_kW ?? null,
    radiative_fraction: draft.radiative ?? null,
    ignition_class: draft.ignition,
    enclosure: draft.enclosure ?? 'open',
    keeping: draft.keeping ?? 'stored',
    measure: draft.measure === undefined ? ONE_PIECE : { by: draft.measure[0], quantity: draft.measure[1] },
    hazards: draft.hazards ?? [],
    source: draft.source,
  }));
}
