import { timeToRate } from './own-curve.ts';
import { runSpread, type RunRules, type SpreadRun } from './run-spread.ts';
import type { SpreadScene } from './spread-scene.ts';

/** With more entries than this only the most promising ones are tried. */
const TRY_ALL_UP_TO = 40;
const BY_EACH = 20;
/** Above this many entries fewer are tried, so that looking for the worst takes no longer. */
const FEWER_ABOVE = 500;
const TIME_GROWS_WITH = 1.6;
/** Runs that differ by no more than rounding are equal. */
const SAME = 1e-9;

export interface WorstFirst {
  readonly run: SpreadRun;
  /** How many first entries were tried, of how many that can burn. */
  readonly tried: number;
  readonly of: number;
}

/**
 * The first entry with the worst fire: earliest flashover, then highest peak, then earliest half of the room's heat, then
 * id. Up to 40 entries all are tried; of more, the 20 that radiate most onto the others and the 20 that alone reach
 * flashover soonest, and fewer above 500. Undefined when nothing can burn.
 */
export function worstFirst(scene: SpreadScene, rules: RunRules): WorstFirst | undefined {
  const burnable = scene.entries.map((_, index) => index).filter((index) => scene.canBurn(index));
  const candidates = burnable.length <= TRY_ALL_UP_TO ? burnable : candidatesOf(scene, burnable);
  let worst: SpreadRun | undefined;
  for (const index of candidates) {
    const run = runSpread(scene, index, rules, latestWorse(worst));
    if (run.stopped === 'overtaken') continue;
    if (worst === undefined || isWorse(run, worst)) worst = run;
  }
  return worst && { run: worst, tried: candidates.length, of: burnable.length };
}

/** A fire that has not flashed over by then is not worse, s. */
function latestWorse(worst: SpreadRun | undefined): number {
  return worst?.flashover_s == null ? Infinity : worst.flashover_s * (1 + SAME);
}

/** In the scene's order, which is by id. */
function candidatesOf(scene: SpreadScene, burnable: readonly number[]): readonly number[] {
  const radiated = new Map(burnable.map((index) => [index, radiatedBy(scene, index)]));
  const flashover = scene.room.flashover_kW ?? Infinity;
  const alone = new Map(burnable.map((index) => [index, timeToRate(scene.curve(index), flashover)]));
  const peak = (index: number) => scene.curve(index).peak;
  const byRadiation = [...burnable].sort((a, b) => radiated.get(b)! - radiated.get(a)! || a - b);
  const byRate = [...burnable].sort((a, b) => byTime(alone.get(a)!, alone.get(b)!) || peak(b) - peak(a) || a - b);
  const each = Math.ceil(BY_EACH * Math.min(1, (FEWER_ABOVE / burnable.length) ** TIME_GROWS_WITH));
  const chosen = new Set([...byRadiation.slice(0, each), ...byRate.slice(0, each)]);
  return burnable.filter((index) => chosen.has(index));
}

function byTime(a: number, b: number): number {
  return a === b ? 0 : a - b;
}

/** Flux that an entry at its peak gives to all others together. */
function radiatedBy(scene: SpreadScene, index: number): number {
  const { weights, special } = scene.view(index);
  let sum = special.reduce((total, { view }) => total + view * scene.entries[index]!.radiativeFraction, 0);
  for (const weight of weights) sum += weight;
  return sum * scene.curve(index).peak;
}

function isWorse(a: SpreadRun, b: SpreadRun): boolean {
  const order = [
    [a.flashover_s ?? Infinity, b.flashover_s ?? Infinity],
    [-a.peak_kW, -b.peak_kW],
    [a.halfHeat_s ?? Infinity, b.halfHeat_s ?? Infinity],
  ] as const;
  for (const [x, y] of order) {
    if (x === y || Math.abs(x - y) <= SAME * Math.max(Math.abs(x), Math.abs(y))) continue;
    return x < y;
  }
  return a.first < b.first;
}
