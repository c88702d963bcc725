import {
  Chart,
  type ChartData,
  type ChartOptions,
  Filler,
  LinearScale,
  LineController,
  LineElement,
  PointElement,
  type Scale,
  type Tick,
  Ticks,
} from 'chart.js';
import { useEffect, useLayoutEffect, useMemo, useRef } from 'react';
import { Line } from 'react-chartjs-2';
import { useThemeRevision } from '../../lib/theme-tokens.ts';
import { type ChartColours, chartColours } from './chart-colours.ts';
import type { CurveChart } from './curve-chart.ts';
import { labelPlugin } from './label-plugin.ts';

Chart.register(LineController, LineElement, PointElement, LinearScale, Filler);

const FONT = '"Atkinson Hyperlegible", sans-serif';

interface CurveCanvasProps {
  readonly chart: CurveChart;
  /** Where the reading line stands, in the unit of the x axis. */
  readonly readAt: number | null;
  /** Receives the function that gives the picture as a PNG data URL. */
  readonly onReady: (picture: () => string | null) => void;
}

function dataOf(chart: CurveChart, colours: ChartColours): ChartData<'line', { x: number; y: number }[]> {
  return {
    datasets: chart.series.map((series) => ({
      label: series.label,
      data: series.points.map(([x, y]) => ({ x, y })),
      borderColor: colours.tones[series.tone],
      backgroundColor: colours.fill,
      borderWidth: 1.75,
      // Without any dash the library draws dense lines column by column, which shows as steps.
      borderDash: series.dash.length === 0 ? [1, 0] : [...series.dash],
      pointRadius: 0,
      pointHitRadius: 0,
      fill: series.filled === true ? 'origin' : false,
    })),
  };
}

function optionsOf(chart: CurveChart, colours: ChartColours): ChartOptions<'line'> {
  const top = Math.max(...chart.thresholds.map((threshold) => threshold.y), 0);
  const axis = (title: string) => ({
    type: 'linear' as const,
    min: 0,
    title: { display: true, text: title, color: colours.tones.soft, font: { family: FONT, size: 13 }, padding: 2 },
    grid: { display: false },
    border: { color: colours.tones.soft },
    ticks: {
      color: colours.tones.soft,
      font: { family: FONT, size: 12 },
      maxTicksLimit: 6,
      maxRotation: 0,
      // Thousands stand apart as in the tables.
      callback(this: Scale, value: string | number, index: number, ticks: Tick[]) {
        return Ticks.formatters.numeric.call(this, Number(value), index, ticks).replaceAll(',', '\u202f');
      },
    },
  });
  return {
    animation: false,
    responsive: true,
    maintainAspectRatio: false,
    parsing: false,
    events: [],
    font: { family: FONT },
    layout: { padding: { top: 6, right: 4 } },
    scales: {
      x: { ...axis(`${chart.x.label}, ${chart.x.unit}`), suggestedMax: chart.series[0]?.points.at(-1)?.[0] ?? 1 },
      y: { ...axis(`${chart.y.label}, ${chart.y.unit}`), suggestedMax: top * 1.12 },
    },
  };
}

/** The lines themselves, on a canvas; everything they say stands beside them in words and in a table. */
export function CurveCanvas({ chart, readAt, onReady }: CurveCanvasProps) {
  const instance = useRef<Chart<'line', { x: number; y: number }[]> | null>(null);
  const theme = useThemeRevision();
  const colours = useMemo(() => chartColours(theme), [theme]);
  // The plugin is made once per chart and reads what is current, so that a moving tally never rebuilds the canvas.
  const current = useRef({ chart, colours, readAt });
  const plugins = useMemo(() => [labelPlugin(() => current.current)], []);
  const data = useMemo(() => dataOf(chart, colours), [chart, colours]);
  const options = useMemo(() => optionsOf(chart, colours), [chart, colours]);

  useLayoutEffect(() => {
    current.current = { chart, colours, readAt };
  }, [chart, colours, readAt]);
  useEffect(() => {
    instance.current?.draw();
  }, [readAt]);
  useEffect(() => {
    onReady(() => instance.current?.toBase64Image('image/png', 1) ?? null);
  }, [onReady]);

  return (
    <div className="relative h-64 w-full print:h-56">
      <Line
        ref={(made) => {
          instance.current = made ?? null;
        }}
        data={data}
        options={options}
        plugins={plugins}
        role="img"
        aria-label={chart.summary}
      />
    </div>
  );
}
