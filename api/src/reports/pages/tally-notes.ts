import { CAUTIONS } from '@embertally/shared/cautions/cautions';
import type { Flow } from '../layout/flow.ts';
import { SIZE, SOFT } from '../layout/theme.ts';
import { writeHeading } from '../layout/write-heading.ts';
import { writeTable } from '../layout/write-table.ts';
import { writeText } from '../layout/write-text.ts';
import type { RoomReport } from '../report-book.ts';
import { inputWords } from './input-words.ts';
import { missingName } from './missing-name.ts';
import { typeset } from './typeset.ts';
import { superscript, type RoomNotes } from './room-notes.ts';

/** What could not be computed, which input would give it, and why it is not a zero. */
export function writeMissing(flow: Flow, { tally }: RoomReport): void {
  if (tally.missing.length === 0) return;
  const byReason = new Map<string, { names: string[]; input: string; why: string }>();
  for (const { path, input, why } of tally.missing) {
    const key = `${input} ${why}`;
    const group = byReason.get(key) ?? { names: [], input, why };
    const name = missingName(path);
    if (!group.names.includes(name)) group.names.push(name);
    byReason.set(key, group);
  }
  writeHeading(flow, 'What could not be computed');
  const columns = [
    { title: 'Number', width: { share: 1.1 } },
    { title: 'What it needs', width: 110 },
    { title: 'Why', width: { share: 1.3 } },
  ];
  const rows = [...byReason.values()].map(({ names, input, why }) => ({
    cells: [names.join('; '), inputWords(input), typeset(why)],
  }));
  writeTable(flow, columns, rows);
  flow.gap(14);
}

/** The flags behind the small numbers. */
export function writeNotes(flow: Flow, notes: RoomNotes): void {
  if (notes.all.length === 0) return;
  writeHeading(flow, 'Flags beside these numbers', 30);
  for (const [index, text] of notes.all.entries()) {
    writeText(flow, `${superscript(index + 1)} ${typeset(text)}`, { size: SIZE.table, after: 2.5 });
  }
  flow.gap(10);
}

/** The cautions that stand with this tally, by title; their text stands once at the end. */
export function writeCautionTitles(flow: Flow, { tally }: RoomReport): void {
  const titles = CAUTIONS.filter(({ id }) => tally.cautions.includes(id)).map(({ title }) => title);
  if (titles.length === 0) return;
  writeHeading(flow, 'Cautions that stand with this tally', 30);
  writeText(flow, titles.map((title) => `${title}.`).join(' '), { size: SIZE.table, colour: SOFT, after: 8 });
}
