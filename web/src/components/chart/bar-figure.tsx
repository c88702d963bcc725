import { lazy, type ReactNode, Suspense, useRef, useState } from 'react';
import type { BarChart } from './bar-chart.ts';
import { barCsv } from './bar-csv.ts';
import { canPaint } from './can-paint.ts';
import { ChartKeys } from './chart-keys.tsx';
import { saveFile } from './save-file.ts';
import { savePicture } from './save-picture.ts';

const BarCanvas = lazy(async () => ({ default: (await import('./bar-canvas.tsx')).BarCanvas }));

interface BarFigureProps {
  readonly chart: BarChart;
  /** The same numbers as a table. */
  readonly table: ReactNode;
}

/** A bar chart with what it owes its reader: the takeaway in words, the numbers as a table, picture and numbers as files. */
export function BarFigure({ chart, table }: BarFigureProps) {
  const [asTable, setAsTable] = useState(() => !canPaint());
  const picture = useRef<() => string | null>(() => null);
  return (
    <figure className="m-0">
      <figcaption className="mb-1 max-w-[72ch] text-small">{chart.title}</figcaption>
      {asTable ? (
        table
      ) : (
        <Suspense fallback={<p className="text-small text-soft">Drawing the bars…</p>}>
          <BarCanvas
            chart={chart}
            onReady={(read) => {
              picture.current = read;
            }}
          />
        </Suspense>
      )}
      <ChartKeys
        asTable={asTable}
        onTable={setAsTable}
        onPicture={() => {
          savePicture(chart.fileName, picture.current());
        }}
        onNumbers={() => {
          saveFile(`${chart.fileName}.csv`, new Blob([barCsv(chart)], { type: 'text/csv;charset=utf-8' }));
        }}
      />
    </figure>
  );
}
