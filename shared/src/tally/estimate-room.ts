import { cautionsFor } from '../cautions/cautions.ts';
import { estimateSections, SECTIONS, type SectionsMade } from './estimate-sections.ts';
import type { RoomInput } from './room-input.ts';
import { USUAL_SAMPLING } from '../uncertainty/usual-sampling.ts';
import type { RoomTally } from './room-tally.ts';
import { spreadSection } from './spread-section.ts';
import type { TallyContext } from './tally-context.ts';
import { uncertaintySection } from './uncertainty-section.ts';

export interface TallyOptions {
  readonly workings?: boolean;
  readonly spread?: boolean;
  /** Called with the share of the samples drawn, 0 to 1. */
  readonly onSampled?: (fraction: number) => void;
}

/**
 * The tally of one room: synchronous and pure. What cannot be computed is absent and listed in `missing`, never zero.
 * @param input as `parseRoomInput` returns it, or as built from the survey document
 * @param options `workings: true` adds inputs, steps and sources to every estimate; `spread: false` leaves out which entry
 * ignites which, for callers that need the rest many times a second
 */
export function estimateRoom(input: RoomInput, options: TallyOptions = {}): RoomTally {
  const context: TallyContext = { workings: options.workings ?? false, missing: [] };
  const sections = estimateSections(input, context);
  const { basis } = sections;
  const tally = withSamples(sections, options, context);
  if (options.spread === false) return tally;
  return {
    ...tally,
    spread: spreadSection(basis, tally.air, context),
    cautions: cautionsFor([...SECTIONS, 'spread']).map(({ id }) => id),
  };
}

/** With `options.samples` the band of the density comes from samples, and how sure everything is stands beside it. */
function withSamples({ tally, basis }: SectionsMade, options: TallyOptions, context: TallyContext): RoomTally {
  const samples = basis.input.options?.samples ?? 0;
  if (samples === 0) return tally;
  const seed = basis.input.options?.seed ?? USUAL_SAMPLING.seed;
  const sampling = { samples, seed, onProgress: options.onSampled };
  const uncertainty = uncertaintySection(basis, tally.burnout, sampling, context);
  const { perFloor } = uncertainty.bands;
  if (perFloor === undefined) return { ...tally, uncertainty };
  const { p5, p50, p80, p95 } = perFloor;
  return { ...tally, load: { ...tally.load, band: { p5, p50, p80, p95 } }, uncertainty };
}
