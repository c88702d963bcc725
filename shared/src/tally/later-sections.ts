import { noteMissing, type TallyContext } from './tally-context.ts';

const LATER = [
  'response.sprinkler',
  'response.detector',
  'spread.events',
  'spread.gaps',
  'spread.curve',
  'air.oxygenLimitedHeat',
  'air.massForVisibility10m',
  'air.carbonMonoxide',
] as const;

/** Names the parts of the contract that this version of the engine does not compute. */
export function noteLaterSections(context: TallyContext): void {
  for (const path of LATER) noteMissing(context, path, 'engine', 'Not computed by this version.');
}
