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
export function noteLaterSections(context: TallyContext, spread: boolean): void {
  const paths = LATER.filter((path) => spread || !path.startsWith('spread.'));
  for (const path of paths) noteMissing(context, path, 'engine', 'Not computed by this version.');
}
