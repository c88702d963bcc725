import type { Missing } from './room-tally.ts';

/** What every section of a tally shares: whether workings are wanted, and the list of what could not be computed. */
export interface TallyContext {
  readonly workings: boolean;
  readonly missing: Missing[];
}

/** Notes a path of the tally that is absent; its section is the path's first name. */
export function noteMissing(context: TallyContext, path: string, input: string, why: string): undefined {
  const section = path.split('.', 1)[0]!.replace(/\[.*$/, '');
  context.missing.push({ path, section, input, why });
}
