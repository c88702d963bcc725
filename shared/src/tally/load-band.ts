import { estimate, type Estimate } from '../methods/estimate.ts';
import { bandFractile } from '../methods/uncertainty/band-fractile.ts';
import { fireLoadUncertainty } from '../methods/uncertainty/fire-load-uncertainty.ts';
import { perFloorUncertainty } from '../methods/uncertainty/per-floor-uncertainty.ts';
import {
  AREA_SPREAD,
  CABINET,
  LABORATORY_HEAT_SPREAD,
  MASS_SPREAD,
  MOISTURE_SPREAD,
  OVERLOOKED,
} from '../uncertainty/survey-spread.ts';
import { triangularDeviation, triangularMean } from '../uncertainty/triangular.ts';
import { HEAT_OF_VAPORISATION_MJ_KG } from '../methods/heat/water.ts';
import type { EntryHeat } from './entry-heats.ts';
import type { PartHeat } from './part-heat.ts';
import type { RoomTally } from './room-tally.ts';
import type { TallyContext } from './tally-context.ts';

type Load = RoomTally['load'];

/** What would be known better than it is, to see what that would bring. */
export interface BetterKnown {
  /** Ids of entries that would be weighed. */
  readonly weighed: ReadonlySet<string>;
  /** Keys of materials whose heat a laboratory would measure. */
  readonly measured: ReadonlySet<string>;
}

const AS_IT_IS: BetterKnown = { weighed: new Set(), measured: new Set() };

/** How sure the load per floor area is, to first order: standard uncertainty and the band around it. */
export function loadBand(
  heats: readonly EntryHeat[],
  floorLoad: { readonly Q: number; readonly A_f: number; readonly q: number },
  context: Pick<TallyContext, 'workings'>,
  known: BetterKnown = AS_IT_IS,
): { standardUncertainty: Estimate; band: NonNullable<Load['band']> } {
  const { workings } = context;
  const sum = estimate(fireLoadUncertainty, sumInputs(heats, known), { workings });
  const u = estimate(
    perFloorUncertainty,
    {
      Q: floorLoad.Q,
      u_Q: sum.value ?? 0,
      A_f: floorLoad.A_f,
      r_A: AREA_SPREAD,
      r_o: triangularDeviation(OVERLOOKED.low, OVERLOOKED.mode, OVERLOOKED.high),
    },
    { workings, origins: { r_A: 'default', r_o: 'default' }, steps: sum.steps ?? [] },
  );
  const o = triangularMean(OVERLOOKED.low, OVERLOOKED.mode, OVERLOOKED.high);
  const at = (p: number) =>
    estimate(
      bandFractile,
      { q: floorLoad.q, u: u.value ?? 0, o, p },
      { workings, origins: { o: 'default', p: 'given' } },
    );
  return { standardUncertainty: u, band: { p5: at(0.05), p50: at(0.5), p80: at(0.8), p95: at(0.95) } };
}

function sumInputs(heats: readonly EntryHeat[], known: BetterKnown) {
  const inputs = {
    M: [] as number[],
    H: [] as number[],
    u_M: [] as number[],
    u_H: [] as number[],
    entry: [] as number[],
    material: [] as number[],
    u_psi: [] as number[],
  };
  const materials = new Map<string, number>();
  const cabinet = triangularDeviation(CABINET.low, CABINET.mode, CABINET.high);
  heats.forEach(({ entry, parts }, index) => {
    const spread = MASS_SPREAD[known.weighed.has(entry.id) ? 'weighed' : (entry.evidence ?? 'estimated')];
    let inCabinet = 0;
    for (const { count, part, psi } of parts) {
      const mass = count * part.mass * psi;
      inputs.M.push(mass);
      inputs.H.push(part.heat);
      inputs.u_M.push(mass * spread);
      inputs.u_H.push(known.measured.has(part.key) ? LABORATORY_HEAT_SPREAD * part.heat : heatDeviation(part));
      inputs.entry.push(index);
      if (!materials.has(part.key)) materials.set(part.key, materials.size);
      inputs.material.push(materials.get(part.key) ?? 0);
      if (psi === CABINET.mode) inCabinet += count * part.mass * part.heat;
    }
    if (inCabinet > 0) inputs.u_psi.push(inCabinet * cabinet);
  });
  return inputs;
}

/** Spread of a heat between low and high, and of its moisture where that was stated. */
function heatDeviation(part: PartHeat): number {
  const value = triangularDeviation(part.low, part.heat, part.high);
  return part.moist ? Math.hypot(value, MOISTURE_SPREAD * (part.heatDry + HEAT_OF_VAPORISATION_MJ_KG)) : value;
}
