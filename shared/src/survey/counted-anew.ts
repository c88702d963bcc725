import type { Entry } from './survey-document.ts';

type Counted = Pick<Entry, 'count' | 'peak_kW' | 'curve'>;

/**
 * An entry in another count. Its peak and measured curve are those of all pieces together, so they go with the count: all
 * pieces burning at once, which is the safe side. From or to a count of 0 they stay, because nothing can be told from it.
 */
export function countedAnew(entry: Counted, count: number): Counted {
  const times = count / entry.count;
  if (!(times > 0) || !Number.isFinite(times) || times === 1) {
    return { count, peak_kW: entry.peak_kW, curve: entry.curve };
  }
  return {
    count,
    peak_kW: entry.peak_kW === null ? null : entry.peak_kW * times,
    curve: entry.curve?.map(([t, kW]) => [t, kW * times] as [number, number]) ?? null,
  };
}
