import type { Flow } from '../layout/flow.ts';
import { INK, LEADING, SIZE, SOFT, VERDIGRIS } from '../layout/theme.ts';
import type { Sheet } from '../pdf/sheet.ts';
import { wrapText } from '../pdf/wrap-text.ts';

export interface ContentsLine {
  readonly title: string;
  readonly sheet: () => Sheet | undefined;
}

/** What stands where: titles, dots and page numbers; a line opens its page. Numbers are set when all pages are there. */
export function writeContentsList(flow: Flow, lines: readonly ContentsLine[]): void {
  const { book } = flow.file;
  const leading = SIZE.body * LEADING + 2;
  for (const { title, sheet: target } of lines) {
    const wrapped = wrapText(book, title, SIZE.body, 'regular', flow.width - 60);
    for (const [index, line] of wrapped.entries()) {
      flow.need(leading);
      const { sheet, left, right } = flow;
      const top = flow.y;
      const base = top + SIZE.body;
      const wide = sheet.text(line, left, base, { size: SIZE.body, colour: INK });
      flow.y += leading;
      if (index < wrapped.length - 1) continue;
      flow.later(() => {
        const page = target();
        if (page === undefined) return;
        const number = String(flow.pageOf(page));
        const numberWidth = book.width(number, SIZE.body, 'regular');
        sheet.line(
          [
            [left + wide + 6, base - 1],
            [right - numberWidth - 6, base - 1],
          ],
          { colour: SOFT, width: 0.7, dash: [0, 3], cap: 'round' },
        );
        sheet.text(number, right, base, { size: SIZE.body, colour: VERDIGRIS, align: 'right' });
        sheet.link(left, top, right - left, leading, page);
      });
    }
  }
}
