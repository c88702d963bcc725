import type { Delimiter } from './calorimeter-choices.ts';
import { splitCells } from './split-cells.ts';

const CANDIDATES: readonly Delimiter[] = ['\t', ';', ','];

/** The mark that cuts the last lines into the same number of cells, most of them; a comma where none does. */
export function findDelimiter(lines: readonly string[]): Delimiter {
  const tail = lines.slice(-20);
  const scores = CANDIDATES.map((mark): number => {
    const widths = tail.map((line) => splitCells(line, mark).length);
    const [width = 1] = widths;
    return widths.every((one) => one === width) && width > 1 ? 1 : Math.max(1, ...widths) > 1 ? 0.5 : 0;
  });
  const best = Math.max(...scores);
  return best === 0 ? ',' : (CANDIDATES[scores.indexOf(best)] ?? ',');
}
