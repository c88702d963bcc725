import type { Flow } from '../layout/flow.ts';
import { HAIRLINE, INK, MARGIN, RULE, SIZE, SOFT } from '../layout/theme.ts';
import type { FontBook } from '../pdf/font-book.ts';
import { printableText } from '../pdf/printable-text.ts';
import type { Sheet } from '../pdf/sheet.ts';
import { reportDate } from '../report-date.ts';
import type { ReportInput } from '../report-input.ts';

export const NOT_ISSUED = 'Working survey, not issued';
const CAUTION =
  'Planning estimates. They do not replace the local fire code, the authority having jurisdiction or licensed practice.';

/** Running header, caution line and "page n of m" on every page, once all pages are there. */
export function drawFurniture(flow: Flow, input: ReportInput, cautions: Sheet | undefined): void {
  const { book } = flow.file;
  const count = flow.pages.length;
  const place = `${input.site} · ${input.building}`;
  const made = `Survey state ${input.document.sequence} · ${reportDate(input.made_at, input.time_zone)}`;
  const turnTo = cautions === undefined ? '' : ` Cautions in full: page ${flow.pageOf(cautions)}.`;
  for (const [index, { sheet, section }] of flow.pages.entries()) {
    const [left, right] = [MARGIN.left, sheet.width - MARGIN.right];
    const small = { size: SIZE.note, colour: SOFT };
    drawMargin(sheet);
    if (index > 0) {
      const head = MARGIN.top - 24;
      sheet.text(shortened(book, place, (right - left) * 0.52), left, head, small);
      sheet.text(shortened(book, section, (right - left) * 0.44), right, head, { ...small, align: 'right' });
      rule(sheet, left, right, head + 6);
    }
    const foot = sheet.height - MARGIN.bottom + 18;
    rule(sheet, left, right, foot);
    sheet.text(CAUTION + turnTo, left, foot + 12, small);
    if (cautions !== undefined) sheet.link(left, foot + 4, right - left, 10, cautions);
    const marked = sheet.text(NOT_ISSUED, left, foot + 24, { ...small, colour: INK, weight: 'bold' });
    sheet.text(`  ·  ${made}`, left + marked, foot + 24, small);
    sheet.text(`page ${index + 1} of ${count}`, right, foot + 24, { ...small, align: 'right' });
  }
}

/** The two hairlines of a ledger's inner margin. */
function drawMargin(sheet: Sheet): void {
  for (const x of [MARGIN.left - 18, MARGIN.left - 15.5]) {
    sheet.line(
      [
        [x, 0],
        [x, sheet.height],
      ],
      { colour: RULE, width: HAIRLINE },
    );
  }
}

function rule(sheet: Sheet, left: number, right: number, y: number): void {
  sheet.line(
    [
      [left, y],
      [right, y],
    ],
    { colour: RULE, width: HAIRLINE },
  );
}

/** A name that is too long for the running header ends in "…"; it stands in full on the title page. */
function shortened(book: FontBook, text: string, width: number): string {
  const whole = printableText(text);
  if (book.width(whole, SIZE.note, 'regular') <= width) return whole;
  let room = width - book.width('…', SIZE.note, 'regular');
  let kept = '';
  for (const character of whole) {
    room -= book.width(character, SIZE.note, 'regular');
    if (room < 0) break;
    kept += character;
  }
  return `${kept.trimEnd()}…`;
}
