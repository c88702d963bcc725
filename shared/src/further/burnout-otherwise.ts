import { conversionFactor } from '../methods/burnout/conversion-factor.ts';
import { equivalentTimeJcss } from '../methods/burnout/equivalent-time-jcss.ts';
import { equivalentTimeLaw } from '../methods/burnout/equivalent-time-law.ts';
import { equivalentTimePettersson } from '../methods/burnout/equivalent-time-pettersson.ts';
import { equivalentTime } from '../methods/burnout/equivalent-time.ts';
import { externalCurve, hydrocarbonCurve, standardCurve } from '../methods/burnout/nominal-curves.ts';
import { smallRoomWeight } from '../methods/burnout/small-room-weight.ts';
import { estimate } from '../methods/estimate.ts';
import { cellulosicShare, LEAST_CELLULOSIC } from '../tally/cellulosic-share.ts';
import { askedOrigin } from './further-asked.ts';
import { readingOf, type FurtherGiven, type FurtherReading, type NamedReading } from './further-reading.ts';

const NO_OPENING = 'No opening is open or would break.';
const NO_LOAD = 'The load per floor area is not known.';
const WOOD_MJ_KG = 17;
const LARGEST_SMALL_M2 = 100;

/** Nominal curves, and the equivalent time as older and other forms have it, load as kept. */
export function burnoutOtherwise(given: FurtherGiven): FurtherReading[] {
  const { asked, basis } = given;
  const hot = cellulosicShare(basis.heats) < LEAST_CELLULOSIC;
  return [
    readingOf(
      {
        id: 'nominal-curves',
        topic: 'burn-out',
        title: `Nominal curves after ${asked.minutes} min`,
        note: hot
          ? 'Rated resistances are found under the standard curve. More than a fifth of the heat here is in liquids or plastics: the hydrocarbon curve is nearer to that.'
          : 'Rated resistances are found under the standard curve. None of them knows the load or the room.',
      },
      () =>
        (
          [
            ['Standard curve', standardCurve],
            ['External curve', externalCurve],
            ['Hydrocarbon curve', hydrocarbonCurve],
          ] as const
        ).map(([name, method]) => ({
          name,
          estimate: estimate(
            method,
            { t: asked.minutes },
            { workings: true, origins: { t: askedOrigin(asked, 'minutes') } },
          ),
        })),
    ),
    readingOf(
      {
        id: 'equivalent-time-small-room',
        topic: 'burn-out',
        title: 'Equivalent time with the factor of a small room',
        note: 'The annex offers it for rooms up to 100 m² without roof openings; the tally uses the general factor for every room.',
      },
      () => smallRoom(given),
    ),
    readingOf(
      {
        id: 'equivalent-time-older',
        topic: 'burn-out',
        title: 'Equivalent time by older forms',
        note: 'On the load and the openings alone, for comparison; they differ by a factor of two without one being the right one.',
      },
      () => olderForms(given),
    ),
  ];
}

function smallRoom({ tally, basis, input }: FurtherGiven): NamedReading[] | string {
  const { areas, openings } = basis;
  const q_fd = tally.load.asKept?.value ?? null;
  if (q_fd === null) return NO_LOAD;
  if (!(openings.afterGlass.factor > 0)) return NO_OPENING;
  if (areas.floor > LARGEST_SMALL_M2) return 'The floor is larger than 100 m2.';
  if (openings.roofVents > 0) return 'A roof vent is not closed.';
  const weight = estimate(
    smallRoomWeight,
    { O: openings.afterGlass.openingFactor, A_f: areas.floor, A_t: areas.enclosing },
    { workings: true },
  );
  const b = tally.burnout.thermalInertia?.value ?? null;
  const table = input.options?.kb === 'UK' ? 'UK' : 'EN';
  const k_b = b === null ? conversionFactor.run({ b: 0, table }) : conversionFactor.run({ b, table });
  return [
    { name: 'Ventilation factor of a small room', estimate: weight },
    {
      name: 'Equivalent time with it',
      estimate: estimate(
        equivalentTime,
        { q_fd, k_b, w_f: weight.value ?? 0, k_c: 1 },
        {
          workings: true,
          warnings: weight.warnings,
          origins: {
            k_b: b === null ? { origin: 'default', note: 'linings not known: the largest of the table' } : 'computed',
            k_c: { origin: 'default', note: 'concrete, or protected steel' },
          },
        },
      ),
    },
  ];
}

function olderForms({ tally, basis }: FurtherGiven): NamedReading[] | string {
  const { areas, openings } = basis;
  const { area: A_v, factor, openingFactor: O } = openings.afterGlass;
  const q_f = tally.load.perFloor?.value ?? null;
  const q_t = tally.load.perEnclosure?.value ?? null;
  if (q_f === null || q_t === null) return NO_LOAD;
  if (!(factor > 0)) return NO_OPENING;
  const A_f = areas.floor;
  return [
    {
      name: 'After Law',
      estimate: estimate(
        equivalentTimeLaw,
        { A_f, q_f, H_c: WOOD_MJ_KG, A_v, A_t: areas.enclosing - A_f },
        {
          workings: true,
          origins: {
            H_c: { origin: 'default', note: 'wood' },
            A_t: { origin: 'computed', note: 'without the floor, as in the original' },
          },
        },
      ),
    },
    { name: 'After Pettersson', estimate: estimate(equivalentTimePettersson, { q_t, O }, { workings: true }) },
    {
      name: 'Of the probabilistic model code',
      estimate: estimate(equivalentTimeJcss, { q_0: q_f, A_f, A_t: areas.enclosing, f: O }, { workings: true }),
    },
  ];
}
