import { ignitionOf, type IgnitionClass } from '@embertally/shared/spread/ignition-class';
import { simulateSpread, type SpreadInput } from '@embertally/shared/spread/simulate-spread';
import { shortGaps } from '@embertally/shared/spread/short-gaps';
import type { SpreadEntry } from '@embertally/shared/spread/spread-entry';
import { seededRandom } from '../support/seeded-random.ts';
import { atMost, median, type BenchRow } from './bench-row.ts';

const CLASSES: readonly IgnitionClass[] = ['easy', 'normal', 'hard', 'resistant'];
const ALPHAS = [600, 300, 150, 75].map((seconds) => 1000 / seconds ** 2);
const ROUNDS = 7;
const SIZES = [100, 200, 500, 1000];

function entry(index: number, place: Partial<SpreadEntry['place'] & object>, rest: Partial<SpreadEntry>): SpreadEntry {
  return {
    id: `e${String(index).padStart(4, '0')}`,
    place: { x_m: 0, y_m: 0, width_m: 0.8, depth_m: 0.8, rotation_deg: 0, base_m: 0, height_m: 1, ...place },
    heat_MJ: 400,
    peak_kW: 800,
    growth: { by: 't-squared', alpha_kW_s2: ALPHAS[2]! },
    radiativeFraction: 0.35,
    ignition: ignitionOf('normal'),
    enclosure: 'open',
    ...rest,
  };
}

/** A store that never reaches flashover, so that every entry has to be lit by its neighbours, with or without a layer. */
function room(entries: readonly SpreadEntry[], layered: boolean): SpreadInput {
  const layers = [{ thickness_m: 0.016, conductivity_W_mK: 0.48, density_kg_m3: 1440, specific_heat_J_kgK: 840 }];
  return {
    room: {
      surfaces: layered ? [{ area_m2: 1200, layers }] : null,
      liningArea_m2: 1200,
      factorBefore: 40,
      factorAfter: 60,
      flashover_kW: null,
      ambient_C: 20,
      large: false,
      oxygenLimitedHeat_MJ: null,
    },
    entries,
    first: entries[0]!.id,
    fluxFactor: 1,
    ignition: 'dose',
    flashoverGrowth_kW_s2: ALPHAS[3]!,
  };
}

/** Rows in which the fire walks from one corner to the other: two hours for 500 entries, three for 1000. */
function allIgnite(count: number): SpreadInput {
  const perRow = Math.ceil(Math.sqrt(count));
  return room(
    Array.from({ length: count }, (_, index) =>
      entry(
        index,
        { x_m: (index % perRow) * 1.6, y_m: Math.floor(index / perRow) * 1.6 },
        { growth: { by: 't-squared', alpha_kW_s2: ALPHAS[0]! } },
      ),
    ),
    false,
  );
}

/** Entries of every size, growth and class, strewn over the floor; some stand on others. Every other room has a layer. */
function seededRoom(count: number, seed: number): SpreadInput {
  const random = seededRandom(seed);
  const between = (low: number, high: number) => low + (high - low) * random();
  const side = (1.3 + 0.1 * (seed % 5)) * Math.sqrt(count);
  return room(
    Array.from({ length: count }, (_, index) =>
      entry(
        index,
        {
          x_m: between(0, side),
          y_m: between(0, side),
          width_m: between(0.3, 3),
          depth_m: between(0.3, 1),
          rotation_deg: between(0, 180),
          base_m: random() < 0.1 ? 1.2 : 0,
        },
        {
          heat_MJ: between(20, 2000),
          peak_kW: between(50, 2500),
          growth: { by: 't-squared', alpha_kW_s2: ALPHAS[Math.floor(between(0, 4))]! },
          ignition: ignitionOf(CLASSES[Math.floor(between(0, 4))]!),
        },
      ),
    ),
    seed % 2 === 0,
  );
}

function milliseconds(input: SpreadInput, run: (one: SpreadInput) => unknown = (one) => simulateSpread(one)): number {
  run(input);
  const times: number[] = [];
  for (let round = 0; round < ROUNDS; round += 1) {
    const began = performance.now();
    run(input);
    times.push(performance.now() - began);
  }
  return median(times);
}

function litIn(input: SpreadInput): number {
  return simulateSpread(input)?.events.length ?? 0;
}

/** Spread of fire over four hours at most, one first entry. */
export function benchSpread(): Promise<readonly BenchRow[]> {
  const all = allIgnite(500);
  const lit = litIn(all);
  if (lit !== 500) throw new Error(`Only ${lit} of 500 entries ignite; the row would be about another fire.`);
  const seeded = Array.from({ length: 10 }, (_, seed) => milliseconds(seededRoom(500, seed + 1)));
  const sizes = SIZES.map((count) => ({ count, time: milliseconds(allIgnite(count)) }));
  const [few, many] = [sizes[1]!, sizes.at(-1)!];
  const exponent = Math.log(many.time / few.time) / Math.log(many.count / few.count);
  return Promise.resolve([
    ...sizes.map(({ count, time }) =>
      atMost(`spread, ${count} entries, all ignite`, time, 'ms', count === 500 ? 150 : null),
    ),
    atMost('spread, 500 entries, worst of ten seeded rooms', Math.max(...seeded), 'ms', 400),
    atMost(
      'spread, gaps that are too small, 500 entries',
      milliseconds(all, (one) => shortGaps(one, 200)),
      'ms',
      null,
    ),
    atMost(`spread, exponent of growth from ${few.count} to ${many.count} entries`, exponent, '', 2.1),
  ]);
}
