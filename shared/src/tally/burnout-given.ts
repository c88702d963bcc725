import type { EntryHeat } from './entry-heats.ts';
import type { GrowthClass } from './growth-class.ts';
import type { RoomAreas } from './room-areas.ts';
import type { RoomInput } from './room-input.ts';
import type { RoomLinings } from './room-linings.ts';
import type { RoomOpenings } from './room-openings.ts';
import type { RoomTally } from './room-tally.ts';

/** What a burn-out is computed from. */
export interface BurnoutGiven {
  readonly input: RoomInput;
  readonly areas: RoomAreas;
  readonly openings: RoomOpenings;
  readonly linings: RoomLinings;
  readonly heats: readonly EntryHeat[];
  readonly growth: GrowthClass;
  readonly load: RoomTally['load'];
}
