import { standingOf } from './standing.ts';

/**
 * A ratio in percent for a sentence: whole numbers, with as many decimals added as it takes for the figure to tell the
 * same standing as the unrounded value (1.0004 is "100.04 %", not "100 %": it is over).
 *
 * @param ratio value ÷ bound
 */
export function percentText(ratio: number): string {
  for (let decimals = 0; decimals < 6; decimals += 1) {
    const shown = Number((ratio * 100).toFixed(decimals));
    if (standingOf(shown, 100) === standingOf(ratio, 1)) return `${shown.toFixed(decimals)} %`;
  }
  return `${String(ratio * 100)} %`;
}
