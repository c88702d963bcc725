import type { Estimate } from '../methods/estimate.ts';
import { standingOf } from '../limits/standing.ts';
import type { RoomInput, RoomInputLimit } from './room-input.ts';
import type { LimitStanding, RoomTally } from './room-tally.ts';
import { noteMissing, type TallyContext } from './tally-context.ts';

type Sections = Pick<RoomTally, 'load' | 'growth' | 'burnout'>;

/** The value each kind of limit bounds; burn-out is held to the load as kept. */
const BOUNDED: Readonly<Record<RoomInputLimit['quantity'], (sections: Sections) => Estimate | undefined>> = {
  load_per_floor_MJ_m2: ({ load }) => load.perFloor,
  load_total_MJ: ({ load }) => load.total,
  load_design_MJ_m2: ({ load }) => load.design,
  peak_kW: ({ growth }) => growth.peak,
  equivalent_time_min: ({ burnout }) => burnout.asKept?.equivalentTime,
};

/** How the room stands against each of its limits, on the unrounded value. */
export function limitsSection(input: RoomInput, sections: Sections, context: TallyContext): LimitStanding[] {
  return (input.limits ?? []).map((limit, i) => {
    const value = BOUNDED[limit.quantity](sections);
    if (!value)
      noteMissing(context, `limits[${i}].value`, limit.quantity, 'What this limit bounds cannot be computed.');
    const amount = value?.value ?? null;
    return {
      quantity: limit.quantity,
      ...(value && { value }),
      bound: limit.bound,
      ratio: amount === null ? null : amount / limit.bound,
      standing: standingOf(amount, limit.bound),
      ...(limit.set_by == null ? {} : { set_by: limit.set_by }),
    };
  });
}
