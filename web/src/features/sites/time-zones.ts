import type { SelectOption } from '../../components/select-field.tsx';

/** Every time zone the browser knows, by name; the device's own is where a new site starts. */
export function timeZoneOptions(current: string): readonly SelectOption<string>[] {
  const zones = new Set([...Intl.supportedValuesOf('timeZone'), 'UTC', current]);
  return [...zones].sort().map((zone) => ({ value: zone, label: zone.replaceAll('_', ' ') }));
}

export function deviceTimeZone(): string {
  return Intl.DateTimeFormat().resolvedOptions().timeZone;
}
