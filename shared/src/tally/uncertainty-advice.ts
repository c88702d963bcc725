import type { UncertaintyAdvice } from '../uncertainty/room-uncertainty.ts';
import { triangularDeviation } from '../uncertainty/triangular.ts';
import { LABORATORY_HEAT_SPREAD, MASS_SPREAD } from '../uncertainty/survey-spread.ts';
import type { EntryHeat } from './entry-heats.ts';
import { loadBand, type BetterKnown } from './load-band.ts';

/** Below this a person would not see the band move. */
const LEAST_NARROWING = 0.1;
/** More than these nobody weighs for one number. */
const MOST_ENTRIES = 5;
const USUAL_ENTRIES = 3;
const HALF = 0.5;
/** A further entry is asked for only when it adds this much. */
const WORTH_ONE_MORE = 0.05;

type FloorLoad = { readonly Q: number; readonly A_f: number; readonly q: number };

/**
 * What would make the density surer: each piece of advice is tried on the first-order band and told with what it brings.
 * Empty where nothing narrows the band by a tenth.
 */
export function uncertaintyAdvice(
  heats: readonly EntryHeat[],
  load: FloorLoad,
  workings: boolean,
): UncertaintyAdvice[] {
  if (!(load.Q > 0)) return [];
  const tried = trial(heats, load, workings);
  return [weighing(heats, tried), measuring(heats, tried)]
    .flatMap((advice) => advice ?? [])
    .filter(({ narrowing }) => narrowing >= LEAST_NARROWING)
    .sort((a, b) => b.narrowing - a.narrowing);
}

type Tried = (known: Partial<BetterKnown>) => Pick<UncertaintyAdvice, 'narrowing' | 'p5' | 'p95'>;

function trial(heats: readonly EntryHeat[], load: FloorLoad, workings: boolean): Tried {
  const bandOf = (known: Partial<BetterKnown>) =>
    loadBand(heats, load, { workings }, { weighed: known.weighed ?? new Set(), measured: known.measured ?? new Set() });
  const widthOf = ({ band }: ReturnType<typeof bandOf>) => (band.p95.value ?? 0) - (band.p5.value ?? 0);
  const before = widthOf(bandOf({}));
  return (known) => {
    const after = bandOf(known);
    const narrowing = before > 0 ? 1 - widthOf(after) / before : 0;
    return { narrowing, p5: after.band.p5, p95: after.band.p95 };
  };
}

/** The fewest entries that halve the band when weighed; else the few that are worth it. */
function weighing(heats: readonly EntryHeat[], tried: Tried): UncertaintyAdvice | undefined {
  const gains = heats
    .map(({ entry, counted }) => {
      const spread = MASS_SPREAD[entry.evidence ?? 'estimated'];
      return { entry, gain: counted * counted * (spread * spread - MASS_SPREAD.weighed * MASS_SPREAD.weighed) };
    })
    .filter(({ gain }) => gain > 0)
    .sort((a, b) => b.gain - a.gain || (a.entry.id < b.entry.id ? -1 : 1))
    .slice(0, MOST_ENTRIES);
  const tries = gains.map((_, index) => {
    const chosen = gains.slice(0, index + 1).map(({ entry }) => entry);
    return { chosen, ...tried({ weighed: new Set(chosen.map(({ id }) => id)) }) };
  });
  const best = tries.find(({ narrowing }) => narrowing >= HALF) ?? worthIt(tries.slice(0, USUAL_ENTRIES));
  if (best === undefined) return undefined;
  const { chosen, ...brings } = best;
  const names = listed(chosen.map(({ label, id }) => `“${label ?? id}”`));
  const text = chosen.length === 1 ? `Weigh ${names}` : `Weigh these ${NUMBERS[chosen.length]} entries: ${names}`;
  return {
    kind: 'weigh',
    text: `${text}. The band would be ${narrower(brings.narrowing)}.`,
    entryIds: chosen.map(({ id }) => id),
    ...brings,
  };
}

function worthIt<T extends { readonly narrowing: number }>(tries: readonly T[]): T | undefined {
  let best = tries[0];
  for (const next of tries.slice(1)) {
    if (best !== undefined && next.narrowing - best.narrowing >= WORTH_ONE_MORE) best = next;
  }
  return best;
}

/** The one material whose heat would bring most in a laboratory. */
function measuring(heats: readonly EntryHeat[], tried: Tried): UncertaintyAdvice | undefined {
  const materials = new Map<string, { label: string; spread: number; entryIds: Set<string> }>();
  for (const { entry, parts } of heats) {
    for (const { count, part, psi } of parts) {
      const deviation = triangularDeviation(part.low, part.heat, part.high);
      const gain = deviation - LABORATORY_HEAT_SPREAD * part.heat;
      const mass = count * part.mass * psi;
      if (!(gain > 0 && mass > 0)) continue;
      const label = part.material?.label ?? part.label;
      const of = materials.get(part.key) ?? { label, spread: 0, entryIds: new Set<string>() };
      of.spread += mass * gain;
      of.entryIds.add(entry.id);
      materials.set(part.key, of);
    }
  }
  const [best] = [...materials].sort(([a, one], [b, other]) => other.spread - one.spread || (a < b ? -1 : 1));
  if (best === undefined) return undefined;
  const [key, { label, entryIds }] = best;
  const brings = tried({ measured: new Set([key]) });
  return {
    kind: 'heat',
    text: `Have the heat of “${label}” measured. The band would be ${narrower(brings.narrowing)}.`,
    entryIds: [...entryIds],
    ...brings,
  };
}

const NUMBERS = ['no', 'one', 'two', 'three', 'four', 'five'];

function listed(names: readonly string[]): string {
  return names.length < 2 ? names.join('') : `${names.slice(0, -1).join(', ')} and ${names.at(-1) ?? ''}`;
}

function narrower(share: number): string {
  const percent = Math.round(share * 100);
  return percent >= 48 && percent <= 52 ? 'half as wide' : `${percent} % narrower`;
}
