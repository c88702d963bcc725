import { burnoutChart } from '@embertally/web/src/book/tally/burnout-chart.ts';
import type { CurveChart } from '@embertally/web/src/components/chart/curve-chart.ts';
import { curveCsv } from '@embertally/web/src/components/chart/curve-csv.ts';
import { curveRows } from '@embertally/web/src/components/chart/curve-rows.ts';
import { type Box, placeLabels } from '@embertally/web/src/components/chart/place-labels.ts';
import { readCurve } from '@embertally/web/src/components/chart/read-curve.ts';
import { releaseChart } from '@embertally/web/src/book/tally/release-chart.ts';
import { estimateRoom } from '@embertally/shared/tally/estimate-room';
import { roomInput } from '@embertally/shared/survey/room-input';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { uid } from '../../../support/survey-builder.ts';
import { dock } from '../render-book-part.tsx';

const CHART: CurveChart = {
  title: 'It could reach 5 MW.',
  summary: 'Heat release over time.',
  x: { label: 'Time', unit: 'min', column: 'time' },
  y: { label: 'Heat release', unit: 'MW', column: 'heat_release' },
  series: [
    {
      id: 'release',
      label: 'Heat release',
      points: [
        [0, 0],
        [10, 5],
        [20, 0],
      ],
      tone: 'ink',
      dash: [],
    },
  ],
  thresholds: [{ id: 'openings', label: 'openings can feed 6 MW', y: 6, tone: 'ink', dash: [2, 3] }],
  marks: [],
  fileName: 'dock-heat-release',
};

describe('a curve', () => {
  it('is read straight between its points and not at all outside them', () => {
    expect(readCurve(CHART.series[0]!.points, 4)).toBeCloseTo(2);
    expect(readCurve(CHART.series[0]!.points, 20)).toBe(0);
    expect(readCurve(CHART.series[0]!.points, 21)).toBeNull();
    expect(readCurve([], 1)).toBeNull();
  });

  it('is saved with a unit in every column name, CRLF and the levels it is read against', () => {
    expect(curveCsv(CHART)).toBe('time_min,heat_release_MW,heat_release_openings_MW\r\n0,0,6\r\n10,5,6\r\n20,0,6\r\n');
  });

  it('saves the moments something answers at in columns of their own', () => {
    const moments = [{ id: 'sprinkler', label: 'sprinkler 3 min 0 s', x: 3, tone: 'verdigris' as const, dash: [1, 3] }];
    expect(curveCsv({ ...CHART, moments })).toBe(
      'time_min,heat_release_MW,heat_release_openings_MW,time_sprinkler_min\r\n0,0,6,3\r\n10,5,6,3\r\n20,0,6,3\r\n',
    );
  });

  it('leaves a cell empty where a line does not reach: no zero is made up', () => {
    const short = {
      ...CHART.series[0]!,
      id: 'short',
      points: [
        [0, 1],
        [10, 2],
      ] as const,
    };
    const rows = curveRows({ ...CHART, series: [...CHART.series, short] });
    expect(rows.at(-1)).toEqual({ x: 20, values: [0, null] });
  });
});

describe('the labels of a chart', () => {
  const box = fc.record({
    x: fc.double({ min: 0, max: 300, noNaN: true }),
    y: fc.double({ min: 0, max: 180, noNaN: true }),
    width: fc.constant(90),
    height: fc.constant(18),
  });
  const apart = (a: Box, b: Box) =>
    a.x + a.width <= b.x || b.x + b.width <= a.x || a.y + a.height <= b.y || b.y + b.height <= a.y;

  it('never lie over each other where there is a place that is free', () => {
    fc.assert(
      fc.property(fc.array(box, { minLength: 1, maxLength: 4 }), (wanted) => {
        // Each label has a row of its own to fall back to, so a free place always exists.
        const requests = wanted.map((place, index) => ({
          id: String(index),
          places: [place, { x: 0, y: 400 + index * 30, width: 90, height: 18 }],
        }));
        const placed = [...placeLabels(requests, [], { x: 0, y: 0, width: 500, height: 600 }).values()];
        return placed.every((one, index) => placed.slice(index + 1).every((other) => apart(one, other)));
      }),
    );
  });

  it('give way to the lines', () => {
    const requests = [
      {
        id: 'a',
        places: [
          { x: 0, y: 0, width: 50, height: 10 },
          { x: 0, y: 50, width: 50, height: 10 },
        ],
      },
    ];
    const line = [
      [0, 5],
      [50, 5],
    ] as const;
    const placed = placeLabels(requests, [line], { x: 0, y: 0, width: 100, height: 100 });
    expect(placed.get('a')).toMatchObject({ y: 50, covers: false });
  });
});

describe('the charts of a tally', () => {
  const document = dock();
  const tally = estimateRoom(roomInput(document, uid('Dock'), []));

  it('draw heat release in the person’s units, with the same heat in either', () => {
    const si = releaseChart(tally, 'SI', 'x');
    const us = releaseChart(tally, 'US', 'x');
    const peak = (chart: CurveChart | null) => Math.max(...(chart?.series[0]?.points.map(([, y]) => y) ?? []));
    const kW = si?.y.unit === 'MW' ? peak(si) * 1000 : peak(si);
    expect(us?.y.unit).toBe('Btu/s');
    // 1 Btu = 1.05505585262 kJ
    expect(peak(us) * 1.05505585262).toBeCloseTo(kW, 6);
  });

  it('put the standard curve at 20 °C at the start and 945 °C after an hour', () => {
    const hot = {
      ...tally,
      burnout: {
        ...tally.burnout,
        asKept: {
          parametric: {
            peak: { value: 900, unit: '°C', method: 'x@1', warnings: [] },
            timeOfPeak: { value: 30, unit: 'min', method: 'x@1', warnings: [] },
            curve: [
              [0, 20],
              [30, 900],
              [60, 20],
            ] as const,
            controlledBy: 'ventilation' as const,
          },
        },
      },
    };
    const chart = burnoutChart(hot, 'SI', 'x');
    const standard = chart?.series.find((series) => series.id === 'standard');
    expect(standard?.points[0]).toEqual([0, 20]);
    // 20 + 345 log10(8 · 60 + 1) = 945.3 °C
    expect(standard?.points.at(-1)?.[1]).toBeCloseTo(945.34, 1);
    expect(chart?.series[0]?.label).toBe('as kept');
  });
});
