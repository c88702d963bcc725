import type { HistoryEvent } from '@embertally/shared/contracts/history';
import { limitQuantitySchema } from '@embertally/shared/contracts/limits';
import { formatQuantity } from '@embertally/shared/units/format-quantity';
import type { UnitSystem } from '@embertally/shared/units/unit-system';
import { LIMIT_QUANTITIES } from '../../lib/limit-words.ts';

type Event = Pick<HistoryEvent, 'action' | 'by' | 'facts' | 'object'>;

export interface HistoryReader {
  readonly units: UnitSystem;
  /** The name of a member of the site; undefined for one who has no role there any more. */
  readonly memberName: (memberId: string) => string | undefined;
}

function text(event: Event, name: string): string {
  const value = event.facts[name];
  return value === undefined || value === null ? '' : String(value);
}

function quoted(event: Event, name: string): string {
  const value = text(event, name);
  return value === '' ? '' : ` “${value}”`;
}

function limit(event: Event, bound: 'bound' | 'before', reader: HistoryReader): string {
  const quantity = limitQuantitySchema.safeParse(event.facts.quantity);
  const value = event.facts[bound];
  if (!quantity.success || typeof value !== 'number') return 'a room';
  const words = LIMIT_QUANTITIES[quantity.data];
  const shown = formatQuantity(value, words.unit, reader.units);
  return `${words.label.toLowerCase()}, ${shown.text} ${shown.unit}`;
}

function member(event: Event, reader: HistoryReader): string {
  return reader.memberName(event.object.id) ?? 'somebody who has no role here now';
}

const DID: Readonly<Record<string, (event: Event, reader: HistoryReader) => string>> = {
  'site.made': (event) => `made the site${quoted(event, 'name')}`,
  'site.edited': () => 'changed the site’s name, address or time zone',
  'site-role.given': (event, reader) => `gave ${member(event, reader)} the role ${text(event, 'role')}`,
  'site-role.taken': (event, reader) => `took the role ${text(event, 'role')} from ${member(event, reader)}`,
  'building.made': (event) => `made the building${quoted(event, 'name')}`,
  'building.renamed': (event) => `renamed a building to${quoted(event, 'name')}`,
  'limit.set': (event, reader) => `set a limit on ${limit(event, 'bound', reader)}`,
  'limit.edited': (event, reader) => `changed a limit to ${limit(event, 'bound', reader)}`,
  'limit.taken-away': (event, reader) => `took a limit away: ${limit(event, 'bound', reader)}`,
  'export.asked-for': () => 'asked for a report',
  'export.stopped': () => 'stopped a report',
  'access.refused': (event) => `was refused: ${text(event, 'wanted').replaceAll(/[.-]/g, ' ')}`,
};

/** One event of a site's history as a sentence: who did what. An action without words yet is named as it stands. */
export function historySentence(event: Event, reader: HistoryReader): string {
  const who = event.by?.name ?? 'The system';
  const did = DID[event.action];
  return did === undefined ? `${who}: ${event.action.replaceAll(/[.-]/g, ' ')}` : `${who} ${did(event, reader)}`;
}
