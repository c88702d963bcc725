import { estimate, type Estimate } from '../methods/estimate.ts';
import { figure } from '../methods/figure.ts';
import { varianceShare } from '../methods/uncertainty/variance-share.ts';
import type { LoadModel } from '../uncertainty/load-model.ts';
import type { UncertaintyShare } from '../uncertainty/room-uncertainty.ts';
import { ROOM_INPUTS } from '../uncertainty/sample-room.ts';
import { varianceShares, type VariancePart } from '../uncertainty/variance-shares.ts';

/** Percent; what is below stands together in one row. */
const LEAST_SHARE = 0.1;

/** Which input the variance of the density comes from, the largest first. */
export function varianceShareRows(model: LoadModel, workings: boolean): UncertaintyShare[] {
  const { variance, mean, parts } = varianceShares(model, ROOM_INPUTS);
  if (!(variance > 0)) return [];
  const shareOf = (own: number): Estimate =>
    estimate(
      varianceShare,
      { V_j: own, V: variance },
      {
        workings,
        steps: workings
          ? [
              { text: 'Standard deviation from this input alone, of the mean', value: 100 * Math.sqrt(own), unit: '%' },
              { text: 'Standard deviation from all of them', value: 100 * Math.sqrt(variance), unit: '%' },
              { text: `Mean of the load with what is overlooked: ${figure(mean)} MJ` },
            ]
          : [],
      },
    );
  const told = parts.filter((part) => part.variance >= (LEAST_SHARE / 100) * variance);
  const rows = told
    .sort((a, b) => b.variance - a.variance)
    .map((part) => ({ ...describePart(model, part), share: shareOf(part.variance) }));
  const rest = variance - told.reduce((sum, part) => sum + part.variance, 0);
  if (rest < 1e-9 * variance) return rows;
  const label = 'Everything else, and several together';
  return [...rows, { key: 'rest', label, kind: 'room', entryIds: [], share: shareOf(rest) }];
}

function describePart(model: LoadModel, { of, index }: VariancePart): Omit<UncertaintyShare, 'share'> {
  switch (of) {
    case 'mass': {
      const { id, label } = model.entries[index]!;
      return { key: `mass:${id}`, label: `Mass of ${label}`, kind: 'mass', entryIds: [id] };
    }
    case 'enclosure': {
      const { id, label } = model.entries[index]!;
      return { key: `enclosure:${id}`, label: `Cabinet of ${label}`, kind: 'enclosure', entryIds: [id] };
    }
    case 'heat': {
      const { key, label } = model.materials[index]!;
      const within = model.entries.filter(({ terms }) =>
        terms.some(({ heat }) => model.heats[heat]!.material === index),
      );
      return { key: `heat:${key}`, label: `Heat of ${label}`, kind: 'heat', entryIds: within.map(({ id }) => id) };
    }
    case 'overlooked':
      return { key: 'overlooked', label: 'Things overlooked', kind: 'room', entryIds: [] };
    case 'floor':
      return { key: 'floor', label: 'Floor area', kind: 'room', entryIds: [] };
  }
}
