/** The words of an entry and a lining, as the survey document has them; a test holds the two together. */
export type GrowthClass = 'slow' | 'medium' | 'fast' | 'ultra-fast';
export type IgnitionClass = 'easy' | 'normal' | 'hard' | 'resistant';
export type Enclosure = 'open' | 'cabinet' | 'sealed';
export type Keeping = 'fixed' | 'stored' | 'passing';

export interface LiningLayer {
  readonly thickness_m: number;
  readonly conductivity_W_mK: number;
  readonly density_kg_m3: number;
  readonly specific_heat_J_kgK: number;
  readonly label: string;
}

/** Where a row's numbers were taken from. `fromMemory`: the named source was not read again when the row was written. */
export interface CatalogueSource {
  readonly title: string;
  /** Clause, table, equation or page. */
  readonly locator: string;
  readonly fromMemory: boolean;
}

/** A value with its plausible range; `low` ≤ `typical` ≤ `high`, one unit, given by the field's name. */
export interface TypicalRange {
  readonly typical: number;
  readonly low: number;
  readonly high: number;
}

/** What makes goods harm out of proportion to their heat, or burn in an unusual way. */
export type Hazard =
  'liquid' | 'gas' | 'aerosol' | 'battery' | 'dust' | 'oxidiser' | 'water-reactive' | 'foam' | 'smouldering';

export type MaterialGroup =
  | 'wood and board'
  | 'paper'
  | 'textiles'
  | 'food'
  | 'carbon'
  | 'plastics'
  | 'foams'
  | 'rubber'
  | 'liquids'
  | 'gases'
  | 'chemicals'
  | 'products';

/**
 * A substance that can burn, as usually found. Heats are net (water leaves as vapour), as received, in MJ/kg; the row's
 * source is theirs. Radiative fractions and yields: Tewarson, SFPE Handbook of Fire Protection Engineering, well ventilated
 * (from memory). Ignition classes, bulk densities and moistures: common practice.
 */
export interface Material {
  /** Lower-case words joined by hyphens; stored in surveys, never renamed. */
  readonly key: string;
  readonly label: string;
  readonly synonyms: readonly string[];
  readonly group: MaterialGroup;
  readonly net_heat_MJ_kg: number;
  readonly low_MJ_kg: number;
  readonly high_MJ_kg: number;
  /** Gross heat (water leaves as liquid) where the substance is pure and its formation enthalpy is known. */
  readonly gross_heat_MJ_kg: number | null;
  /** Molecular formula of a pure substance, as `C8H18`. */
  readonly formula: string | null;
  readonly cellulosic: boolean;
  /** EN 1991-1-2 E.3: 0.8 for mainly cellulosic goods, 1 for all others. */
  readonly combustion_factor: 0.8 | 1;
  readonly ignition_class: IgnitionClass;
  /** Share of the chemical heat that leaves as radiation. */
  readonly radiative_fraction: number;
  /** Soot and carbon monoxide in a well ventilated fire, kg per kg burnt; null where no figure is known. */
  readonly soot_yield: number | null;
  readonly co_yield: number | null;
  /** As kept in bulk; a liquid's own density; a gas at 15 °C and 1 atm. */
  readonly bulk_density_kg_m3: TypicalRange | null;
  /** Percent of dry mass that the heat above already includes; null where it does not apply. */
  readonly moisture_pct_dry: number | null;
  readonly hazards: readonly Hazard[];
  readonly source: CatalogueSource;
}

export interface KindPart {
  /** Key of a material of this catalogue. */
  readonly material: string;
  /** Mass in the piece as placed. */
  readonly mass_kg: number;
}

/** How the quantity of a kind is asked. */
export type MeasureBy =
  'pieces' | 'shelf metres' | 'running metres' | 'stack height' | 'litres' | 'volume' | 'area' | 'kilowatt-hours';

export interface KindMeasure {
  readonly by: MeasureBy;
  /** How much of it the row's parts, size, peak and mass range stand for: pieces, m, m, m, L, m³, m², kWh. */
  readonly quantity: number;
}

export type KindGroup =
  | 'furniture'
  | 'textiles and costume'
  | 'paper and records'
  | 'storage and pallets'
  | 'timber and scenery'
  | 'plastics and foams'
  | 'liquids and gases'
  | 'electrical'
  | 'kitchen and household'
  | 'waste'
  | 'building';

/**
 * A template for an entry: what one piece is made of, its size, and how it burns. `peak_kW` is for the piece as placed.
 * Growth classes: EN 1991-1-2:2002 Table E.5 and the growth times of NFPA 92B (from memory), else common practice.
 */
export interface Kind {
  readonly key: string;
  readonly label: string;
  readonly synonyms: readonly string[];
  readonly group: KindGroup;
  readonly parts: readonly KindPart[];
  /** Plausible mass of the whole piece; the sum of the parts lies between. */
  readonly mass_low_kg: number;
  readonly mass_high_kg: number;
  readonly width_m: number;
  readonly depth_m: number;
  readonly height_m: number;
  readonly growth: GrowthClass | null;
  readonly peak_kW: number | null;
  readonly radiative_fraction: number | null;
  readonly ignition_class: IgnitionClass;
  /** How it is usually kept; a person can say otherwise for the entry. */
  readonly enclosure: Enclosure;
  readonly keeping: Keeping;
  readonly measure: KindMeasure;
  readonly hazards: readonly Hazard[];
  readonly source: CatalogueSource;
}

/** A surface of a room. Layers are listed exposed side first. */
export interface Lining {
  readonly key: string;
  readonly label: string;
  readonly synonyms: readonly string[];
  readonly layers: readonly LiningLayer[];
  readonly source: CatalogueSource;
}

/** How the movable load of rooms of a use is distributed, MJ/m² of floor. `cov` is standard deviation over mean. */
export interface LoadDistribution {
  readonly kind: 'gumbel' | 'lognormal';
  readonly mean_MJ_m2: number;
  readonly cov: number;
  readonly source: CatalogueSource;
}

export interface Use {
  readonly key: string;
  readonly label: string;
  readonly synonyms: readonly string[];
  readonly growth: GrowthClass;
  /** Peak heat release per fire area; null: ask for it, or take it from the entries. */
  readonly rhr_kW_m2: number | null;
  readonly distribution: LoadDistribution | null;
  /** δq2 of EN 1991-1-2 Table E.1; null: the table has no row for the use. */
  readonly danger_of_activation: number | null;
  readonly source: CatalogueSource;
}
