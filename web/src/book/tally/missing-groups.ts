import type { Missing } from '@embertally/shared/tally/room-tally';
import { figureName } from '@embertally/shared/tally/figure-name';

export interface MissingGroup {
  readonly why: string;
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

/** What could not be computed, gathered under the reason: the input that is wanting is named once, not per number. */
export function missingGroups(missing: readonly Missing[]): readonly MissingGroup[] {
  const groups = new Map<string, Set<string>>();
  for (const one of missing) {
    const names = groups.get(one.why);
    if (names === undefined) groups.set(one.why, new Set([nameOf(one)]));
    else names.add(nameOf(one));
  }
  return [...groups].map(([why, names]) => ({ why, names: [...names] }));
}
