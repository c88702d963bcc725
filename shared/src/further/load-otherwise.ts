import { useByKey } from '../catalogue/uses.ts';
import { estimate, estimateOutputs } from '../methods/estimate.ts';
import { designLoadItalian } from '../methods/load/design-load-italian.ts';
import { designLoadSpanish } from '../methods/load/design-load-spanish.ts';
import { gradingClass } from '../methods/load/grading-class.ts';
import { woodEquivalent } from '../methods/load/wood-equivalent.ts';
import { gumbelFractile } from '../methods/statistics/gumbel-fractile.ts';
import { lognormalFractile } from '../methods/statistics/lognormal-fractile.ts';
import { readingOf, type FurtherGiven, type FurtherReading } from './further-reading.ts';

const NO_FLOOR = 'The room has no floor area.';
const WOOD_MJ_KG = 16.7;

/** The load of the room as other schemes count it. */
export function loadOtherwise(given: FurtherGiven): FurtherReading[] {
  const q = given.tally.load.perFloor?.value ?? null;
  return [
    readingOf(
      {
        id: 'wood-equivalent',
        topic: 'load',
        title: 'In kilograms of wood',
        note: 'For codes and older reports that count loads in wood.',
      },
      () =>
        q === null
          ? NO_FLOOR
          : [
              {
                name: 'Wood equivalent',
                estimate: estimate(
                  woodEquivalent,
                  { q, H_w: WOOD_MJ_KG },
                  { workings: true, origins: { H_w: { origin: 'default', note: '16.7 to 18 by the code that asks' } } },
                ),
              },
            ],
    ),
    readingOf(
      {
        id: 'grading-class',
        topic: 'load',
        title: 'Low, moderate or high by the grading of 1946',
        note: 'Older reports and leases speak of it. The resistance is what was matched with the class then.',
      },
      () => {
        if (q === null) return NO_FLOOR;
        const run = estimateOutputs(gradingClass, { q }, { workings: true });
        if (run.result.minutes === null) return 'The load is above 4540 MJ/m2, where the table ends.';
        return [{ name: `Class ${run.result.grade}: resistance matched with it`, estimate: run.of('minutes') }];
      },
    ),
    readingOf(
      {
        id: 'fractiles',
        topic: 'load',
        title: 'What surveys of this use found',
        note: 'Stored and passing goods only; to be compared with what is stored here, not with fixed linings.',
      },
      () => fractiles(given),
    ),
    readingOf(
      {
        id: 'scheme-it',
        topic: 'load',
        title: 'Design load by the Italian scheme of 2007',
        note: 'Its own factors; they replace those of the tally and are never mixed with them. Risk class II is taken.',
      },
      () => italian(given),
    ),
    readingOf(
      {
        id: 'scheme-es',
        topic: 'load',
        title: 'Design load by the Spanish scheme',
        note: 'Its own factors; they replace those of the tally and are never mixed with them. A use of low risk and a height of escape under 15 m are taken.',
      },
      () => spanish(given),
    ),
  ];
}

function fractiles({ input }: FurtherGiven) {
  const use = input.room.use == null ? undefined : useByKey(input.room.use);
  if (!use) return 'The use of the room is not stated.';
  if (!use.distribution) return `No survey of loads is known for the use “${use.label}”.`;
  const { kind, mean_MJ_m2: mean, cov: V, source } = use.distribution;
  const context = {
    workings: true,
    origins: {
      mean: { origin: 'catalogue', note: `${use.label}: ${source.title}` },
      V: { origin: 'catalogue', note: source.locator },
      p: 'default',
    },
  } as const;
  return [0.5, 0.8, 0.95].map((p) => ({
    name: `${Math.round(p * 100)} % of such rooms hold less than`,
    estimate:
      kind === 'gumbel'
        ? estimate(gumbelFractile, { mean, V, p }, context)
        : estimate(lognormalFractile, { mean, V, p }, context),
  }));
}

function compartmentFloor({ input, basis }: FurtherGiven): number {
  return input.room.compartment_floor_m2 ?? basis.areas.floor;
}

function italian(given: FurtherGiven) {
  const { protection } = given.input.room;
  const q_f = given.tally.load.perFloor?.value ?? null;
  if (q_f === null) return NO_FLOOR;
  const detection = protection?.detection ?? 'unknown';
  const brigade = protection?.brigade ?? 'unknown';
  const run = estimateOutputs(
    designLoadItalian,
    {
      q_f,
      A: compartmentFloor(given),
      risk: 'II',
      suppression: protection?.sprinklers == null ? 'none' : 'water',
      smoke: 'no',
      detection: detection === 'none' || detection === 'unknown' ? 'no' : 'yes',
      team: brigade === 'works' || brigade === 'both' ? 'yes' : 'no',
      hydrants: 'none',
      routes: protection?.access_routes === 'pressurised' ? 'yes' : 'no',
      access: 'no',
    },
    {
      workings: true,
      origins: {
        A: 'given',
        risk: 'default',
        suppression: 'given',
        smoke: { origin: 'default', note: 'no credit: nothing is recorded' },
        detection: 'given',
        team: 'given',
        hydrants: { origin: 'default', note: 'no credit: nothing is recorded' },
        routes: 'given',
        access: { origin: 'default', note: 'no credit: nothing is recorded' },
      },
    },
  );
  return [
    { name: 'Specific design fire load', estimate: run.of('load') },
    { name: 'Class of its table, level III', estimate: run.of('minutes') },
  ];
}

function spanish(given: FurtherGiven) {
  const { protection } = given.input.room;
  const { load } = given.tally;
  if (load.perFloor?.value == null) return NO_FLOOR;
  const detection = protection?.detection ?? 'unknown';
  const isDetected = detection !== 'none' && detection !== 'unknown';
  const run = estimateOutputs(
    designLoadSpanish,
    {
      q_fk: load.perFloor.value,
      m: load.combustionFactor.value ?? 1,
      A: compartmentFloor(given),
      risk: 'low',
      suppression: protection?.sprinklers == null ? 'no' : 'yes',
      detection: isDetected ? 'yes' : 'no',
      transmission: protection?.alarm_to_brigade && isDetected ? 'yes' : 'no',
      height: 'under-15-m',
    },
    {
      workings: true,
      origins: {
        A: 'given',
        risk: 'default',
        suppression: 'given',
        detection: 'given',
        transmission: 'given',
        height: 'default',
      },
    },
  );
  return [{ name: 'Design fire load', estimate: run.of('load') }];
}
