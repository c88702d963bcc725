import type { CurveDraft } from '../materials/drafts/curve-draft.ts';
import type { CalorimeterFault } from './calorimeter-fault.ts';

export interface CalorimeterNote {
  readonly code: string;
  readonly text: string;
}

/** What a file gives, to look at before it is kept. Heat and rates are per m² of the test piece where `per` says so. */
export interface CalorimeterPreview {
  readonly per: 'piece' | 'm2';
  /** Readings that make the curve. */
  readonly readings: number;
  readonly heat_MJ: number;
  readonly peak: number;
  readonly peak_s: number;
  readonly duration_s: number;
  /** Heat of the test piece; for a rate per area only where its area is known. */
  readonly piece_heat_MJ: number | null;
  readonly burnt_kg: number | null;
  /** Heat of the piece over the mass that burnt. */
  readonly effective_MJ_kg: number | null;
  /** To draw; at most 300 points. */
  readonly points: readonly (readonly [number, number])[];
  /** To keep in a draft; null while something is to be decided first. */
  readonly curve: CurveDraft | null;
  readonly undecided: readonly 'negatives'[];
  readonly notes: readonly CalorimeterNote[];
}

export type CalorimeterReading =
  | { readonly ok: true; readonly preview: CalorimeterPreview }
  | { readonly ok: false; readonly faults: readonly CalorimeterFault[]; readonly moreFaults: number };
