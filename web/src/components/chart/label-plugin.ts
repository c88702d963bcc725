import type { Chart, Plugin } from 'chart.js';
import type { ChartColours } from './chart-colours.ts';
import type { ChartTone, CurveChart } from './curve-chart.ts';
import { type Box, type LabelRequest, placeLabels } from './place-labels.ts';

const SIZE_PX = 13;
const PADDING_PX = 3;

interface Text {
  readonly text: string;
  readonly tone: ChartTone;
}

/** What the plugin draws, asked for anew at each drawing. */
export interface Drawn {
  readonly chart: CurveChart;
  readonly colours: ChartColours;
  readonly readAt: number | null;
}

/** Boxes above and below a point of a line, centred and to either side. */
const around = (x: number, y: number, width: number, height: number): Box[] => [
  { x: x - width / 2, y: y - height - 4, width, height },
  { x: x - width / 2, y: y + 4, width, height },
  { x: x + 8, y: y - height / 2, width, height },
  { x: x - width - 8, y: y - height / 2, width, height },
];

function requestsOf(chart: Chart, data: CurveChart, context: CanvasRenderingContext2D) {
  const { x, y } = chart.scales;
  const requests: LabelRequest[] = [];
  const texts = new Map<string, Text>();
  if (x === undefined || y === undefined) return { requests, texts };
  const { left, right, top, bottom } = chart.chartArea;
  const height = SIZE_PX + 2 * PADDING_PX;
  const widthOf = (text: string): number => Math.ceil(context.measureText(text).width) + 2 * PADDING_PX;
  for (const threshold of data.thresholds) {
    const width = widthOf(threshold.label);
    const at = y.getPixelForValue(threshold.y);
    const starts = [1, 0.75, 0.5, 0.25, 0].map((share) => left + 4 + share * (right - left - width - 8));
    requests.push({
      id: threshold.id,
      places: starts.flatMap((start) => [
        { x: start, y: at - height - 1, width, height },
        { x: start, y: at + 2, width, height },
      ]),
    });
    texts.set(threshold.id, { text: threshold.label, tone: threshold.tone });
  }
  for (const moment of data.moments ?? []) {
    const width = widthOf(moment.label);
    const at = x.getPixelForValue(moment.x);
    const starts = [0, 0.2, 0.4, 0.6, 0.8].map((share) => top + 2 + share * (bottom - top - height));
    requests.push({
      id: moment.id,
      places: starts.flatMap((start) => [
        { x: at + 2, y: start, width, height },
        { x: at - width - 2, y: start, width, height },
      ]),
    });
    texts.set(moment.id, { text: moment.label, tone: moment.tone });
  }
  if (data.series.length < 2) return { requests, texts };
  for (const series of data.series) {
    const width = widthOf(series.label);
    const shares = [0.85, 0.7, 0.55, 0.4, 0.25, 0.95];
    requests.push({
      id: series.id,
      places: shares.flatMap((share) => {
        const point = series.points[Math.round(share * (series.points.length - 1))];
        if (point === undefined) return [];
        return around(x.getPixelForValue(point[0]), y.getPixelForValue(point[1]), width, height);
      }),
    });
    texts.set(series.id, { text: series.label, tone: series.tone });
  }
  return { requests, texts };
}

/** Threshold lines, moments, marks and direct labels, drawn over the curves where they cover least. */
export function labelPlugin(current: () => Drawn): Plugin<'line'> {
  return {
    id: 'embertally-labels',
    afterDatasetsDraw(chart) {
      const { chart: data, colours, readAt } = current();
      const { ctx, chartArea } = chart;
      const { x, y } = chart.scales;
      if (x === undefined || y === undefined) return;
      ctx.save();
      ctx.font = `${SIZE_PX}px ${String(chart.options.font?.family ?? 'sans-serif')}`;
      for (const threshold of data.thresholds) {
        const at = y.getPixelForValue(threshold.y);
        ctx.beginPath();
        ctx.setLineDash([...threshold.dash]);
        ctx.lineWidth = 1.25;
        ctx.strokeStyle = colours.tones[threshold.tone];
        ctx.moveTo(chartArea.left, at);
        ctx.lineTo(chartArea.right, at);
        ctx.stroke();
      }
      for (const moment of data.moments ?? []) {
        const at = x.getPixelForValue(moment.x);
        ctx.beginPath();
        ctx.setLineDash([...moment.dash]);
        ctx.lineWidth = 1.25;
        ctx.strokeStyle = colours.tones[moment.tone];
        ctx.moveTo(at, chartArea.top);
        ctx.lineTo(at, chartArea.bottom);
        ctx.stroke();
      }
      ctx.setLineDash([]);
      if (readAt !== null) {
        ctx.beginPath();
        ctx.lineWidth = 1;
        ctx.strokeStyle = colours.tones.verdigris;
        ctx.moveTo(x.getPixelForValue(readAt), chartArea.top);
        ctx.lineTo(x.getPixelForValue(readAt), chartArea.bottom);
        ctx.stroke();
      }
      for (const mark of data.marks) {
        ctx.beginPath();
        ctx.lineWidth = 2;
        ctx.fillStyle = colours.page;
        ctx.strokeStyle = colours.tones[mark.tone];
        ctx.arc(x.getPixelForValue(mark.x), y.getPixelForValue(mark.y), 4.5, 0, 2 * Math.PI);
        ctx.fill();
        ctx.stroke();
      }
      const { requests, texts } = requestsOf(chart, data, ctx);
      const lines = data.series.map((series) =>
        series.points.map(([px, py]) => [x.getPixelForValue(px), y.getPixelForValue(py)] as const),
      );
      const obstacles = data.marks.map((mark) => {
        const [mx, my] = [x.getPixelForValue(mark.x), y.getPixelForValue(mark.y)];
        return [
          [mx - 8, my - 8],
          [mx + 8, my + 8],
        ] as const;
      });
      const frame = {
        x: chartArea.left,
        y: chartArea.top,
        width: chartArea.right - chartArea.left,
        height: chartArea.bottom - chartArea.top,
      };
      ctx.textBaseline = 'middle';
      for (const [id, box] of placeLabels(requests, [...lines, ...obstacles], frame)) {
        const label = texts.get(id);
        if (label === undefined) continue;
        if (box.covers) {
          ctx.globalAlpha = 0.85;
          ctx.fillStyle = colours.page;
          ctx.fillRect(box.x, box.y, box.width, box.height);
          ctx.globalAlpha = 1;
        }
        ctx.fillStyle = colours.tones[label.tone];
        ctx.fillText(label.text, box.x + PADDING_PX, box.y + box.height / 2);
      }
      ctx.restore();
    },
  };
}
