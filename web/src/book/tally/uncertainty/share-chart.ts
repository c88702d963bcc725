import type { RoomUncertainty } from '@embertally/shared/uncertainty/room-uncertainty';
import type { BarChart } from '../../../components/chart/bar-chart.ts';

const SHOWN = 8;

/** What matters most as bars: the largest shares, and one bar for all others. Null where nothing is uncertain. */
export function shareChart(shares: RoomUncertainty['shares'], fileName: string): BarChart | null {
  const [most] = shares;
  if (most === undefined) return null;
  const listed = shares.length > SHOWN + 1 ? shares.slice(0, SHOWN) : shares;
  const rest = shares.slice(listed.length).reduce((sum, { share }) => sum + (share.value ?? 0), 0);
  const bars = listed.map(({ key, label, kind, share }) => ({
    id: key,
    label,
    value: share.value ?? 0,
    tone: kind === 'room' ? ('soft' as const) : ('ink' as const),
  }));
  if (rest > 0) {
    bars.push({ id: 'others', label: `${shares.length - listed.length} others`, value: rest, tone: 'soft' });
  }
  const percent = Math.round(most.share.value ?? 0);
  return {
    title: `What matters most: ${most.label}, ${percent} % of the variance.`,
    summary: `Share of the variance of the density by input. ${bars
      .map(({ label, value }) => `${label} ${value < 1 ? 'under 1' : Math.round(value)} %`)
      .join(', ')}.`,
    label: 'Share of the variance',
    unit: '%',
    column: 'share_percent',
    bars,
    fileName,
  };
}
