import { figureName } from '@embertally/shared/tally/figure-name';

const SECTIONS: Readonly<Record<string, string>> = {
  load: 'Load',
  growth: 'Growth',
  room: 'Room',
  burnout: 'Burn-out',
  response: 'Response of sprinkler and detector',
  spread: 'What sets what alight',
  air: 'Smoke and air',
};

/** What a path that could not be computed is called; a path without a name of its own is called by its section. */
export function missingName(path: string): string {
  const name = figureName(path);
  if (name !== path) return name;
  const [section = ''] = path.split('.');
  return SECTIONS[section] ?? path;
}
