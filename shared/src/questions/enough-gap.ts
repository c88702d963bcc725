import type { Estimate } from '../methods/estimate.ts';
import { modelEstimate } from '../spread/model-estimate.ts';
import type { Gap } from '../spread/gap-line.ts';
import { pairInputs } from '../spread/pair-inputs.ts';
import { spreadGaps } from '../spread/spread-gaps.ts';
import { spreadInput } from '../spread/spread-input.ts';
import { GAP_METHOD } from '../methods/models/spread-method.ts';
import { roomBasis } from '../tally/room-basis.ts';
import type { RoomInput } from '../tally/room-input.ts';

/** The gap between two entries: as they stand, and what would do. Clear distances on the plan, m. */
export interface GapAnswer {
  readonly gap: Estimate;
  readonly justNot: Estimate;
  readonly enough: Estimate;
  readonly longExposure: Estimate;
  /** How the gap as it stands compares with what is enough. */
  readonly standing: 'enough' | 'too small' | 'no gap helps';
}

export type GapResult = { readonly answer: GapAnswer } | { readonly why: string };

/**
 * What gap keeps the second entry from being lit by the first one burning alone, whether or not they stand near enough
 * to each other for the tally to list them.
 */
export function enoughGap(input: RoomInput, from: string, to: string): GapResult {
  const basis = roomBasis(input, { workings: false, missing: [] });
  const scene = spreadInput({ ...basis, oxygenLimitedHeat_MJ: null }).input;
  const pair = scene.entries.filter(({ id }) => id === from || id === to);
  const source = pair.find(({ id }) => id === from);
  const target = pair.find(({ id }) => id === to);
  const why = !source || !target ? 'Choose two entries of this room.' : whyNot(from === to, source, target);
  if (why !== undefined || !source || !target) return { why: why ?? 'Choose two entries of this room.' };
  const found = spreadGaps({ ...scene, entries: pair }).find((gap) => gap.from === from && gap.to === to);
  if (!found) {
    return { why: 'They stand more than 10 m apart: farther than the radiation of one entry is followed.' };
  }
  const number = (output: keyof typeof GAP_METHOD.outputs, { metres, never }: Gap, k_f: number, text: string) =>
    modelEstimate(GAP_METHOD, output, { value: metres, ...(never !== undefined && { never }) }, () => ({
      inputs: pairInputs(source, target, k_f),
      steps: [{ text }],
      assumptions: [...GAP_METHOD.assumptions, ...GAP_METHOD.limits],
    }));
  return {
    answer: {
      gap: number('asItStands', { metres: found.gap_m }, 1, 'Clear distance between the footprints on the plan.'),
      justNot: number('justNot', found.justNot, 1, 'Only the first one burns, by its own curve.'),
      enough: number('enough', found.enough, 2, 'The same with twice the radiation.'),
      longExposure: number(
        'longExposure',
        found.longExposureEnough,
        2,
        'Twice the radiation of its peak, held for ever.',
      ),
      standing:
        found.enough.metres === null ? 'no gap helps' : found.gap_m < found.enough.metres ? 'too small' : 'enough',
    },
  };
}

type SceneEntry = ReturnType<typeof spreadInput>['input']['entries'][number];

function whyNot(isSame: boolean, source: SceneEntry, target: SceneEntry): string | undefined {
  if (isSame) return 'Choose two different entries.';
  if (!source.place || !target.place) return 'Both need a place on the plan: put them there first.';
  if (source.enclosure === 'sealed' || !(source.heat_MJ > 0) || !(source.peak_kW > 0)) {
    return 'The first one does not burn by itself: it is sealed or has no heat to give.';
  }
  if (target.enclosure !== 'open') return 'The second one is enclosed: radiation does not light it.';
  if (!(target.heat_MJ > 0) || !(target.peak_kW > 0)) return 'The second one has no heat to give: it does not burn.';
  return undefined;
}
