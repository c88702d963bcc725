import { bounds } from '../geometry/bounds.ts';
import { estimateOutputs, type Estimate, type EstimateWarning, type Origins } from '../methods/estimate.ts';
import { figure } from '../methods/figure.ts';
import { detectorResponse } from '../methods/plume/detector-response.ts';
import { smokeIndicator } from '../methods/plume/smoke-indicator.ts';
import { rangeFaults, type RangeFault } from '../methods/range-faults.ts';
import { pointsOf } from './points-of.ts';
import type { RoomBasis } from './room-basis.ts';
import type { RoomTally } from './room-tally.ts';
import { noteMissing, type TallyContext } from './tally-context.ts';

type Response = RoomTally['response'];
type Head = { readonly rti: number; readonly activation_C: number };

/** Farthest place from a head of a grid of 4 × 3 m, 12 m² each; EN 12845, ordinary hazard, from memory. */
const SPRINKLER_REACH_M = 2.5;
/** Farthest place from a point detector under a flat ceiling; CEN/TS 54-14, from memory. */
const HEAT_REACH_M = 5;
const SMOKE_REACH_M = 7.5;
/** Class A1 of EN 54-5 responds at 65 °C at the latest; an index of 50 is common practice. Both from memory. */
const HEAT_DETECTOR: Head = { rti: 50, activation_C: 65 };
const USUAL_AMBIENT_C = 20;

const FIELD: Readonly<Record<string, string>> = {
  H: 'room.height_m',
  RTI: 'room.protection.sprinklers.rti',
  T_act: 'room.protection.sprinklers.activation_C',
  T_a: 'options.ambient_C',
  r: 'room.protection.sprinklers.distance_m',
};

/** The fire under the ceiling, as every device sees it. */
interface Fire {
  readonly t: readonly number[];
  readonly Q: readonly number[];
  readonly H: number;
  readonly base: number;
  readonly baseStated: boolean;
  readonly T_a: number;
}

/**
 * The section `response` of a tally: when sprinklers and detectors respond to the design curve. The curve itself is not
 * reduced by them: the design load credits sprinklers already.
 */
export function responseSection({ input, areas, growth }: RoomBasis, context: TallyContext): Response {
  const { sprinklers, detection } = input.room.protection ?? {};
  const absent = (path: string, what: string) =>
    noteMissing(context, path, `room.protection.${path === SPRINKLER ? 'sprinklers' : 'detection'}`, what);
  if (sprinklers == null) absent(SPRINKLER, 'No sprinklers are recorded for the room.');
  const detects = detection === 'heat' || detection === 'smoke' || detection === 'both';
  if (!detects) absent(DETECTOR, 'No detectors are recorded for the room.');
  if (growth.curve === undefined) {
    const { input: wanted, why } = context.missing.find(({ path }) => path === 'growth.curve') ?? NO_CURVE;
    for (const path of [...(sprinklers == null ? [] : [SPRINKLER]), ...(detects ? [DETECTOR] : [])]) {
      noteMissing(context, path, wanted, why);
    }
    return {};
  }
  const first = input.contents.find(({ id }) => id === input.options?.first_entry);
  const base = first?.base_height_m ?? 0;
  const fire: Fire = {
    t: growth.curve.map(([t]) => t),
    Q: growth.curve.map(([, Q]) => Q),
    H: areas.height - base,
    base,
    baseStated: first?.base_height_m != null,
    T_a: input.options?.ambient_C ?? USUAL_AMBIENT_C,
  };
  const around = bounds(pointsOf(input.room.ring_m));
  const toCorner = Math.hypot(around.maxX_m - around.minX_m, around.maxY_m - around.minY_m) / 2;
  const reach = (usual: number) => Math.min(usual, toCorner);
  const sprinkler =
    sprinklers == null
      ? undefined
      : heated(
          SPRINKLER,
          fire,
          sprinklers,
          { r: sprinklers.distance_m ?? reach(SPRINKLER_REACH_M), stated: sprinklers.distance_m != null, warnings: [] },
          context,
        );
  const heat =
    detection === 'heat' || detection === 'both'
      ? heated(
          DETECTOR,
          fire,
          HEAT_DETECTOR,
          { r: reach(HEAT_REACH_M), stated: false, warnings: [DETECTOR_ASSUMED] },
          context,
        )
      : undefined;
  const smoke = detection === 'smoke' || detection === 'both' ? smoked(fire, reach(SMOKE_REACH_M), context) : undefined;
  const detector = earlier(heat, smoke);
  return {
    ...(sprinkler && { sprinkler }),
    ...(detector && { detector }),
    ...(heat && smoke && { heatDetector: heat, smokeDetector: smoke }),
  };
}

const SPRINKLER = 'response.sprinkler';
const DETECTOR = 'response.detector';
const NO_CURVE = { input: 'contents', why: 'There is no design curve for the room.' };
const DETECTOR_ASSUMED: EstimateWarning = {
  code: 'DETECTOR_ASSUMED',
  text: `The detector is taken to respond at ${HEAT_DETECTOR.activation_C} °C with a response time index of ${HEAT_DETECTOR.rti} (m s)1/2.`,
};
const INDICATOR_ONLY: EstimateWarning = {
  code: 'INDICATOR_ONLY',
  text: 'Gas 13 K warmer stands in for smoke; a real detector may respond minutes earlier or later.',
};

interface Where {
  readonly r: number;
  readonly stated: boolean;
  readonly warnings: readonly EstimateWarning[];
}

/** A sprinkler or heat detector. */
function heated(path: string, fire: Fire, head: Head, at: Where, context: TallyContext): Estimate | undefined {
  const { t, Q, H, T_a } = fire;
  const inputs = { t, Q, H, r: at.r, place: 'free', RTI: head.rti, T_a, T_act: head.activation_C } as const;
  const faults = rangeFaults(detectorResponse, inputs);
  if (faults.length > 0) return outOfRange(path, faults, context);
  const stated = path === SPRINKLER;
  const run = estimateOutputs(detectorResponse, inputs, {
    workings: context.workings,
    warnings: [...at.warnings, ...distanceWarning(at)],
    origins: {
      ...commonOrigins(fire, at.stated),
      RTI: stated ? 'given' : { origin: 'default', note: 'common practice' },
      T_act: stated ? 'given' : { origin: 'default', note: 'class A1 of EN 54-5, from memory' },
    },
  });
  const { time, hottest } = run.result;
  return run.of(
    'time',
    time === null
      ? `The device warms by ${figure(hottest, 3)} K at most; it responds at ${figure(head.activation_C - T_a, 3)} K.`
      : undefined,
  );
}

function smoked(fire: Fire, r: number, context: TallyContext): Estimate | undefined {
  const inputs = { t: fire.t, Q: fire.Q, H: fire.H, r, place: 'free' } as const;
  const faults = rangeFaults(smokeIndicator, inputs);
  if (faults.length > 0) return outOfRange(DETECTOR, faults, context);
  const run = estimateOutputs(smokeIndicator, inputs, {
    workings: context.workings,
    warnings: [INDICATOR_ONLY, ...distanceWarning({ r, stated: false })],
    origins: commonOrigins(fire, false),
  });
  const { time, rate } = run.result;
  const peak = fire.Q.reduce((most, one) => Math.max(most, one), 0);
  return run.of(
    'time',
    time === null
      ? `It takes ${figure(rate, 3)} kW to warm the gas there by 13 K; the fire peaks at ${figure(peak, 3)} kW.`
      : undefined,
  );
}

function commonOrigins({ base, baseStated }: Fire, stated: boolean): Origins<typeof smokeIndicator.inputs> {
  return {
    t: { origin: 'computed', note: 'design curve of the room' },
    Q: { origin: 'computed', note: 'design curve of the room' },
    H: {
      origin: 'computed',
      note: baseStated
        ? `room height less the ${figure(base)} m at which the first entry stands`
        : 'room height; the fire is taken to burn on the floor',
    },
    r: stated ? 'given' : { origin: 'default', note: 'farthest place from a device of a usual grid' },
    place: { origin: 'default', note: 'away from the walls, where it responds last' },
  };
}

function distanceWarning({ r, stated }: Pick<Where, 'r' | 'stated'>): EstimateWarning[] {
  if (stated) return [];
  return [
    {
      code: 'DISTANCE_ASSUMED',
      text: `The device is taken to be ${figure(Number(r.toPrecision(3)))} m from the fire along the ceiling, the farthest place of a usual grid in this room.`,
    },
  ];
}

function outOfRange(path: string, faults: readonly RangeFault[], context: TallyContext): undefined {
  return noteMissing(context, path, FIELD[faults[0]!.input] ?? 'contents', faults.map(({ text }) => text).join(' '));
}

/** The one that responds first; one that never does comes after one that does. */
function earlier(a: Estimate | undefined, b: Estimate | undefined): Estimate | undefined {
  if (!a || !b) return a ?? b;
  return (a.value ?? Infinity) < (b.value ?? Infinity) ? a : b;
}
