import { lazy, Suspense, useId, useRef, useState } from 'react';
import { Button } from '../button.tsx';
import type { CurveChart } from './curve-chart.ts';
import { curveCsv } from './curve-csv.ts';
import { CurveTable } from './curve-table.tsx';
import { readCurve } from './read-curve.ts';
import { saveFile } from './save-file.ts';
import './chart.css';

const CurveCanvas = lazy(() => import('./curve-canvas.tsx').then((module) => ({ default: module.CurveCanvas })));

const STEPS = 200;
const figure = (value: number): string => value.toLocaleString('en-GB', { maximumSignificantDigits: 3 });

/** Whether this browser can paint at all; where it cannot, the table stands in the picture's place. */
const canPaint = (): boolean => typeof Path2D !== 'undefined';

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

  const savePicture = (): void => {
    const address = picture.current();
    if (address === null) return;
    const bytes = Uint8Array.from(atob(address.slice(address.indexOf(',') + 1)), (char) => char.charCodeAt(0));
    saveFile(`${chart.fileName}.png`, new Blob([bytes], { type: 'image/png' }));
  };
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
      <div className="flex flex-wrap gap-x-4 text-small print:hidden">
        <Button
          look="quiet"
          className="text-small"
          aria-pressed={asTable}
          onClick={() => {
            setAsTable(!asTable);
          }}
        >
          {asTable ? 'Show as chart' : 'Show as table'}
        </Button>
        {!asTable && (
          <Button look="quiet" className="text-small" onClick={savePicture}>
            Save picture
          </Button>
        )}
        <Button look="quiet" className="text-small" onClick={saveNumbers}>
          Save numbers (CSV)
        </Button>
      </div>
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
