import type { CalorimeterPreview } from '@embertally/shared/calorimeter/calorimeter-reading';
import { useMemo } from 'react';
import { ChartFigure } from '../../../components/chart/chart-figure.tsx';
import { Notice } from '../../../components/notice.tsx';
import { useQuantity } from '../../../lib/use-quantity.ts';
import { useUnits } from '../../../lib/units-context.ts';
import { curveChartOf } from '../curve-chart-of.ts';

interface CurvePreviewProps {
  readonly name: string;
  readonly preview: CalorimeterPreview;
}

/** What a file gives: the curve, its totals, and what was noticed on the way. */
export function CurvePreview({ name, preview }: CurvePreviewProps) {
  const units = useUnits();
  const show = useQuantity();
  const chart = useMemo(() => curveChartOf(preview, name.replace(/\.[^.]+$/, ''), units), [preview, name, units]);
  const say = (value: number, unit: string): string => {
    const { text, unit: symbol } = show(value, unit);
    return `${text} ${symbol}`;
  };
  const area = preview.per === 'm2';
  const facts: readonly (readonly [string, string | null])[] = [
    ['Readings', String(preview.readings)],
    ['Heat', say(preview.heat_MJ, area ? 'MJ/m2' : 'MJ')],
    ['Heat of the test piece', area && preview.piece_heat_MJ !== null ? say(preview.piece_heat_MJ, 'MJ') : null],
    ['Peak', `${say(preview.peak, area ? 'kW/m2' : 'kW')} after ${say(preview.peak_s, 's')}`],
    ['Lasts', say(preview.duration_s, 's')],
    ['Mass that burnt', preview.burnt_kg === null ? null : say(preview.burnt_kg, 'kg')],
    ['Effective heat', preview.effective_MJ_kg === null ? null : say(preview.effective_MJ_kg, 'MJ/kg')],
  ];
  return (
    <div className="grid grid-cols-[minmax(0,1fr)] gap-3">
      <ChartFigure chart={chart} />
      <dl className="text-small">
        {facts.map(([title, text]) =>
          text === null ? null : (
            <div key={title} className="flex items-baseline justify-between gap-4 border-b border-rule py-1">
              <dt className="text-soft">{title}</dt>
              <dd>{text}</dd>
            </div>
          ),
        )}
      </dl>
      {preview.undecided.length === 0 ? null : (
        <Notice tone="caution" title="One thing is to be decided first">
          Some readings lie below 0. Tick “Readings below 0 are set to 0” above if they are noise; otherwise the column
          or the baseline is wrong.
        </Notice>
      )}
      {preview.notes.length === 0 ? null : (
        <ul className="grid max-w-[72ch] list-disc gap-1 pl-5 text-small text-soft">
          {preview.notes.map(({ code, text }) => (
            <li key={`${code} ${text}`}>{text}</li>
          ))}
        </ul>
      )}
    </div>
  );
}
