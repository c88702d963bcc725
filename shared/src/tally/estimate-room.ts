import { cautionsFor } from '../cautions/cautions.ts';
import { burnoutSection } from './burnout-section.ts';
import { ENGINE } from './engine.ts';
import { entryHeats } from './entry-heats.ts';
import { growthClass } from './growth-class.ts';
import { growthSection } from './growth-section.ts';
import { noteLaterSections } from './later-sections.ts';
import { limitsSection } from './limits-section.ts';
import { loadSection } from './load-section.ts';
import { roomAreas } from './room-areas.ts';
import type { RoomInput } from './room-input.ts';
import { roomLinings } from './room-linings.ts';
import { roomOpenings } from './room-openings.ts';
import { roomSection } from './room-section.ts';
import type { RoomTally } from './room-tally.ts';
import type { TallyContext } from './tally-context.ts';

export interface TallyOptions {
  readonly workings?: boolean;
  readonly spread?: boolean;
}

/**
 * The tally of one room: synchronous and pure. What cannot be computed is absent and listed in `missing`, never zero.
 * @param input as `parseRoomInput` returns it, or as built from the survey document
 * @param options `workings: true` adds inputs, steps and sources to every estimate; `spread: false` leaves out which entry
 * ignites which, for callers that need the rest many times a second
 */
export function estimateRoom(input: RoomInput, options: TallyOptions = {}): RoomTally {
  const context: TallyContext = { workings: options.workings ?? false, missing: [] };
  const areas = roomAreas(input.room, context);
  const openings = roomOpenings(input.room, areas, context);
  const linings = roomLinings(input.room);
  const heats = entryHeats(input);
  const chosen = growthClass(input, heats);
  const load = loadSection(input, areas, heats, context);
  const growth = growthSection({ input, areas, openings, heats, chosen, load }, context);
  const room = roomSection({ input, areas, openings, linings, growth }, context);
  const burnout = burnoutSection({ input, areas, openings, linings, heats, growth: chosen.growth, load }, context);
  const limits = limitsSection(input, { load, growth, burnout }, context);
  noteLaterSections(context, options.spread ?? true);
  return {
    room,
    load,
    growth,
    burnout,
    response: {},
    air: {},
    limits,
    cautions: cautionsFor(['load', 'growth', 'room', 'burnout', 'limits']).map(({ id }) => id),
    missing: context.missing,
    engine: ENGINE,
  };
}
