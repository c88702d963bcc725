const WHEN = {
  /** "1 Dec 2026" */
  day: { day: 'numeric', month: 'short', year: 'numeric' },
  /** "Tuesday 1 December 2026" */
  weekday: { weekday: 'long', day: 'numeric', month: 'long', year: 'numeric' },
  /** "1 Dec 2026, 13:36" */
  moment: { day: 'numeric', month: 'short', year: 'numeric', hour: '2-digit', minute: '2-digit' },
} as const satisfies Record<string, Intl.DateTimeFormatOptions>;

/**
 * A date as it is read on every screen, day first and on a clock of 24 hours, whatever the browser is set to: the same
 * day must not read 3 December for one person and 12 March for another.
 *
 * @param date An instant (`2026-12-01T13:36:00Z`), or a day without a time (`2026-03-12`), which is the same everywhere
 * @param as How much of it is said
 * @param timeZone The zone whose days and hours are meant; the device's when it is left out. A day has none.
 */
export function dateWords(date: string, as: keyof typeof WHEN, timeZone?: string): string {
  const zone = date.includes('T') ? timeZone : 'UTC';
  return new Intl.DateTimeFormat('en-GB', { ...WHEN[as], ...(zone === undefined ? {} : { timeZone: zone }) })
    .format(new Date(date))
    .replace(/^(\w+day),/, '$1');
}
