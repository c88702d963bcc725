import type { CalorimeterChoices } from './calorimeter-choices.ts';
import type { CalorimeterNote } from './calorimeter-reading.ts';
import type { RawCurve } from './clean-times.ts';
import type { FaultList } from './fault-list.ts';

/**
 * Readings that have both time and rate. Blanks before the first and after the last are left off and counted in a note; a
 * blank in between is a fault, or passed over where the person said so.
 */
export function withoutBlanks(
  raw: RawCurve,
  { blanks }: CalorimeterChoices,
  notes: CalorimeterNote[],
  faults: FaultList,
): RawCurve {
  const { time_s, rate, lines } = raw;
  const full = (i: number) => !Number.isNaN(time_s[i]) && !Number.isNaN(rate[i]);
  const first = Math.max(
    0,
    time_s.findIndex((_, i) => full(i)),
  );
  const last = time_s.findLastIndex((_, i) => full(i));
  const take = (values: Float64Array) => values.filter((_, i) => full(i));
  const whole = first === 0 && last === time_s.length - 1 && time_s.every((_, i) => full(i));
  if (whole) return raw;
  const kept = take(time_s).length;
  const inside = last < 0 ? 0 : last - first + 1 - kept;
  if (inside > 0 && blanks !== 'bridge')
    for (let i = first; i <= last; i += 1)
      if (!full(i))
        faults.add(lines[i]!, 'blank', () =>
          Number.isNaN(time_s[i])
            ? 'The time is blank or cannot be read. Fill it in, or have blank readings passed over.'
            : 'The reading is blank. Fill it in, or have blank readings passed over.',
        );
  const before = first;
  const after = time_s.length - 1 - last;
  if (before > 0) notes.push({ code: 'BLANK_START', text: `The first ${count(before)} blank and left off.` });
  if (after > 0 && last >= 0) notes.push({ code: 'BLANK_END', text: `The last ${count(after)} blank and left off.` });
  if (inside > 0 && blanks === 'bridge')
    notes.push({ code: 'BLANK_INSIDE', text: `${inside} blank readings in between are passed over, straight across.` });
  return { time_s: take(time_s), rate: take(rate), lines: take(lines) };
}

const count = (readings: number): string => (readings === 1 ? 'reading is' : `${readings} readings are`);
