import { estimateOutputs, type Estimate } from '../methods/estimate.ts';
import { localPeak } from '../methods/load/local-peak.ts';
import type { EntryHeat } from './entry-heats.ts';
import { noteMissing, type TallyContext } from './tally-context.ts';

/** The plan's own grid: thinner footprints are drawn this thin. */
const THINNEST_M = 0.001;

/** The highest load over any 2 × 2 m window; missing while an entry that counts has no place or no footprint. */
export function localPeakOf(heats: readonly EntryHeat[], context: TallyContext): Estimate | undefined {
  const counted = heats.filter((heat) => heat.counted > 0);
  const placed = counted.map(({ entry, counted: heat }) => ({
    heat,
    x: entry.x_m ?? null,
    y: entry.y_m ?? null,
    w: entry.width_m ?? null,
    d: entry.depth_m ?? null,
    rotation: entry.rotation_deg ?? 0,
  }));
  const unplaced = placed.filter(({ x, y, w, d }) => x === null || y === null || w === null || d === null).length;
  if (unplaced > 0 || placed.length === 0) {
    const why =
      placed.length === 0
        ? 'Nothing that counts is recorded in the room.'
        : `${unplaced} of ${placed.length} entries have no place or no footprint.`;
    return noteMissing(context, 'load.localPeak', placed.length === 0 ? 'contents' : 'contents[].x_m', why);
  }
  return estimateOutputs(
    localPeak,
    {
      Q: placed.map(({ heat }) => heat),
      x: placed.map(({ x }) => x ?? 0),
      y: placed.map(({ y }) => y ?? 0),
      w: placed.map(({ w }) => Math.max(THINNEST_M, w ?? 0)),
      d: placed.map(({ d }) => Math.max(THINNEST_M, d ?? 0)),
      rotation: placed.map(({ rotation }) => rotation),
    },
    { workings: context.workings, origins: { x: 'given', y: 'given', w: 'given', d: 'given', rotation: 'given' } },
  ).of('density');
}
