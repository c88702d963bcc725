import { CAUTIONS } from '@embertally/shared/cautions/cautions';
import type { Flow } from '../layout/flow.ts';
import { SIZE } from '../layout/theme.ts';
import { writeTitle } from '../layout/write-heading.ts';
import { writeText } from '../layout/write-text.ts';
import type { Sheet } from '../pdf/sheet.ts';

/** All cautions in full, once. Returns the sheet they begin on. */
export function writeCautionsPage(flow: Flow): Sheet {
  const sheet = flow.startSection('Cautions');
  writeTitle(flow, 'Cautions', 'They stand with every number of this report.');
  for (const [index, { title, text }] of CAUTIONS.entries()) {
    flow.need(64);
    writeText(flow, `${index + 1}  ${title}`, { size: SIZE.lead, weight: 'bold', after: 2 });
    writeText(flow, text, { indent: 15, width: 400, after: 13 });
  }
  return sheet;
}
