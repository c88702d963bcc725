import type { SpreadEntry } from './spread-entry.ts';
import type { SpreadRoom } from './spread-room.ts';
import { SpreadScene } from './spread-scene.ts';
import { runSpread, type SpreadRun } from './run-spread.ts';
import { thinCurve } from './thin-curve.ts';
import { worstFirst } from './worst-first.ts';

export interface SpreadInput {
  readonly room: SpreadRoom;
  /** Ids differ from each other. */
  readonly entries: readonly SpreadEntry[];
  /** Id of the entry that burns first; null: the worst one is looked for. */
  readonly first: string | null;
  /** Multiplies every radiated flux: 1 for events, 2 where a distance shall be on the safe side. */
  readonly fluxFactor: number;
  /** `dose`: flux over its critical value, summed up. `held`: the simple variant, a flux held for 30 s. */
  readonly ignition: 'dose' | 'held';
  /** Least growth of what flashover lights, kW/s²: ultra-fast in the convention used. */
  readonly flashoverGrowth_kW_s2: number;
}

export interface SpreadResult extends Omit<SpreadRun, 'points'> {
  /** Room curve `[s, kW]`, straight lines between; its area is the heat released within 0.1 %. */
  readonly curve: readonly (readonly [number, number])[];
  /** How the first entry was chosen; with `worst`, how many were tried of how many that can burn. */
  readonly chosen: { readonly by: 'given' } | { readonly by: 'worst'; readonly tried: number; readonly of: number };
}

const STEP_S = 1;

/** Thrown when the first entry that was asked for is not among the entries. */
export class UnknownFirstEntryError extends Error {
  override readonly name = 'UnknownFirstEntryError';
}

/**
 * Which entry ignites which, in what order and when, and the room's fire that comes of it.
 * @param options `step_s` other than 1 is for checking how far the step matters
 * @returns undefined when nothing in the room can burn
 * @throws UnknownFirstEntryError when `first` names no entry
 */
export function simulateSpread(
  input: SpreadInput,
  options: { readonly step_s?: number } = {},
): SpreadResult | undefined {
  const scene = new SpreadScene(input.entries, input.room);
  const rules = {
    fluxFactor: input.fluxFactor,
    ignition: input.ignition,
    flashoverGrowth_kW_s2: input.flashoverGrowth_kW_s2,
    step_s: options.step_s ?? STEP_S,
  };
  if (input.first === null) {
    const worst = worstFirst(scene, rules);
    return worst && resultOf(worst.run, { by: 'worst', tried: worst.tried, of: worst.of });
  }
  const first = scene.entries.findIndex(({ id }) => id === input.first);
  if (first < 0) throw new UnknownFirstEntryError(`There is no entry “${input.first}” to burn first.`);
  return scene.canBurn(first) ? resultOf(runSpread(scene, first, rules), { by: 'given' }) : undefined;
}

function resultOf({ points, ...run }: SpreadRun, chosen: SpreadResult['chosen']): SpreadResult {
  return { ...run, curve: thinCurve(points), chosen };
}
