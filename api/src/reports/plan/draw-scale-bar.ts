import { INK, PAGE, SIZE, SOFT } from '../layout/theme.ts';
import type { Figures } from '../figures.ts';
import type { Sheet } from '../pdf/sheet.ts';
import type { PlanScale } from './plan-scale.ts';

const METRES_PER_FOOT = 0.3048;
const LONGEST = 130;
const STEPS = [1, 2, 5];

/**
 * A scale bar that ends at `right`: four equal parts of a round length in the reader's unit, alternately filled.
 */
export function drawScaleBar(sheet: Sheet, figures: Figures, scale: PlanScale, right: number, y: number): void {
  const unit = figures.unit('m');
  const pointsPerUnit = scale.pointsPerMetre * (unit === 'ft' ? METRES_PER_FOOT : 1);
  const most = LONGEST / 4 / pointsPerUnit;
  const power = 10 ** Math.floor(Math.log10(most));
  const part = power * (STEPS.findLast((step) => step * power <= most * (1 + 1e-9)) ?? 1);
  const length = part * 4 * pointsPerUnit;
  const left = right - length;
  for (let index = 0; index < 4; index++) {
    const fill = index % 2 === 0 ? INK : PAGE;
    sheet.rect(left + (index * length) / 4, y, length / 4, 4, { fill, stroke: { colour: INK, width: 0.6 } });
  }
  for (const index of [0, 2, 4]) {
    const value = String(Number((part * index).toPrecision(6)));
    const text = index === 4 ? `${value} ${unit}` : value;
    sheet.text(text, left + (index * length) / 4, y + 13, {
      size: SIZE.note,
      colour: SOFT,
      align: index === 4 ? 'right' : 'left',
    });
  }
}
