import type { TablePart } from '../panels/tables-context.ts';
import type { Missing } from '@embertally/shared/tally/room-tally';
import { figureName } from '@embertally/shared/tally/figure-name';

export interface MissingGroup {
  readonly why: string;
  /** The table in which the input that is wanting can be given; null when no input would help. */
  readonly part: TablePart | null;
  /** Names of the numbers that are not there for this reason. */
  readonly names: readonly string[];
}

const SECTIONS: Readonly<Record<string, string>> = {
  response: 'Answer of sprinkler and detector',
  spread: 'What sets what alight',
  air: 'Smoke and air',
  growth: 'The heat release curve',
  burnout: 'The burn-out',
  room: 'What the room does',
  load: 'The fire load',
  limits: 'A limit',
};

const nameOf = (missing: Missing): string => {
  const name = figureName(missing.path);
  return name === missing.path ? (SECTIONS[missing.section] ?? missing.section) : name;
};

const partOf = (input: string): TablePart | null => {
  if (input.startsWith('room.openings')) return 'openings';
  if (input.startsWith('contents')) return 'contents';
  return input.startsWith('room.') && input !== 'room.ring_m' ? 'room' : null;
};

/** What could not be computed, gathered under the reason: the input that is wanting is named once, not per number. */
export function missingGroups(missing: readonly Missing[]): readonly MissingGroup[] {
  const groups = new Map<string, { part: TablePart | null; names: Set<string> }>();
  for (const one of missing) {
    const group = groups.get(one.why);
    if (group === undefined) groups.set(one.why, { part: partOf(one.input), names: new Set([nameOf(one)]) });
    else group.names.add(nameOf(one));
  }
  return [...groups].map(([why, { part, names }]) => ({ why, part, names: [...names] }));
}
