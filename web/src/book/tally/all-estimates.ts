import { limitNames } from '@embertally/shared/limits/limit-names';
import type { LimitQuantity } from '@embertally/shared/contracts/limits';
import type { Estimate } from '@embertally/shared/methods/estimate';
import { figureName } from '@embertally/shared/tally/figure-name';
import type { RoomTally } from '@embertally/shared/tally/room-tally';
import { estimateAt } from './estimate-at.ts';

export interface NamedEstimate {
  readonly path: string;
  readonly name: string;
  readonly estimate: Estimate;
}

export interface EstimateSection {
  readonly title: string;
  readonly estimates: readonly NamedEstimate[];
}

const SECTIONS = [
  { key: 'load', title: 'How much heat is kept' },
  { key: 'growth', title: 'How fast it could come out' },
  { key: 'room', title: 'What the room does' },
  { key: 'burnout', title: 'If everything burns out' },
  { key: 'limits', title: 'Limits' },
] as const;

/** Paths of every number below a value, in the order the tally holds them. */
function pathsBelow(value: unknown, path: string, tally: RoomTally): readonly string[] {
  if (typeof value !== 'object' || value === null) return [];
  if (estimateAt(tally, path) !== null) return [path];
  return Object.entries(value).flatMap(([key, below]) =>
    // Points of curves are not numbers with a working of their own.
    key === 'curve' ? [] : pathsBelow(below, `${path}.${key}`, tally),
  );
}

function rowName(tally: RoomTally, path: string): string | undefined {
  const [section, list, index] = path.split('.');
  if (section === 'limits') {
    const limit = tally.limits[Number(list)];
    return limit === undefined ? undefined : limitNames[limit.quantity as LimitQuantity];
  }
  if (list === 'byMaterial') return tally.load.byMaterial[Number(index)]?.label;
  if (list === 'byEntry') return tally.load.byEntry[Number(index)]?.label;
  return undefined;
}

/** Every number of a tally with its name, section by section; sections without numbers are left out. */
export function allEstimates(tally: RoomTally): readonly EstimateSection[] {
  return SECTIONS.flatMap(({ key, title }) => {
    const estimates = pathsBelow(tally[key], key, tally).flatMap((path) => {
      const estimate = estimateAt(tally, path);
      return estimate === null ? [] : [{ path, name: figureName(path, rowName(tally, path)), estimate }];
    });
    return estimates.length === 0 ? [] : [{ title, estimates }];
  });
}
