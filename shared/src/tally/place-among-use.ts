import { useByKey } from '../catalogue/uses.ts';
import { estimate, type Estimate } from '../methods/estimate.ts';
import { gumbelPlace } from '../methods/statistics/gumbel-place.ts';
import { lognormalPlace } from '../methods/statistics/lognormal-place.ts';
import { noteMissing, type TallyContext } from './tally-context.ts';

/** Where the stored and passing load stands among rooms of the same use, percent; missing for a use without surveys. */
export function placeAmongUse(useKey: string | null, q: number, context: TallyContext): Estimate | undefined {
  const use = useKey === null ? undefined : useByKey(useKey);
  const distribution = use?.distribution ?? null;
  if (!use || distribution === null) {
    const why = use ? `No survey of loads is known for the use “${use.label}”.` : 'The use of the room is not stated.';
    return noteMissing(context, 'load.placeAmongUse', 'room.use', why);
  }
  const method = distribution.kind === 'gumbel' ? gumbelPlace : lognormalPlace;
  return estimate(
    method,
    { q, mean: distribution.mean_MJ_m2, V: distribution.cov },
    {
      workings: context.workings,
      origins: {
        q: { origin: 'computed', note: 'entries that are not fixed; neither m nor δ' },
        mean: { origin: 'catalogue', note: `${use.label}: ${distribution.source.title}` },
        V: { origin: 'catalogue', note: distribution.source.locator },
      },
    },
  );
}
