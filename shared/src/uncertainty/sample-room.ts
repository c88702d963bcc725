import { designFire } from '../methods/growth/design-fire.ts';
import { ventilationWeight } from '../methods/burnout/ventilation-weight.ts';
import type { Distribution } from './distribution.ts';
import { fillSamples } from './fill-samples.ts';
import type { LoadSamples } from './sample-load.ts';
import { fillUniform, randomStream } from './random-stream.ts';
import { AREA_SPREAD, GROWTH_SPREAD, HEIGHT_SPREAD, OPENING_SPREAD, OVERLOOKED, PEAK_SPREAD } from './survey-spread.ts';
import type { SampledQuantity } from '../methods/models/monte-carlo-method.ts';

/** What the room adds to its load; null where the tally has no such number. */
export interface RoomModel {
  /** m² */
  readonly floor: number | null;
  readonly growth: {
    /** kW/s² */
    readonly alpha: number;
    /** kW; infinite where it is not known or does not limit. */
    readonly fuelPlateau: number;
    readonly openingsPlateau: number;
  } | null;
  readonly burnout: {
    /** k_b k_c as computed, min m²/MJ. */
    readonly factor: number;
    /** Whether k_c follows the openings. */
    readonly followsOpenings: boolean;
    /** m */
    readonly height: number;
    readonly alpha_v: number;
    readonly alpha_h: number;
  } | null;
}

const LARGEST_ALPHA_V = 0.25;
const LEAST_HEAT = 1e-9;
const relative = (kind: 'normal' | 'lognormal', deviation: number): Distribution => ({ kind, mean: 1, deviation });
const overlooked: Distribution = { kind: 'triangular', ...OVERLOOKED };

/** The room's own inputs: one draw each, whatever number they go into. */
export const ROOM_INPUTS = { overlooked, floor: relative('normal', AREA_SPREAD) } as const;

/**
 * Samples of every number that has a band, in the order of the load's samples. The design fire and the equivalent time
 * are computed anew for each.
 */
export function sampleRoom(
  load: LoadSamples,
  room: RoomModel,
  seed: number,
): Readonly<Partial<Record<SampledQuantity, Float64Array>>> {
  const count = load.total.length;
  const draw = (name: string, distribution: Distribution) => {
    const out = new Float64Array(count);
    fillUniform(randomStream(seed, `room:${name}`), out, count);
    fillSamples(distribution)(out, out, count);
    return out;
  };
  const more = draw('overlooked', ROOM_INPUTS.overlooked);
  const total = load.total.map((Q, i) => Q * (1 + more[i]!));
  const { floor, growth, burnout } = room;
  const openings = draw('openings', relative('normal', OPENING_SPREAD));
  const released = load.released.map((E, i) => E * (1 + more[i]!));
  return {
    total,
    ...(floor !== null && perFloor()),
    ...(growth !== null && { peak: peaks(growth) }),
  };

  function perFloor() {
    const A_f = draw('floor', ROOM_INPUTS.floor).map((share) => share * (floor ?? 1));
    const density = total.map((Q, i) => Q / A_f[i]!);
    return { perFloor: density, ...(burnout !== null && { equivalentTime: times(burnout, A_f) }) };
  }

  function peaks({ alpha, fuelPlateau, openingsPlateau }: NonNullable<RoomModel['growth']>) {
    const fuel = draw('peak', relative('lognormal', PEAK_SPREAD));
    const pace = draw('growth', relative('lognormal', GROWTH_SPREAD));
    return released.map((E, i) => {
      const Q_max = Math.min(fuelPlateau * fuel[i]!, openingsPlateau * openings[i]!);
      return E < LEAST_HEAT ? 0 : designFire.run({ E, Q_max, alpha: alpha * pace[i]! }).peak;
    });
  }

  /** m q_f,k of each sample: the heat set free of each, with what makes the load the characteristic one. */
  function times(given: NonNullable<RoomModel['burnout']>, A_f: Float64Array) {
    const { factor, followsOpenings, height, alpha_v, alpha_h } = given;
    const heights = draw('height', relative('normal', HEIGHT_SPREAD));
    return load.total.map((Q, i) => {
      const m = Q > 0 ? load.released[i]! / Q : 1;
      const q = (m * load.characteristic[i]! * (1 + more[i]!)) / A_f[i]!;
      const floorShare = A_f[i]! / (floor ?? 1);
      const share = Math.min(LARGEST_ALPHA_V, (alpha_v * openings[i]!) / floorShare);
      const { w_f } = ventilationWeight.run({ H: height * heights[i]!, alpha_v: share, alpha_h: alpha_h / floorShare });
      return q * factor * w_f * (followsOpenings ? openings[i]! : 1);
    });
  }
}
