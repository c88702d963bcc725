import type { Distribution } from '../uncertainty/distribution.ts';
import { HEAT_OF_VAPORISATION_MJ_KG } from '../methods/heat/water.ts';
import type { LoadModel, ModelEntry, ModelHeat, ModelMaterial, ModelTerm } from '../uncertainty/load-model.ts';
import { CABINET, massDistribution, MOISTURE_SPREAD } from '../uncertainty/survey-spread.ts';
import type { CountedPart, EntryHeat } from './entry-heats.ts';
import type { PartHeat } from './part-heat.ts';
import type { RoomInput } from './room-input.ts';

/** What of a load is sampled and what is left as it was counted. */
interface LoadRules {
  /** Whether closed cabinets let in an uncertain share; not where the EN rule decides what counts. */
  readonly cabinets: boolean;
  /** One combustion factor for everything, where a person stated one. */
  readonly combustion: number | null;
  /** What makes a load that is not fixed the characteristic one. */
  readonly variable: number;
}

/**
 * The inputs behind a room's load and how they are put together, for sampling.
 * @param variable what stored and passing load is multiplied by for the characteristic load
 */
export function loadModelOf(input: RoomInput, heats: readonly EntryHeat[], variable: number): LoadModel {
  const rules: LoadRules = {
    cabinets: input.options?.protected_loads !== 'EN',
    combustion: input.options?.combustion_factor ?? null,
    variable,
  };
  const book = new HeatBook();
  const entries = heats.map((heat) => modelEntry(heat, rules, book));
  return { materials: book.materials, heats: book.heats, entries: entries.filter(({ terms }) => terms.length > 0) };
}

function modelEntry({ entry, parts }: EntryHeat, rules: LoadRules, book: HeatBook): ModelEntry {
  const terms = parts.flatMap((part) => modelTerm(part, rules, book));
  return {
    id: entry.id,
    label: entry.label ?? entry.id,
    mass: massDistribution(entry.evidence ?? 'estimated'),
    cabinet: terms.some(({ inCabinet }) => inCabinet) ? { kind: 'triangular', ...CABINET } : null,
    terms,
    characteristic: entry.keeping === 'fixed' ? 1 : rules.variable,
  };
}

function modelTerm({ count, part, psi }: CountedPart, rules: LoadRules, book: HeatBook): ModelTerm[] {
  const inCabinet = rules.cabinets && psi === CABINET.mode;
  const mass = count * part.mass * (inCabinet ? 1 : psi);
  if (!(mass > 0)) return [];
  return [{ heat: book.placeOf(part), mass, inCabinet, combustion: rules.combustion ?? part.combustionFactor }];
}

/** Materials and heats, each once. */
class HeatBook {
  readonly materials: ModelMaterial[] = [];
  readonly heats: ModelHeat[] = [];
  readonly #materialAt = new Map<string, number>();
  readonly #heatAt = new Map<string, number>();

  placeOf(part: PartHeat): number {
    const moisture = part.moist ? MOISTURE_SPREAD * (part.heatDry + HEAT_OF_VAPORISATION_MJ_KG) : 0;
    const name = `${part.key}|${part.low}|${part.heat}|${part.high}|${moisture}`;
    let place = this.#heatAt.get(name);
    if (place === undefined) {
      const distribution: Distribution = { kind: 'triangular', low: part.low, mode: part.heat, high: part.high };
      place = this.heats.push({ material: this.#materialOf(part), distribution, moisture }) - 1;
      this.#heatAt.set(name, place);
    }
    return place;
  }

  #materialOf({ key, material, label }: PartHeat): number {
    const found = this.#materialAt.get(key);
    if (found !== undefined) return found;
    const place = this.materials.push({ key, label: material?.label ?? label }) - 1;
    this.#materialAt.set(key, place);
    return place;
  }
}
