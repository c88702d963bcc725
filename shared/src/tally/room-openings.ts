import { estimate, estimateOutputs, type Estimate, type EstimateWarning } from '../methods/estimate.ts';
import { openingFactor } from '../methods/room/opening-factor.ts';
import { openings as openingsMethod } from '../methods/room/openings.ts';
import { openingState } from './opening-state.ts';
import type { RoomAreas } from './room-areas.ts';
import type { RoomInputOpening, RoomInputRoom } from './room-input.ts';
import type { TallyContext } from './tally-context.ts';

/** The openings that count at one stage of the fire, taken together. */
export interface OpeningStage {
  /** m² */
  readonly area: number;
  /** A_v √h_eq, m^5/2 */
  readonly factor: number;
  /** m^½ */
  readonly openingFactor: number;
  /** A_T: enclosing area less these openings and the roof vents that are not closed, m². */
  readonly liningArea: number;
  readonly estimates: { readonly ventilationFactor: Estimate; readonly openingFactor: Estimate };
}

export interface RoomOpenings {
  /** What is open. */
  readonly open: OpeningStage;
  /** What is open and what breaks. */
  readonly afterGlass: OpeningStage;
  /** What `room.*` is computed on: `open`, or `afterGlass` where nothing is open. */
  readonly used: OpeningStage;
  readonly glassAssumedBroken: boolean;
  /** Open or breaking, leading outside, m². */
  readonly outsideArea: number;
  /** Of these, open from the start, m². */
  readonly outsideAreaOpen: number;
  /** Roof vents that are not closed, m². */
  readonly roofVents: number;
}

export const GLASS_ASSUMED_BROKEN: EstimateWarning = {
  code: 'GLASS_ASSUMED_BROKEN',
  text: 'Nothing is open: the glass that would break is taken as broken from the start.',
};
const NO_OPENING: EstimateWarning = {
  code: 'NO_OPENING',
  text: 'The room has no opening that is open or would break.',
};

/** The openings of a room before and after the glass breaks. Nothing said about an opening: open, leading outside. */
export function roomOpenings(room: RoomInputRoom, areas: RoomAreas, context: TallyContext): RoomOpenings {
  const all = room.openings ?? [];
  const open = all.filter((opening) => openingState(opening) === 'open');
  const counted = all.filter((opening) => openingState(opening) !== 'closed');
  const roofVents = (room.roof_vents_state ?? 'fails') === 'closed' ? 0 : (room.roof_vents_m2 ?? 0);
  const glassAssumedBroken = open.length === 0 && counted.length > 0;
  const before = stage(open, areas, roofVents, context);
  const after = stage(counted, areas, roofVents, context);
  return {
    open: before,
    afterGlass: after,
    used: glassAssumedBroken ? stage(counted, areas, roofVents, context, [GLASS_ASSUMED_BROKEN]) : before,
    glassAssumedBroken,
    outsideArea: areaOf(counted.filter(leadsOutside)),
    outsideAreaOpen: areaOf(open.filter(leadsOutside)),
    roofVents,
  };
}

function leadsOutside({ leads_to }: RoomInputOpening): boolean {
  return leads_to !== 'inside';
}

function areaOf(openings: readonly RoomInputOpening[]): number {
  return openings.reduce((sum, { width_m, height_m }) => sum + width_m * height_m, 0);
}

function stage(
  openings: readonly RoomInputOpening[],
  areas: RoomAreas,
  roofVents: number,
  context: TallyContext,
  extra: readonly EstimateWarning[] = [],
): OpeningStage {
  const { workings } = context;
  const warnings = [...extra, ...openingWarnings(openings)];
  const run = estimateOutputs(
    openingsMethod,
    { A: openings.map(({ width_m, height_m }) => width_m * height_m), h: openings.map(({ height_m }) => height_m) },
    { workings, warnings, origins: { A: 'given', h: 'given' } },
  );
  const { area, factor } = run.result;
  const O = estimate(openingFactor, { F: factor, A_t: Math.max(areas.enclosing, 1e-6) }, { workings, warnings });
  return {
    area,
    factor,
    openingFactor: O.value ?? 0,
    liningArea: Math.max(0, areas.enclosing - area - roofVents),
    estimates: { ventilationFactor: run.of('factor'), openingFactor: O },
  };
}

function openingWarnings(openings: readonly RoomInputOpening[]): EstimateWarning[] {
  if (openings.length === 0) return [NO_OPENING];
  const warnings: EstimateWarning[] = [];
  if (openings.some(({ state, kind }) => state == null && kind == null)) {
    warnings.push({ code: 'OPENING_STATE_ASSUMED', text: 'An opening without a stated state is taken as open.' });
  }
  if (openings.some(({ leads_to }) => leads_to === 'inside')) {
    warnings.push({
      code: 'OPENING_TO_INSIDE',
      text: 'An opening leads to another room: air from next door is taken as unlimited.',
    });
  }
  return warnings;
}
