import type { Estimate } from '@embertally/shared/methods/estimate';
import type { RoomTally } from '@embertally/shared/tally/room-tally';

export interface PlacedEstimate {
  /** As `load.perFloor`. */
  readonly path: string;
  readonly estimate: Estimate;
}

const SECTIONS = ['load', 'growth', 'response', 'room', 'burnout', 'spread', 'air'] as const;
/** Shown as tables of their own: one row per entry or material instead of one working each. */
const IN_TABLES: readonly string[] = ['load.byEntry', 'load.byMaterial'];

/** Every number of a tally with its path, section by section in the order a tally is read. */
export function tallyEstimates(tally: RoomTally): PlacedEstimate[] {
  return SECTIONS.flatMap((section) => [...within(tally[section], section)]);
}

function* within(value: unknown, path: string): Generator<PlacedEstimate> {
  if (typeof value !== 'object' || value === null || IN_TABLES.includes(path)) return;
  if (isEstimate(value)) {
    yield { path, estimate: value };
    return;
  }
  if (Array.isArray(value)) return;
  for (const [key, inner] of Object.entries(value)) yield* within(inner, `${path}.${key}`);
}

function isEstimate(value: object): value is Estimate {
  return 'method' in value && 'unit' in value && 'warnings' in value;
}
