import { describe, expect, it } from 'vitest';
import { makeReport } from '../../../../api/src/reports/make-report.ts';
import { pageImages, pageTexts, type PageImage } from '../../../support/poppler.ts';
import { box, groundFloor, withRoom } from '../../../support/survey-builder.ts';
import { sampleInput } from '../sample-report.ts';

const DPI = 300;
const MM_PER_PIXEL = 25.4 / DPI;
const DARK = 100;
const WALL_M = 0.3;

/** The rows (or columns) in which a dark run of at least `least` pixels lies. */
function longRuns({ width, height, grey }: PageImage, along: 'rows' | 'columns', least: number): number[] {
  const [lines, length] = along === 'rows' ? [height, width] : [width, height];
  const at = (line: number, step: number) => grey[along === 'rows' ? line * width + step : step * width + line] ?? 255;
  return Array.from({ length: lines }, (_, line) => line).filter((line) => {
    let run = 0;
    for (let step = 0; step < length; step++) {
      run = at(line, step) < DARK ? run + 1 : 0;
      if (run >= least) return true;
    }
    return false;
  });
}

describe('the plan', () => {
  it.each([
    [12, 7],
    [31, 22],
    [4.2, 3.1],
  ])('of a room %s m × %s m measures true at the ratio it states', async (width_m, depth_m) => {
    const document = withRoom(groundFloor({ wall_thickness_m: WALL_M }), 'a', box(3, 2, width_m, depth_m));
    const pdf = await makeReport(sampleInput(document, { limits: [] }));
    const plan = pageTexts(pdf).findIndex((text) => text.includes('on A4 printed at 100'));
    const ratio = Number(/Scale 1:(\d+)/u.exec(pageTexts(pdf)[plan] ?? '')?.[1]);
    const [image] = pageImages(pdf, DPI, plan + 1, plan + 1);
    if (image === undefined) throw new Error('the plan was not drawn');
    const pixels = (metres: number) => (metres * 1000) / ratio / MM_PER_PIXEL;
    const columns = longRuns(image, 'columns', pixels(depth_m) * 0.8);
    const rows = longRuns(image, 'rows', pixels(width_m) * 0.9);
    const span = (lines: readonly number[]) => Math.max(...lines) - Math.min(...lines) + 1;
    expect(Math.abs(span(columns) / pixels(width_m + WALL_M) - 1)).toBeLessThan(0.005);
    expect(Math.abs(span(rows) / pixels(depth_m + WALL_M) - 1)).toBeLessThan(0.005);
  });
});
