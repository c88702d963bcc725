import { cautionsFor } from '../cautions/cautions.ts';
import { estimateSections, SECTIONS } from './estimate-sections.ts';
import type { RoomInput } from './room-input.ts';
import type { RoomTally } from './room-tally.ts';
import { spreadSection } from './spread-section.ts';
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
  const { tally, basis } = estimateSections(input, context);
  if (options.spread === false) return tally;
  return {
    ...tally,
    spread: spreadSection(basis, tally.air, context),
    cautions: cautionsFor([...SECTIONS, 'spread']).map(({ id }) => id),
  };
}
