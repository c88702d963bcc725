import { entryHeats, type EntryHeat } from './entry-heats.ts';
import { growthClass, type ChosenGrowth } from './growth-class.ts';
import { growthSection } from './growth-section.ts';
import { loadSection } from './load-section.ts';
import { roomAreas, type RoomAreas } from './room-areas.ts';
import type { RoomInput } from './room-input.ts';
import { roomLinings, type RoomLinings } from './room-linings.ts';
import { roomOpenings, type RoomOpenings } from './room-openings.ts';
import { roomSection } from './room-section.ts';
import type { RoomTally } from './room-tally.ts';
import type { TallyContext } from './tally-context.ts';

/** What every further section of a tally starts from. */
export interface RoomBasis {
  readonly input: RoomInput;
  readonly areas: RoomAreas;
  readonly openings: RoomOpenings;
  readonly linings: RoomLinings;
  readonly heats: readonly EntryHeat[];
  readonly chosen: ChosenGrowth;
  readonly load: RoomTally['load'];
  readonly growth: RoomTally['growth'];
  readonly room: RoomTally['room'];
}

/** The sections `load`, `growth` and `room` with what they were made of. */
export function roomBasis(input: RoomInput, context: TallyContext): RoomBasis {
  const areas = roomAreas(input.room, context);
  const openings = roomOpenings(input.room, areas, context);
  const linings = roomLinings(input.room);
  const heats = entryHeats(input);
  const chosen = growthClass(input, heats);
  const load = loadSection(input, areas, heats, context);
  const growth = growthSection({ input, areas, openings, heats, chosen, load }, context);
  const room = roomSection({ input, areas, openings, linings, growth }, context);
  return { input, areas, openings, linings, heats, chosen, load, growth, room };
}
