import { cautionsFor, type TallySection } from '../cautions/cautions.ts';
import { airSection } from './air-section.ts';
import { burnoutSection } from './burnout-section.ts';
import { ENGINE } from './engine.ts';
import { limitsSection } from './limits-section.ts';
import { responseSection } from './response-section.ts';
import { roomBasis, type RoomBasis } from './room-basis.ts';
import type { RoomInput } from './room-input.ts';
import type { RoomTally } from './room-tally.ts';
import type { TallyContext } from './tally-context.ts';

export interface SectionsMade {
  readonly tally: RoomTally;
  readonly basis: RoomBasis;
}

/** The sections made here, whose cautions stand with them. */
export const SECTIONS: readonly TallySection[] = ['load', 'growth', 'room', 'burnout', 'response', 'air', 'limits'];

/**
 * Every section of a tally but `spread`, in a few milliseconds for some hundred entries. Further sections are added by
 * who needs them; see `estimateRoom`.
 */
export function estimateSections(input: RoomInput, context: TallyContext): SectionsMade {
  const basis = roomBasis(input, context);
  const { chosen, load, growth, room } = basis;
  const burnout = burnoutSection({ ...basis, growth: chosen.growth }, context);
  const limits = limitsSection(input, { load, growth, burnout }, context);
  const tally: RoomTally = {
    room,
    load,
    growth,
    burnout,
    response: responseSection(basis, context),
    air: airSection(basis, context),
    limits,
    cautions: cautionsFor(SECTIONS).map(({ id }) => id),
    missing: context.missing,
    engine: ENGINE,
  };
  return { tally, basis };
}
