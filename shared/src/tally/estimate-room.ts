import { ENGINE } from './engine.ts';
import { entryHeats } from './entry-heats.ts';
import { loadSection } from './load-section.ts';
import { roomAreas } from './room-areas.ts';
import type { RoomInput } from './room-input.ts';
import type { RoomTally } from './room-tally.ts';
import type { TallyContext } from './tally-context.ts';

/**
 * The tally of one room: synchronous and pure. What cannot be computed is absent and listed in `missing`.
 * @param input as `parseRoomInput` returns it, or as built from the survey document
 * @param options `workings: true` adds inputs, steps and sources to every estimate
 */
export function estimateRoom(input: RoomInput, options: { readonly workings?: boolean } = {}): RoomTally {
  const context: TallyContext = { workings: options.workings ?? false, missing: [] };
  const areas = roomAreas(input.room, context);
  const heats = entryHeats(input);
  const load = loadSection(input, areas, heats, context);
  return {
    room: { name: input.room.name, ...areas.estimates, regime: 'compartment', flashover: {} },
    load,
    growth: {},
    burnout: {},
    limits: [],
    cautions: [],
    missing: context.missing,
    engine: ENGINE,
  };
}
