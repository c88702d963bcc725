import { liningByKey } from '../catalogue/linings.ts';
import { estimate, estimateOutputs, type Estimate, type EstimateWarning } from '../methods/estimate.ts';
import { meanThermalInertia } from '../methods/burnout/mean-thermal-inertia.ts';
import { thermalInertia } from '../methods/burnout/thermal-inertia.ts';
import { liningHeatTransfer } from '../methods/room/lining-heat-transfer.ts';
import { meanHeatTransfer } from '../methods/room/mean-heat-transfer.ts';
import type { WorkingStep } from '../methods/working.ts';
import type { RoomAreas } from './room-areas.ts';
import type { RoomInputLayer, RoomInputRoom, RoomInputSurface } from './room-input.ts';
import type { OpeningStage } from './room-openings.ts';
import type { TallyContext } from './tally-context.ts';

type Layer = Omit<RoomInputLayer, 'label'>;
type Side = 'walls' | 'ceiling' | 'floor';
const SIDES: readonly Side[] = ['walls', 'ceiling', 'floor'];

export interface RoomLinings {
  /** Sides whose lining is not known. */
  readonly unknown: readonly Side[];
  readonly layers: Readonly<Record<Side, readonly Layer[]>>;
}

/** What walls, ceiling and floor are made of, layers exposed side first. */
export function roomLinings(room: RoomInputRoom): RoomLinings {
  const layers = {
    walls: layersOf(room.lining?.walls),
    ceiling: layersOf(room.lining?.ceiling),
    floor: layersOf(room.lining?.floor),
  };
  return { layers, unknown: SIDES.filter((side) => layers[side].length === 0) };
}

function layersOf(surface: RoomInputSurface | null | undefined): readonly Layer[] {
  if (surface == null) return [];
  return 'layers' in surface ? surface.layers : (liningByKey(surface.key)?.layers ?? []);
}

/** Area of each side without the openings of a stage and without open roof vents, m². */
export function surfaceAreas(areas: RoomAreas, stage: OpeningStage, roofVents: number): Record<Side, number> {
  return {
    walls: Math.max(0, areas.walls - stage.area),
    ceiling: Math.max(0, areas.floor - roofVents),
    floor: areas.floor,
  };
}

interface Weighted {
  readonly value: number;
  readonly steps: readonly WorkingStep[];
  readonly warnings: readonly EstimateWarning[];
}

/** h_k of the room at a time of exposure, weighted by area; every side must be known. */
export function roomHeatTransfer(
  linings: RoomLinings,
  areas: RoomAreas,
  stage: OpeningStage,
  roofVents: number,
  exposure_s: number,
  context: TallyContext,
): Weighted {
  const surface = surfaceAreas(areas, stage, roofVents);
  const runs = SIDES.map((side) => {
    const layers = linings.layers[side];
    const { result } = estimateOutputs(liningHeatTransfer, {
      t: exposure_s,
      k: layers.map((layer) => layer.conductivity_W_mK),
      rho: layers.map((layer) => layer.density_kg_m3),
      c: layers.map((layer) => layer.specific_heat_J_kgK),
      d: layers.map((layer) => layer.thickness_m),
    });
    return { side, h_k: result.h_k, extended: layers.length > 1 && exposure_s >= result.t_p };
  });
  const mean = estimate(meanHeatTransfer, { h: runs.map(({ h_k }) => h_k), A: SIDES.map((side) => surface[side]) });
  const extended = runs.filter((run) => run.extended).map(({ side }) => side);
  return {
    value: mean.value ?? 0,
    warnings:
      extended.length === 0
        ? []
        : [
            {
              code: 'LAYERS_EXTENDED',
              text: `The exposed layer of ${extended.join(' and ')} has heated through; what lies behind it is taken in series, our own extension of the method.`,
            },
          ],
    steps: context.workings
      ? [
          ...runs.map(({ side, h_k }) => ({
            text: `h_k of the ${side} after ${exposure_s} s`,
            equation: liningHeatTransfer.equation,
            value: h_k,
            unit: 'kW/m2K',
          })),
          { text: 'h_k weighted by area', equation: meanHeatTransfer.equation, value: mean.value, unit: 'kW/m2K' },
        ]
      : [],
  };
}

/** Thermal inertia of the room for a heating phase of t_max hours. */
export function roomThermalInertia(
  linings: RoomLinings,
  areas: RoomAreas,
  stage: OpeningStage,
  roofVents: number,
  t_max: number,
  context: TallyContext,
): Estimate {
  const surface = surfaceAreas(areas, stage, roofVents);
  const runs = SIDES.map((side) => {
    const layers = linings.layers[side];
    const { result } = estimateOutputs(thermalInertia, {
      t_max,
      s: layers.map((layer) => layer.thickness_m),
      rho: layers.map((layer) => layer.density_kg_m3),
      c: layers.map((layer) => layer.specific_heat_J_kgK),
      lambda: layers.map((layer) => layer.conductivity_W_mK),
    });
    return { side, b: result.b };
  });
  const deep = SIDES.filter((side) => linings.layers[side].length > 2);
  return estimate(
    meanThermalInertia,
    { b: runs.map(({ b }) => b), A: SIDES.map((side) => surface[side]) },
    {
      workings: context.workings,
      warnings:
        deep.length === 0
          ? []
          : [
              {
                code: 'MORE_THAN_TWO_LAYERS',
                text: `The method uses the first two layers from the exposed side; the ${deep.join(' and ')} has more.`,
              },
            ],
      steps: context.workings
        ? runs.map(({ side, b }) => ({
            text: `b of the ${side}`,
            equation: thermalInertia.equation,
            value: b,
            unit: 'J/m2s1/2K',
          }))
        : [],
    },
  );
}
