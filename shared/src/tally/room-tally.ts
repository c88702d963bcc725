import type { Estimate } from '../methods/estimate.ts';
import type { RoomUncertainty } from '../uncertainty/room-uncertainty.ts';
import type { SpreadDefault } from '../spread/spread-defaults.ts';

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
    /** The same before any glass breaks, where that makes a difference: less air makes it longer and cooler. */
    readonly beforeGlass?: {
      readonly thermalInertia?: Estimate;
      readonly openingFactor?: Estimate;
      readonly asKept?: BurnoutCase;
      readonly design?: BurnoutCase;
    };
    /** Variant for rooms with more than a fifth of the heat in liquids and plastics: gas temperature by a nominal curve. */
    readonly hydrocarbon?: {
      /** °C after the room's rated time, or after an hour. */
      readonly temperature: Estimate;
      /** min */
      readonly after_min: number;
      /** `[[min, °C], …]` */
      readonly curve: readonly (readonly [number, number])[];
    };
  };
  /** On the design curve of the room. */
  readonly response: {
    readonly sprinkler?: Estimate;
    /** The first of the detectors that are there. */
    readonly detector?: Estimate;
    /** Each on its own where heat and smoke detectors are both there. */
    readonly heatDetector?: Estimate;
    readonly smokeDetector?: Estimate;
  };
  /** What the air of the room allows and what becomes of it, every opening taken as closed. */
  readonly air: {
    /** To 13 % oxygen, MJ; then to 15 % and to 10 %. */
    readonly oxygenLimitedHeat?: Estimate;
    readonly oxygenLimitedHeatAt15?: Estimate;
    readonly oxygenLimitedHeatAt10?: Estimate;
    /** When the design curve has used up that heat, s; only where no opening is open or would break. */
    readonly oxygenEnd?: Estimate;
    /** Mass burnt at which signs that reflect, or that shine, are seen 10 m away, kg. */
    readonly massForVisibility10m?: Estimate;
    readonly massForVisibility10mShining?: Estimate;
    /** At the oxygen limit, ppm: with the yields of a fire with enough air, and with 0.2 kg/kg. */
    readonly carbonMonoxide?: Estimate;
    readonly carbonMonoxideShortOfAir?: Estimate;
  };
  /** Which entry ignites which; left out where it was not asked for. */
  readonly spread?: SpreadTally;
  /** Only with `options.samples`. */
  readonly uncertainty?: RoomUncertainty;
  readonly limits: readonly LimitStanding[];
  readonly cautions: readonly string[];
  readonly missing: readonly Missing[];
  /** Engine id and version, kept with stored summaries. */
  readonly engine: string;
}

export interface SpreadTally {
  /** In order of time. */
  readonly events?: readonly SpreadTallyEvent[];
  /** Pairs that stand nearer than what is enough, largest shortfall first. */
  readonly gaps?: readonly SpreadTallyGap[];
  /** Ordered pairs within 10 m that were looked at, and how many of them are too near; `gaps` has the first 200 of those. */
  readonly pairs?: number;
  readonly pairsShort?: number;
  /** `[[s, kW], …]`; its area equals `heatReleased` within 0.1 %. */
  readonly curve?: readonly (readonly [number, number])[];
  /** Id of the entry that burns first. */
  readonly first?: string;
  readonly firstChosen?: 'given' | 'worst';
  /** With `worst`: how many first entries were tried, of how many that can burn. */
  readonly firstTried?: number;
  readonly firstOf?: number;
  /** s, or never */
  readonly flashover?: Estimate;
  /** kW */
  readonly peak?: Estimate;
  /** s */
  readonly end?: Estimate;
  /** MJ */
  readonly heatReleased?: Estimate;
  /** Heat of entries that stay unlit or that the air does not suffice for, MJ. */
  readonly unburnt?: Estimate;
  readonly defaults?: readonly SpreadDefault[];
  readonly layerIncluded?: boolean;
}

export interface SpreadTallyEvent {
  /** The entry that lights; null for `starved`, which is the room's. */
  readonly id: string | null;
  readonly t: Estimate;
  readonly cause: 'first' | 'radiation' | 'layer' | 'flame' | 'flashover' | 'starved';
  /** At ignition, kW/m²; absent where no flux lit it. */
  readonly flux?: Estimate;
  /** The burning entry that radiated most onto it. */
  readonly from?: string | null;
  /** Nearer than 2.5 diameters, where the point source has not been tested. */
  readonly nearField?: boolean;
}

/** Clear distances on the plan, m; `never` where no distance helps. */
export interface SpreadTallyGap {
  readonly from: string;
  readonly to: string;
  readonly gap_m: Estimate;
  readonly just_not_m: Estimate;
  readonly enough_m: Estimate;
  readonly long_exposure_m: Estimate;
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
