import type { Distribution } from './distribution.ts';

/** What the load of a room is made of, as inputs that are not exactly known and how they are put together. */
export interface LoadModel {
  readonly materials: readonly ModelMaterial[];
  readonly heats: readonly ModelHeat[];
  readonly entries: readonly ModelEntry[];
}

/** Everything of one material shares one heat value and one moisture. */
export interface ModelMaterial {
  readonly key: string;
  readonly label: string;
}

/** The heat of a material as some parts state it: copies made at other times may differ, and move together. */
export interface ModelHeat {
  /** Place in `materials`. */
  readonly material: number;
  /** MJ/kg */
  readonly distribution: Distribution;
  /** How much less heat there is for one standard deviation more moisture, MJ/kg; 0 where moisture is not stated. */
  readonly moisture: number;
}

export interface ModelEntry {
  readonly id: string;
  readonly label: string;
  /** What the recorded mass is multiplied by. */
  readonly mass: Distribution;
  /** What a closed cabinet lets into the fire; null where nothing of the entry is in one. */
  readonly cabinet: Distribution | null;
  readonly terms: readonly ModelTerm[];
  /** What makes the characteristic load of the surveyed one. */
  readonly characteristic: number;
}

/** All parts of one entry that share a heat. */
export interface ModelTerm {
  /** Place in `heats`. */
  readonly heat: number;
  /** All pieces, with what their enclosure lets into the fire unless that is sampled, kg. */
  readonly mass: number;
  /** Whether the cabinet's sample counts. */
  readonly inCabinet: boolean;
  /** m, share of the heat that is set free. */
  readonly combustion: number;
}
