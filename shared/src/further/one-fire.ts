import { estimate, estimateOutputs } from '../methods/estimate.ts';
import { flameHeight } from '../methods/plume/flame-height.ts';
import { localisedAtCeiling } from '../methods/plume/localised-at-ceiling.ts';
import { localisedBelowCeiling } from '../methods/plume/localised-below-ceiling.ts';
import { plumeMassFlow } from '../methods/plume/plume-mass-flow.ts';
import { plumeTemperature } from '../methods/plume/plume-temperature.ts';
import { plumeVelocity } from '../methods/plume/plume-velocity.ts';
import { virtualOrigin } from '../methods/plume/virtual-origin.ts';
import { pointSource } from '../methods/radiation/point-source.ts';
import { askedOrigin } from './further-asked.ts';
import { readingOf, type FurtherGiven, type FurtherReading, type NamedReading } from './further-reading.ts';
import { peakOrigin, strongestFire, type StrongestFire } from './strongest-fire.ts';

const W_PER_KW = 1000;
const CONVECTIVE = 0.65;
const AIR_KG_M3 = 1.2;
const ZERO_C_IN_K = 273.15;
const USUAL_AMBIENT_C = 20;
const NO_FIRE = 'No entry that can burn has a footprint: give width and depth.';

/** The entry with the highest peak, burning alone: flame, plume, ceiling above it, radiation aside. */
export function oneFire(given: FurtherGiven): FurtherReading[] {
  const fire = strongestFire(given);
  const whose = fire ? `${fire.label} at its peak` : 'The strongest entry at its peak';
  const make = (numbers: (fire: StrongestFire) => readonly NamedReading[] | string) => () =>
    fire ? numbers(fire) : NO_FIRE;
  return [
    readingOf(
      {
        id: 'flame-and-plume',
        topic: 'one fire',
        title: `Flame and plume: ${whose}`,
        note: 'In the open air below the ceiling, before the room feeds back.',
      },
      make((one) => flameAndPlume(given, one)),
    ),
    readingOf(
      {
        id: 'localised-fire',
        topic: 'one fire',
        title: `The ceiling above: ${whose}`,
        note: 'For structure right above a fire that stays where it is. Where the flame reaches the ceiling it is a flux, else a temperature.',
      },
      make((one) => localised(given, one)),
    ),
    readingOf(
      {
        id: 'point-source',
        topic: 'one fire',
        title: `Radiation at ${given.asked.aside_m} m: ${whose}`,
        note: 'Once by the point source as it is; with a safety factor of 2 it is used for distances.',
      },
      make((one) => [
        {
          name: 'Radiation onto who or what faces it',
          estimate: estimate(
            pointSource,
            { Q: one.Q, chi_r: one.radiativeFraction, R: given.asked.aside_m, ratio: given.asked.aside_m / one.D },
            {
              workings: true,
              origins: { Q: peakOrigin(one), chi_r: 'given', R: askedOrigin(given.asked, 'aside_m') },
            },
          ),
        },
      ]),
    ),
  ];
}

function flameAndPlume({ basis, input }: FurtherGiven, fire: StrongestFire): NamedReading[] {
  const { Q, D } = fire;
  const origins = { Q: peakOrigin(fire), D: { origin: 'computed', note: 'circle as large as the footprint' } } as const;
  const flame = estimate(flameHeight, { Q, D, ratio: Q ** 0.4 / D }, { workings: true, origins });
  const origin = estimate(virtualOrigin, { Q, D }, { workings: true, origins });
  const numbers = [
    { name: 'Flame above its base', estimate: flame },
    { name: 'Virtual origin above its base', estimate: origin },
  ];
  const z = basis.areas.height - fire.base_m;
  const z_0 = origin.value ?? 0;
  if (!(z > Math.max(z_0, flame.value ?? 0))) return numbers;
  const Q_c = CONVECTIVE * Q;
  const T_0 = (input.options?.ambient_C ?? USUAL_AMBIENT_C) + ZERO_C_IN_K;
  const air = { Q_c, z, z_0, T_0, rho_0: AIR_KG_M3 };
  const given = {
    workings: true,
    origins: {
      Q_c: { origin: 'computed', note: '65 % of the peak' },
      z: { origin: 'computed', note: 'from the base of the fire to the ceiling' },
      rho_0: 'default',
    },
  } as const;
  return [
    ...numbers,
    { name: 'Rise on the axis at the ceiling', estimate: estimate(plumeTemperature, air, given) },
    { name: 'Velocity on the axis at the ceiling', estimate: estimate(plumeVelocity, air, given) },
    {
      name: 'Smoke that rises to the ceiling',
      estimate: estimate(plumeMassFlow, { Q_c, z, z_0, L: flame.value ?? 0 }, given),
    },
  ];
}

function localised({ basis, asked }: FurtherGiven, fire: StrongestFire): NamedReading[] {
  const Q = fire.Q * W_PER_KW;
  const H = basis.areas.height - fire.base_m;
  const origins = { Q: peakOrigin(fire), D: { origin: 'computed', note: 'circle as large as the footprint' } } as const;
  const below = estimateOutputs(localisedBelowCeiling, { Q, D: fire.D, z: H }, { workings: true, origins });
  const flame = { name: 'Flame length', estimate: below.of('flame') };
  if (below.result.flame < H) return [flame, { name: 'Gas under the ceiling', estimate: below.of('temperature') }];
  return [
    flame,
    ...[0, asked.aside_m].map((r) => ({
      name: r === 0 ? 'Flux to the ceiling on the axis' : `Flux to the ceiling ${asked.aside_m} m aside`,
      estimate: estimateOutputs(
        localisedAtCeiling,
        { Q, D: fire.D, H, r },
        { workings: true, origins: { ...origins, r: r === 0 ? 'default' : askedOrigin(asked, 'aside_m') } },
      ).of('flux'),
    })),
  ];
}
