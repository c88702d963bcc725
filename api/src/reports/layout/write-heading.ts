import { wrapText } from '../pdf/wrap-text.ts';
import type { Flow } from './flow.ts';
import { HAIRLINE, INK, LEADING, RULE, SIZE, SOFT } from './theme.ts';

/** A title of more characters than this is set small, so that it does not fill pages. */
export const LONG_TITLE = 140;

/** The title of a section at the top of its first page, with a soft line below it and a rule. */
export function writeTitle(flow: Flow, title: string, below = ''): void {
  const { book } = flow.file;
  const size = title.length > LONG_TITLE ? SIZE.body : SIZE.title;
  for (const line of wrapText(book, title, size, 'bold', flow.width)) {
    flow.need(size * LEADING);
    flow.sheet.text(line, flow.left, flow.y + size, { size, weight: 'bold', colour: INK });
    flow.y += size * 1.22;
  }
  flow.gap(4);
  if (below !== '') {
    for (const line of wrapText(book, below, SIZE.body, 'regular', flow.width)) {
      flow.need(SIZE.body * LEADING);
      flow.sheet.text(line, flow.left, flow.y + SIZE.body, { size: SIZE.body, colour: SOFT });
      flow.y += SIZE.body * LEADING;
    }
  }
  flow.gap(6);
  drawRule(flow);
  flow.gap(12);
}

/** A heading inside a section; starts a new page when fewer than `keep` points would follow it. */
export function writeHeading(flow: Flow, heading: string, keep = 60): void {
  flow.need(SIZE.heading * LEADING + keep);
  flow.sheet.text(heading, flow.left, flow.y + SIZE.heading, { size: SIZE.heading, weight: 'bold', colour: INK });
  flow.y += SIZE.heading * LEADING + 5;
}

/** A hairline over the whole width at the place in hand. */
export function drawRule(flow: Flow): void {
  flow.sheet.line(
    [
      [flow.left, flow.y],
      [flow.right, flow.y],
    ],
    { colour: RULE, width: HAIRLINE },
  );
}
