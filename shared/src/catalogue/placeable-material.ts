import type { Material } from './catalogue-row.ts';

/** The approved version of an own material that is in force. */
export interface OwnVersion {
  readonly version: number;
  /** What the heat rests on, in words. */
  readonly heat_source: string;
  /** `[s, kW]` of one piece, or `[s, kW/m²]` of exposed surface, as it was measured. */
  readonly curve: {
    readonly per: 'piece' | 'm2';
    readonly points: readonly (readonly [number, number])[];
  } | null;
}

/** What finding and placing need of a material: a built-in one, or one of the organisation's own, whose key is its id. */
export interface PlaceableMaterial extends Pick<
  Material,
  | 'key'
  | 'label'
  | 'synonyms'
  | 'net_heat_MJ_kg'
  | 'low_MJ_kg'
  | 'high_MJ_kg'
  | 'cellulosic'
  | 'soot_yield'
  | 'co_yield'
  | 'radiative_fraction'
  | 'ignition_class'
  | 'source'
> {
  readonly group: string;
  /** Absent or null: built in. */
  readonly own?: OwnVersion | null;
}
