import type { HistoryEvent } from '@embertally/shared/contracts/history';

type Facts = HistoryEvent['facts'];

function fact(facts: Facts, name: string): string {
  const value = facts[name];
  return value === undefined || value === null ? '' : String(value);
}

function named(facts: Facts, name = 'name'): string {
  const value = fact(facts, name);
  return value === '' ? '' : ` “${value}”`;
}

const DID: Readonly<Record<string, (facts: Facts) => string>> = {
  'site.created': (facts) => `made the site${named(facts)}`,
  'site.edited': () => 'changed the site’s name, address or time zone',
  'site-role.given': (facts) => `gave the role ${fact(facts, 'role')}${to(facts)}`,
  'site-role.taken': (facts) => `took the role ${fact(facts, 'role')} away${from(facts)}`,
  'building.created': (facts) => `made the building${named(facts)}`,
  'building.edited': (facts) => `renamed a building to${named(facts)}`,
  'limit.set': (facts) => `set a limit${named(facts, 'set_by')}`,
  'limit.created': (facts) => `set a limit${named(facts, 'set_by')}`,
  'limit.edited': () => 'changed a limit',
  'limit.deleted': () => 'took a limit away',
  'change-set.applied': (facts) => `changed the survey${named(facts, 'label')}`,
  'export.created': () => 'asked for a report',
};

function to(facts: Facts): string {
  const who = fact(facts, 'to') || fact(facts, 'person') || fact(facts, 'name');
  return who === '' ? '' : ` to ${who}`;
}

function from(facts: Facts): string {
  const who = fact(facts, 'from') || fact(facts, 'person') || fact(facts, 'name');
  return who === '' ? '' : ` from ${who}`;
}

/** One event of a history as a sentence: who did what. An action nobody has put into words yet is named as it stands. */
export function historySentence(event: Pick<HistoryEvent, 'action' | 'by' | 'facts'>): string {
  const who = event.by?.name ?? 'The system';
  const did = DID[event.action];
  if (did !== undefined) return `${who} ${did(event.facts)}`.trim();
  return `${who}: ${event.action.replaceAll(/[.-]/g, ' ')}`;
}
