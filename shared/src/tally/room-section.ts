import { estimate, type Estimate, type EstimateWarning } from '../methods/estimate.ts';
import { figure } from '../methods/figure.ts';
import { timeToReach } from '../methods/growth/time-to-reach.ts';
import { hotLayerMqh, LARGEST_RISE_K } from '../methods/room/hot-layer-mqh.ts';
import { ventilationLimit } from '../methods/room/ventilation-limit.ts';
import { flashoverCriteria, lowestApplicable, starved, type Criteria, type HeatTransfer } from './flashover.ts';
import type { RoomAreas } from './room-areas.ts';
import type { RoomInput } from './room-input.ts';
import { roomHeatTransfer, type RoomLinings } from './room-linings.ts';
import { GLASS_ASSUMED_BROKEN, type OpeningStage, type RoomOpenings } from './room-openings.ts';
import type { RoomTally } from './room-tally.ts';
import { noteMissing, type TallyContext } from './tally-context.ts';

type Room = RoomTally['room'];

const LARGE_FLOOR_M2 = 500;
const LARGE_HEIGHT_M = 6;
const USUAL_EXPOSURE_S = 600;
const FLASHOVER = ['thomas', 'babrauskas', 'mqh', 'time'] as const;

interface Given {
  readonly input: RoomInput;
  readonly areas: RoomAreas;
  readonly openings: RoomOpenings;
  readonly linings: RoomLinings;
  readonly growth: RoomTally['growth'];
}

/** The section `room` of a tally: what the openings let happen. */
export function roomSection(given: Given, context: TallyContext): Room {
  const { input, areas, openings } = given;
  const { used, afterGlass, glassAssumedBroken } = openings;
  const base = {
    name: input.room.name,
    ...areas.estimates,
    openingFactor: used.estimates.openingFactor,
    ventilationFactor: used.estimates.ventilationFactor,
    openingFactorAfterGlass: afterGlass.estimates.openingFactor,
    ventilationFactorAfterGlass: afterGlass.estimates.ventilationFactor,
  };
  const large = areas.floor > LARGE_FLOOR_M2 || areas.height > LARGE_HEIGHT_M;
  if (!(afterGlass.factor > 0) || !(used.liningArea > 0)) {
    const why =
      afterGlass.factor > 0 ? 'The openings are as large as the walls.' : 'No opening is open or would break.';
    for (const path of ['ventilationLimit', 'ventilationLimitAfterGlass', 'hotLayer']) {
      noteMissing(context, `room.${path}`, 'room.openings', why);
    }
    for (const path of FLASHOVER) noteMissing(context, `room.flashover.${path}`, 'room.openings', why);
    return { ...base, regime: large ? 'large' : 'closed', flashover: {} };
  }
  const limits = {
    ventilationLimit: limitOf(used, context, glassAssumedBroken ? [GLASS_ASSUMED_BROKEN] : []),
    ventilationLimitAfterGlass: limitOf(afterGlass, context, []),
  };
  if (large) {
    const why = `The room is large (floor ${figure(areas.floor)} m2, height ${figure(areas.height)} m): criteria for one hot layer do not hold above 500 m2 or 6 m.`;
    for (const path of FLASHOVER) noteMissing(context, `room.flashover.${path}`, 'room.ring_m', why);
    noteMissing(context, 'room.hotLayer', 'room.ring_m', why);
    return { ...base, ...limits, regime: 'large', flashover: {} };
  }
  const warnings = situationWarnings(openings);
  const criteria = criteriaFor(given, used, warnings, context);
  if (!criteria.mqh) noteLinings(given.linings, 'room.flashover.mqh', context);
  const broken =
    used === afterGlass ? criteria : criteriaFor(given, afterGlass, warnings, { ...context, workings: false });
  const hotLayer = hotLayerOf(given, criteria, warnings, context);
  return {
    ...base,
    ...limits,
    regime: starved(broken, afterGlass) ? 'closed' : 'compartment',
    flashover: { ...criteria, time: flashoverTime(given, criteria, warnings, context) },
    ...(hotLayer && { hotLayer }),
  };
}

function limitOf(stage: OpeningStage, context: TallyContext, extra: readonly EstimateWarning[]): Estimate {
  return stage.factor > 0
    ? estimate(
        ventilationLimit,
        { F: stage.factor, O: stage.openingFactor },
        { workings: context.workings, warnings: extra },
      )
    : estimate(ventilationLimit, { F: 0, O: 0 }, { workings: context.workings, warnings: extra });
}

function situationWarnings({ glassAssumedBroken, roofVents }: RoomOpenings): EstimateWarning[] {
  return [
    ...(glassAssumedBroken ? [GLASS_ASSUMED_BROKEN] : []),
    ...(roofVents > 0
      ? [
          {
            code: 'ROOF_VENT_NOT_IN_METHOD',
            text: 'A roof vent that is not closed lets heat out; the method knows wall openings only.',
          },
        ]
      : []),
  ];
}

function criteriaFor(
  { input, areas, openings, linings }: Given,
  stage: OpeningStage,
  warnings: readonly EstimateWarning[],
  context: TallyContext,
): Criteria {
  return flashoverCriteria(areas, stage, transferOf({ input, areas, openings, linings }, stage, context), {
    workings: context.workings,
    warnings,
  });
}

function transferOf(
  { input, areas, openings, linings }: Omit<Given, 'growth'>,
  stage: OpeningStage,
  context: TallyContext,
): HeatTransfer | undefined {
  if (linings.unknown.length > 0) return undefined;
  const exposure = input.options?.exposure_s ?? USUAL_EXPOSURE_S;
  return roomHeatTransfer(linings, areas, stage, openings.roofVents, exposure, context);
}

function noteLinings({ unknown }: RoomLinings, path: string, context: TallyContext): undefined {
  return noteMissing(
    context,
    path,
    `room.lining.${unknown[0] ?? 'walls'}`,
    `What the ${unknown.join(', ')} ${unknown.length === 1 && unknown[0] !== 'walls' ? 'is' : 'are'} made of is not known.`,
  );
}

/** When the design curve reaches the lowest criterion that applies, or why it never does. */
function flashoverTime(
  { growth }: Given,
  criteria: Criteria,
  warnings: readonly EstimateWarning[],
  context: TallyContext,
): Estimate {
  const lowest = lowestApplicable(criteria);
  const peak = growth.peak?.value ?? null;
  const alpha = growth.alpha?.value ?? 0;
  const Q = lowest?.value ?? criteria.thomas.value ?? 0;
  const never =
    lowest === undefined
      ? 'None of the criteria applies to this room.'
      : peak === null
        ? 'There is no design curve: nothing that burns is recorded, or its highest rate is not known.'
        : peak < Q
          ? `The design curve peaks at ${figure(peak)} kW, below the ${figure(Q)} kW of the lowest criterion that applies.`
          : undefined;
  return estimate(
    timeToReach,
    { Q, alpha },
    { workings: context.workings, warnings, ...(never === undefined ? {} : { never }) },
  );
}

/** Rise of the hot layer at the design peak, or at flashover where that comes first. */
function hotLayerOf(
  given: Given,
  criteria: Criteria,
  warnings: readonly EstimateWarning[],
  context: TallyContext,
): Estimate | undefined {
  const { used } = given.openings;
  const transfer = transferOf(given, used, context);
  const peak = given.growth.peak?.value ?? null;
  if (!transfer) return noteLinings(given.linings, 'room.hotLayer', context);
  if (peak === null) return noteMissing(context, 'room.hotLayer', 'contents', 'There is no design curve for the room.');
  const ceiling = lowestApplicable(criteria)?.value ?? 1500 * used.factor;
  const Q = Math.min(peak, ceiling);
  const inputs = { Q, h_k: transfer.value, A_T: used.liningArea, F: used.factor, position: 'centre' } as const;
  const capped = hotLayerMqh.run(inputs) >= LARGEST_RISE_K;
  return estimate(hotLayerMqh, inputs, {
    workings: context.workings,
    steps: [
      ...transfer.steps,
      ...(context.workings
        ? [{ text: 'Q: the design peak, or the lowest criterion that applies where it is lower', value: Q, unit: 'kW' }]
        : []),
    ],
    origins: { position: 'default' },
    warnings: [
      ...warnings,
      ...transfer.warnings,
      ...(capped
        ? [{ code: 'RISE_CAPPED', text: 'The relation gives more than 600 K, where its tests end; 600 K is shown.' }]
        : []),
    ],
  });
}
