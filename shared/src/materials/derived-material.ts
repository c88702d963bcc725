import type { IgnitionClass } from '../catalogue/catalogue-row.ts';
import type { BasisFinding } from '../chemistry/basis-check.ts';
import type { Estimate, EstimateWarning } from '../methods/estimate.ts';

/** What the check of the basis says about a heat. Shown, never applied: a person takes the proposal over or leaves it. */
export interface MaterialBasis {
  readonly finding: BasisFinding | 'dry-for-received';
  /** One or two sentences: what was found and what to look at. */
  readonly text: string;
  /** Net heat per kg of oxygen, MJ/kg; null where no oxygen demand is known. */
  readonly perOxygen_MJ_kg: number | null;
  /** Null where nothing is proposed, or where the proposal has been taken over. */
  readonly proposal: { readonly factor: number; readonly net_MJ_kg: number; readonly text: string } | null;
  /** The proposal a person took over, and what stood there before. */
  readonly accepted: { readonly factor: number; readonly stated_net_MJ_kg: number } | null;
}

export interface DerivedCurve {
  readonly per: 'piece' | 'm2';
  /** `[s, kW]` or `[s, kW/m²]`. */
  readonly points: readonly (readonly [number, number])[];
  /** MJ of the piece, or MJ/m². */
  readonly heat_MJ: number;
  /** kW or kW/m². */
  readonly peak: number;
  readonly peak_s: number;
  /** Heat over the mass that burnt, MJ/kg; null where that mass is not stated. Effective: combustion is already in it. */
  readonly effective_MJ_kg: number | null;
}

/** Everything the book needs of an own material. Heats are as received; `low` ≤ `net` ≤ `high`. */
export interface DerivedMaterial {
  readonly net_MJ_kg: number;
  readonly low_MJ_kg: number;
  readonly high_MJ_kg: number;
  readonly gross_MJ_kg: number | null;
  /** How low and high were found, in words. */
  readonly range_basis: string;
  /** What the net heat rests on, in words: `net, as received, from 3 bomb runs`. Stands beside the value in a survey. */
  readonly heat_source: string;
  /** Water in the material as it lies there, percent of wet mass; null where nothing is said. */
  readonly moisture_pct_wet: number | null;
  /** kg of oxygen to burn 1 kg of it; null where no composition is known. */
  readonly oxygen_kg_kg: number | null;
  readonly cellulosic: boolean;
  readonly combustion_factor: 0.8 | 1;
  readonly ignition_class: IgnitionClass;
  readonly radiative_fraction: number;
  readonly basis: MaterialBasis | null;
  readonly warnings: readonly EstimateWarning[];
  /** Every method that was run, in order, with equation, symbols, steps and sources. */
  readonly workings: readonly Estimate[];
  /** Ids and versions of those methods, each once. */
  readonly methods: readonly string[];
  readonly curve: DerivedCurve | null;
}
