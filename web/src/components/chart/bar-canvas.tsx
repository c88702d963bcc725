import { BarController, BarElement, CategoryScale, Chart, type ChartOptions, LinearScale, type Plugin } from 'chart.js';
import { useEffect, useLayoutEffect, useMemo, useRef } from 'react';
import { Bar as BarPicture } from 'react-chartjs-2';
import { useThemeRevision } from '../../lib/theme-tokens.ts';
import type { BarChart } from './bar-chart.ts';
import { type ChartColours, chartColours } from './chart-colours.ts';

Chart.register(BarController, BarElement, CategoryScale, LinearScale);

const FONT = '"Atkinson Hyperlegible", sans-serif';
const ROW_PX = 26;
/** Where a label needs two lines. */
const TALL_ROW_PX = 36;
const LONGEST_LINE = 20;
/** Room for "100 %" behind the longest bar, px. */
const FIGURE_PX = 48;

interface BarCanvasProps {
  readonly chart: BarChart;
  /** Receives the function that gives the picture as a PNG data URL. */
  readonly onReady: (picture: () => string | null) => void;
}

const shortened = (line: string): string =>
  line.length > LONGEST_LINE ? `${line.slice(0, LONGEST_LINE - 1).trimEnd()}…` : line;

/** A long label stands on two lines, so that what tells it from the next is not cut off. */
function linesOf(label: string): string | string[] {
  if (label.length <= LONGEST_LINE) return label;
  const space = label.lastIndexOf(' ', LONGEST_LINE);
  return space <= 0 ? shortened(label) : [label.slice(0, space), shortened(label.slice(space + 1))];
}
const figure = (value: number): string => value.toLocaleString('en-GB', { maximumSignificantDigits: 2 });

function optionsOf(chart: BarChart, colours: ChartColours): ChartOptions<'bar'> {
  return {
    animation: false,
    responsive: true,
    maintainAspectRatio: false,
    indexAxis: 'y',
    events: [],
    layout: { padding: { right: FIGURE_PX } },
    scales: {
      x: { display: false, min: 0, suggestedMax: Math.max(...chart.bars.map(({ value }) => value), 1e-9) },
      y: {
        grid: { display: false },
        border: { color: colours.tones.soft },
        ticks: { color: colours.tones.ink, font: { family: FONT, size: 13 }, autoSkip: false },
      },
    },
  };
}

/** Each bar's figure at its end. */
function figurePlugin(current: () => { readonly chart: BarChart; readonly colours: ChartColours }): Plugin<'bar'> {
  return {
    id: 'embertally-bar-figures',
    afterDatasetsDraw(picture) {
      const { ctx } = picture;
      const { chart, colours } = current();
      ctx.save();
      ctx.font = `13px ${FONT}`;
      ctx.textBaseline = 'middle';
      ctx.fillStyle = colours.tones.ink;
      picture.getDatasetMeta(0).data.forEach((element, index) => {
        const bar = chart.bars[index];
        if (bar !== undefined) ctx.fillText(`${figure(bar.value)} ${chart.unit}`, element.x + 6, element.y);
      });
      ctx.restore();
    },
  };
}

/** The bars themselves, on a canvas; everything they say stands beside them in words and in a table. */
export function BarCanvas({ chart, onReady }: BarCanvasProps) {
  const instance = useRef<Chart<'bar', number[]> | null>(null);
  const theme = useThemeRevision();
  const colours = useMemo(() => chartColours(theme), [theme]);
  const current = useRef({ chart, colours });
  const plugins = useMemo(() => [figurePlugin(() => current.current)], []);
  const data = useMemo(
    () => ({
      labels: chart.bars.map(({ label }) => linesOf(label)),
      datasets: [
        {
          data: chart.bars.map(({ value }) => value),
          backgroundColor: chart.bars.map(({ tone }) => colours.tones[tone]),
          barThickness: 11,
        },
      ],
    }),
    [chart, colours],
  );
  const options = useMemo(() => optionsOf(chart, colours), [chart, colours]);

  const row_px = chart.bars.some(({ label }) => label.length > LONGEST_LINE) ? TALL_ROW_PX : ROW_PX;

  useLayoutEffect(() => {
    current.current = { chart, colours };
  }, [chart, colours]);
  useEffect(() => {
    onReady(() => instance.current?.toBase64Image('image/png', 1) ?? null);
  }, [onReady]);

  return (
    <div className="relative w-full" style={{ height: `${chart.bars.length * row_px + 12}px` }}>
      <BarPicture
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
