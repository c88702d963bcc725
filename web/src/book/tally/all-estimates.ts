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
  readonly key: (typeof SECTIONS)[number]['key'];
  readonly title: string;
  readonly estimates: readonly NamedEstimate[];
}

const SECTIONS = [
  { key: 'load', title: 'How much heat is kept' },
  { key: 'growth', title: 'How fast it could come out' },
  { key: 'response', title: 'When it would be noticed' },
  { key: 'room', title: 'What the room does' },
  { key: 'burnout', title: 'If everything burns out' },
  { key: 'spread', title: 'What sets what alight' },
  { key: 'air', title: 'Smoke and air' },
  { key: 'limits', title: 'Limits' },
] as const;

/** The pairs that are farthest from enough; the others are worked out in the same way. */
export const GAPS_WORKED_OUT = 10;

/** Paths of every number below a value, in the order the tally holds them. */
function pathsBelow(value: unknown, path: string, tally: RoomTally): readonly string[] {
  if (typeof value !== 'object' || value === null) return [];
  if (estimateAt(tally, path) !== null) return [path];
  return Object.entries(value).flatMap(([key, below]) => {
    // Points of curves are not numbers with a working of their own.
    if (key === 'curve' || (path === 'spread.gaps' && Number(key) >= GAPS_WORKED_OUT)) return [];
    return pathsBelow(below, `${path}.${key}`, tally);
  });
}

function rowName(tally: RoomTally, path: string): string | undefined {
  const [section, list, index] = path.split('.');
  if (section === 'limits') {
    const limit = tally.limits[Number(list)];
    return limit === undefined ? undefined : limitNames[limit.quantity as LimitQuantity];
  }
  if (section === 'spread') return spreadRowName(tally, list ?? '', Number(index));
  if (list === 'byMaterial') return tally.load.byMaterial[Number(index)]?.label;
  if (list === 'byEntry') return tally.load.byEntry[Number(index)]?.label;
  return undefined;
}

function spreadRowName(tally: RoomTally, list: string, index: number): string | undefined {
  const nameOf = (id: string) => tally.load.byEntry.find((row) => row.id === id)?.label ?? id;
  if (list === 'gaps') {
    const gap = tally.spread?.gaps?.[index];
    return gap === undefined ? undefined : `${nameOf(gap.from)} → ${nameOf(gap.to)}`;
  }
  const event = tally.spread?.events?.[index];
  return event === undefined ? undefined : event.id === null ? 'the air runs short' : nameOf(event.id);
}

/** Every number of a tally with its name, section by section; sections without numbers are left out. */
export function allEstimates(tally: RoomTally): readonly EstimateSection[] {
  return SECTIONS.flatMap(({ key, title }) => {
    const estimates = pathsBelow(tally[key], key, tally).flatMap((path) => {
      const estimate = estimateAt(tally, path);
      return estimate === null ? [] : [{ path, name: figureName(path, rowName(tally, path)), estimate }];
    });
    return estimates.length === 0 ? [] : [{ key, title, estimates }];
  });
}
