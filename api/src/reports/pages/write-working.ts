import { figureName } from '@embertally/shared/tally/figure-name';
import type { WorkingInput } from '@embertally/shared/methods/estimate';
import type { Flow } from '../layout/flow.ts';
import { HAIRLINE, INK, LEADING, OCHRE, RULE, SIZE, SOFT } from '../layout/theme.ts';
import { writeText } from '../layout/write-text.ts';
import { wrapText } from '../pdf/wrap-text.ts';
import type { WorkingGroup } from './group-workings.ts';
import { sourceText } from './source-text.ts';
import type { PlacedEstimate } from './tally-estimates.ts';
import { typeset } from './typeset.ts';
import { workingFigure } from './working-figure.ts';

const INDENT = 12;
const SYMBOL = 58;
const ORIGIN = 190;
/** Its parts stand in the table of entries; listing them again under every sum would hide the rest. */
const SUM_OF_ENTRIES = 'load.fire-load@';

/** The derivation of one number, or of several that one run gave: relation, inputs, steps, flags, source, method. */
export function writeWorking(flow: Flow, { results, shared }: WorkingGroup): void {
  flow.need(SIZE.body * LEADING * (results.length + 3));
  for (const result of results) writeResult(flow, result);
  const small = { size: SIZE.note, indent: INDENT };
  const title = shared.title === undefined ? '' : `${shared.title} · `;
  writeText(flow, `${title}${shared.method}`, { ...small, colour: SOFT });
  if (shared.equation !== undefined) writeText(flow, shared.equation, { size: SIZE.table, indent: INDENT, after: 2 });
  if (shared.method.startsWith(SUM_OF_ENTRIES)) {
    writeText(flow, 'Summed over the entries of the table above.', small);
  } else {
    for (const input of shared.inputs ?? []) writeInput(flow, input);
    for (const { text, equation, value, unit } of (shared.steps ?? []).slice(0, -1)) {
      if (equation !== undefined && equation === shared.equation) continue;
      const shown = value == null ? '' : ` ${workingFigure(value, unit)}`;
      const equals = shown === '' || /=$/u.test(equation ?? text) ? '' : ' =';
      const between = equation === undefined ? equals : `: ${equation}${equals}`;
      writeText(flow, typeset(`${text}${between}${shown}`), small);
    }
  }
  for (const { text, code } of shared.warnings)
    writeText(flow, `Flag ${code}: ${typeset(text)}`, { ...small, colour: OCHRE });
  const [source] = shared.sources ?? [];
  if (source !== undefined) writeText(flow, `Source: ${sourceText(source)}`, { ...small, colour: SOFT });
  flow.gap(4);
  flow.sheet.line(
    [
      [flow.left, flow.y],
      [flow.right, flow.y],
    ],
    { colour: RULE, width: HAIRLINE },
  );
  flow.gap(6);
}

/** "Fire load density        q_f,k = 2871.6 MJ/m²". */
function writeResult(flow: Flow, { path, estimate }: PlacedEstimate): void {
  const { book } = flow.file;
  const { symbol, value, unit, never } = estimate;
  const figure = value === null ? `never: ${never ?? ''}` : workingFigure(value, unit);
  const result = symbol === undefined || value === null ? figure : `${symbol} = ${figure}`;
  const style = { size: SIZE.body, weight: 'bold' as const, colour: INK };
  const results = wrapText(book, result, SIZE.body, 'bold', flow.width * 0.45);
  const names = wrapText(book, figureName(path), SIZE.body, 'bold', flow.width * 0.52);
  for (let line = 0; line < Math.max(results.length, names.length); line++) {
    flow.need(SIZE.body * LEADING);
    const y = flow.y + SIZE.body;
    flow.sheet.text(names[line] ?? '', flow.left, y, style);
    flow.sheet.text(results[line] ?? '', flow.right, y, { ...style, align: 'right' });
    flow.y += SIZE.body * LEADING;
  }
}

/** "Q  58 752 MJ  Heat kept · computed · made for 0 or more". */
function writeInput(flow: Flow, input: WorkingInput): void {
  const { book } = flow.file;
  const leading = SIZE.note * LEADING;
  const value = wrapText(book, workingFigure(input.value, input.unit), SIZE.note, 'regular', ORIGIN - SYMBOL - 8);
  const note = input.note === undefined ? '' : `, ${input.note}`;
  const valid = input.valid === undefined ? '' : ` · made for ${input.valid}`;
  const about = `${input.quantity} · ${input.origin}${note}${valid}`;
  const lines = wrapText(book, about, SIZE.note, 'regular', flow.width - INDENT - ORIGIN);
  const symbols = wrapText(book, input.symbol, SIZE.note, 'regular', SYMBOL - 4);
  const tall = Math.max(value.length, lines.length, symbols.length);
  for (let line = 0; line < tall; line++) {
    flow.need(leading);
    const y = flow.y + SIZE.note;
    const x = flow.left + INDENT;
    flow.sheet.text(symbols[line] ?? '', x, y, { size: SIZE.note, colour: INK });
    flow.sheet.text(value[line] ?? '', x + SYMBOL, y, { size: SIZE.note, colour: INK });
    flow.sheet.text(lines[line] ?? '', x + ORIGIN, y, { size: SIZE.note, colour: SOFT });
    flow.y += leading;
  }
}
