import { ventilationWeight } from '../methods/burnout/ventilation-weight.ts';
import type { RoomModel } from '../uncertainty/sample-room.ts';
import type { RoomBasis } from './room-basis.ts';
import type { RoomTally } from './room-tally.ts';

const LARGEST_ALPHA_V = 0.25;

/** What the sampled peak and equivalent time are computed from; null where the tally could not compute them either. */
export function roomModelOf(basis: RoomBasis, burnout: RoomTally['burnout']): RoomModel {
  const { areas, growth, load } = basis;
  const alpha = growth.alpha?.value ?? null;
  return {
    floor: load.perFloor === undefined ? null : areas.floor,
    growth:
      growth.peak === undefined || alpha === null
        ? null
        : {
            alpha,
            fuelPlateau: growth.fuelPlateau?.value ?? Infinity,
            openingsPlateau: growth.openingsPlateau?.value ?? Infinity,
          },
    burnout: burnoutModel(basis, burnout),
  };
}

function burnoutModel(
  { input, areas, openings, load }: RoomBasis,
  burnout: RoomTally['burnout'],
): RoomModel['burnout'] {
  const time = burnout.asKept?.equivalentTime?.value ?? null;
  const kept = load.asKept?.value ?? 0;
  if (time === null || !(kept > 0)) return null;
  const alpha_v = openings.outsideArea / areas.floor;
  const alpha_h = openings.roofVents / areas.floor;
  const { w_f } = ventilationWeight.run({ H: areas.height, alpha_v: Math.min(LARGEST_ALPHA_V, alpha_v), alpha_h });
  return {
    factor: time / (kept * w_f),
    followsOpenings: input.options?.kc === 'unprotected_steel',
    height: areas.height,
    alpha_v,
    alpha_h,
  };
}
