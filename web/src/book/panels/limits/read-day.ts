const MONTHS = ['jan', 'feb', 'mar', 'apr', 'may', 'jun', 'jul', 'aug', 'sep', 'oct', 'nov', 'dec'];

/**
 * A day as a person writes it, as `2026-03-31`: year first with any separator, or day, month by name, year
 * ("31 March 2026").
 *
 * @returns null when it is no real day
 */
export function readDay(text: string): string | null {
  const trimmed = text.trim().toLowerCase();
  const numbers = /^(\d{4})[-./ ](\d{1,2})[-./ ](\d{1,2})$/.exec(trimmed);
  const words = /^(\d{1,2})\.? ([a-z]{3,9})\.? (\d{4})$/.exec(trimmed);
  const [year, month, day] = numbers
    ? [Number(numbers[1]), Number(numbers[2]), Number(numbers[3])]
    : words
      ? [Number(words[3]), MONTHS.indexOf((words[2] ?? '').slice(0, 3)) + 1, Number(words[1])]
      : [0, 0, 0];
  const date = new Date(Date.UTC(year, month - 1, day));
  if (year < 1800 || date.getUTCMonth() !== month - 1 || date.getUTCDate() !== day) return null;
  return date.toISOString().slice(0, 10);
}
