import type { Estimate } from '../methods/estimate.ts';

/** The tally of one room: names and units of the estimate contract. A section's absent number is listed in `missing`. */
export interface RoomTally {
  readonly room: {
    readonly name: string;
    readonly floorArea: Estimate;
    readonly enclosingArea: Estimate;
    readonly volume: Estimate;
    readonly regime: 'compartment' | 'large' | 'closed';
    readonly openingFactor?: Estimate;
    readonly ventilationFactor?: Estimate;
    readonly ventilationLimit?: Estimate;
    readonly openingFactorAfterGlass?: Estimate;
    readonly ventilationFactorAfterGlass?: Estimate;
    readonly ventilationLimitAfterGlass?: Estimate;
    readonly flashover: {
      readonly thomas?: FlashoverCriterion;
      readonly babrauskas?: FlashoverCriterion;
      readonly mqh?: FlashoverCriterion;
      readonly time?: Estimate;
    };
    readonly hotLayer?: Estimate;
  };
  readonly load: {
    readonly total: Estimate;
    readonly perFloor?: Estimate;
    readonly perEnclosure?: Estimate;
    readonly fixed: Estimate;
    readonly stored: Estimate;
    readonly passing: Estimate;
    readonly combustionFactor: Estimate;
    readonly asKept?: Estimate;
    readonly design?: Estimate;
    /** MJ/m²; Monte Carlo when asked for, else first order (p5 and p95 from the standard uncertainty). */
    readonly band?: { readonly p5: Estimate; readonly p50: Estimate; readonly p80: Estimate; readonly p95: Estimate };
    readonly standardUncertainty?: Estimate;
    readonly byMaterial: readonly MaterialShare[];
    readonly byEntry: readonly EntryShare[];
    readonly localPeak?: Estimate;
    readonly placeAmongUse?: Estimate;
  };
  readonly growth: {
    readonly alpha?: Estimate;
    readonly fuelPlateau?: Estimate;
    readonly openingsPlateau?: Estimate;
    readonly plateau?: Estimate;
    readonly governedBy?: 'fuel' | 'openings' | 'load' | 'closed';
    readonly growthEnd?: Estimate;
    readonly decayStart?: Estimate;
    readonly end?: Estimate;
    readonly peak?: Estimate;
    readonly heatReleased?: Estimate;
    /** `[[s, kW], …]`; its area equals `heatReleased` within 0.1 %. */
    readonly curve?: readonly (readonly [number, number])[];
  };
  readonly burnout: {
    readonly thermalInertia?: Estimate;
    readonly openingFactor?: Estimate;
    readonly asKept?: BurnoutCase;
    readonly design?: BurnoutCase;
  };
  readonly limits: readonly LimitStanding[];
  readonly cautions: readonly string[];
  readonly missing: readonly Missing[];
  /** Engine id and version, kept with stored summaries. */
  readonly engine: string;
}

export interface FlashoverCriterion extends Estimate {
  readonly range: string;
  readonly applicable: boolean;
  /** Why it does not apply, when it does not. */
  readonly why?: string;
}

export interface MaterialShare {
  readonly material: string;
  readonly label: string;
  readonly heat: Estimate;
  readonly mass_kg: number;
  readonly share: number;
}

export interface EntryShare {
  readonly id: string;
  readonly label: string;
  readonly heat: Estimate;
  readonly mass_kg: number;
  readonly share: number;
}

export interface BurnoutCase {
  readonly loadPerEnclosure?: Estimate;
  readonly parametric?: {
    readonly peak: Estimate;
    readonly timeOfPeak: Estimate;
    /** `[[min, °C], …]` */
    readonly curve: readonly (readonly [number, number])[];
    readonly controlledBy: 'ventilation' | 'fuel';
  };
  readonly equivalentTime?: Estimate;
  /** Against the room's rated resistance. */
  readonly standing?: 'within' | 'near' | 'over' | 'no limit set';
}

export interface LimitStanding {
  readonly quantity: string;
  readonly value?: Estimate;
  readonly bound: number;
  readonly ratio: number | null;
  readonly standing: 'within' | 'near' | 'over' | 'no limit set';
  readonly set_by?: string;
}

export interface Missing {
  readonly path: string;
  readonly section: string;
  readonly input: string;
  readonly why: string;
}
