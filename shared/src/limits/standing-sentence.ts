import type { Limit, LimitQuantity } from '../contracts/limits.ts';
import type { LimitStanding } from '../tally/room-tally.ts';
import { limitUnits } from './limit-units.ts';
import { percentText } from './percent-text.ts';

const WHOSE: Readonly<Record<Limit['source'], string>> = {
  permit: 'the permit’s',
  policy: 'the policy’s',
  'house-rule': 'the house rule’s',
};

const month = new Intl.DateTimeFormat('en-GB', { month: 'long', year: 'numeric', timeZone: 'UTC' });

/**
 * How a room stands against one limit, in one sentence: the share, whose bound, who set it and since when. A value that
 * could not be computed is said, never taken as within.
 */
export function standingSentence(
  stood: LimitStanding,
  limit: Pick<Limit, 'source' | 'set_by' | 'since'> | undefined,
  show: (value: number, unit: string) => { readonly text: string; readonly unit: string },
): string {
  const bound = show(stood.bound, limitUnits[stood.quantity as LimitQuantity]);
  const whose = limit === undefined ? 'the limit of' : WHOSE[limit.source];
  const setBy = limit?.set_by ?? stood.set_by;
  const since = limit === undefined ? '' : `, ${month.format(new Date(`${limit.since}T00:00:00Z`))}`;
  const by = setBy === undefined ? '' : `, ${setBy}${since}`;
  if (stood.ratio === null) {
    return `Not compared with ${whose} ${bound.text} ${bound.unit}${by}: the value could not be computed.`;
  }
  return `${percentText(stood.ratio)} of ${whose} ${bound.text} ${bound.unit}${by}`;
}
