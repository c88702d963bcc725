import { lazy, Suspense, useId, useRef, useState } from 'react';
import { canPaint } from './can-paint.ts';
import { ChartKeys } from './chart-keys.tsx';
import type { CurveChart } from './curve-chart.ts';
import { curveCsv } from './curve-csv.ts';
import { CurveTable } from './curve-table.tsx';
import { readCurve } from './read-curve.ts';
import { saveFile } from './save-file.ts';
import { savePicture } from './save-picture.ts';
import './chart.css';

const CurveCanvas = lazy(() => import('./curve-canvas.tsx').then((module) => ({ default: module.CurveCanvas })));

const STEPS = 200;
const figure = (value: number): string =>
  value.toLocaleString('en-GB', { maximumSignificantDigits: 3 }).replaceAll(',', '\u202f');

interface ChartFigureProps {
  readonly chart: CurveChart;
  /** Where the reading line stands while something is played beside the chart, in the unit of the x axis. */
  readonly playedAt?: number | null;
}

/**
 * A chart with everything it owes its reader: the takeaway in words, a line to read values along by key or finger, the
 * same numbers as a table, the picture and the numbers as files.
 */
export function ChartFigure({ chart, playedAt = null }: ChartFigureProps) {
  const [asTable, setAsTable] = useState(() => !canPaint());
  const [step, setStep] = useState<number | null>(null);
  const picture = useRef<() => string | null>(() => null);
  const slider = useId();
  const last = Math.max(0, ...chart.series.map((series) => series.points.at(-1)?.[0] ?? 0));
  const readAt = playedAt ?? (step === null ? null : (step / STEPS) * last);

  const saveNumbers = (): void => {
    saveFile(`${chart.fileName}.csv`, new Blob([curveCsv(chart)], { type: 'text/csv;charset=utf-8' }));
  };

  return (
    <figure className="m-0">
      <figcaption className="mb-1 max-w-[72ch] text-small">
        {chart.title}
        <span className="unseen"> {chart.summary}</span>
      </figcaption>
      {asTable ? (
        <CurveTable chart={chart} />
      ) : (
        <Suspense fallback={<div className="h-64 text-small text-soft">Drawing the curve…</div>}>
          <CurveCanvas
            chart={chart}
            readAt={readAt}
            onReady={(read) => {
              picture.current = read;
            }}
          />
        </Suspense>
      )}
      <div className="mt-1 flex flex-wrap items-center gap-x-4 gap-y-1 text-small print:hidden">
        {!asTable && (
          <>
            <label htmlFor={slider} className="text-soft">
              Read the curve at
            </label>
            <input
              id={slider}
              type="range"
              className="curve-slider min-w-24 flex-1"
              min={0}
              max={STEPS}
              value={readAt === null || last === 0 ? 0 : Math.round((readAt / last) * STEPS)}
              aria-valuetext={readingText(chart, readAt ?? 0)}
              onChange={(event) => {
                setStep(Number(event.currentTarget.value));
              }}
            />
          </>
        )}
        <output htmlFor={slider} className="figure min-w-full text-soft">
          {readAt === null || asTable ? '' : readingText(chart, readAt)}
        </output>
      </div>
      <ChartKeys
        asTable={asTable}
        onTable={setAsTable}
        onPicture={() => {
          savePicture(chart.fileName, picture.current());
        }}
        onNumbers={saveNumbers}
      />
    </figure>
  );
}

/** "12.0 min: as kept 640 °C, design 512 °C" */
function readingText(chart: CurveChart, at: number): string {
  const values = chart.series.flatMap((series) => {
    const value = readCurve(series.points, at);
    if (value === null) return [];
    const name = chart.series.length > 1 ? `${series.label} ` : '';
    return [`${name}${figure(value)} ${chart.y.unit}`];
  });
  return `${figure(at)} ${chart.x.unit}: ${values.join(', ')}`;
}
