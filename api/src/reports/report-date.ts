/** A moment as a person reads it in a time zone: "1 December 2026, 14:32 Europe/London". */
export function reportDate(iso: string, timeZone: string): string {
  const moment = new Intl.DateTimeFormat('en-GB', {
    day: 'numeric',
    month: 'long',
    year: 'numeric',
    hour: '2-digit',
    minute: '2-digit',
    hourCycle: 'h23',
    timeZone,
  }).formatToParts(new Date(iso));
  const part = (type: Intl.DateTimeFormatPartTypes) => moment.find((one) => one.type === type)?.value ?? '';
  return `${part('day')} ${part('month')} ${part('year')}, ${part('hour')}:${part('minute')} (${timeZone})`;
}
