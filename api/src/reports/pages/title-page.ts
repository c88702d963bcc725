import type { Standing } from '@embertally/shared/limits/standing';
import { standingSentence } from '@embertally/shared/limits/standing-sentence';
import { ENGINE } from '@embertally/shared/tally/engine';
import { countText } from '../count-text.ts';
import { drawMark } from '../layout/draw-mark.ts';
import { drawStanding } from '../layout/draw-standing.ts';
import type { Flow } from '../layout/flow.ts';
import { INK, LEADING, OCHRE, SIZE, SOFT } from '../layout/theme.ts';
import { LONG_TITLE, writeHeading } from '../layout/write-heading.ts';
import { writeText } from '../layout/write-text.ts';
import { wrapText } from '../pdf/wrap-text.ts';
import type { ReportBook, RoomReport } from '../report-book.ts';
import { reportDate } from '../report-date.ts';
import { NOT_ISSUED } from './page-furniture.ts';
import { writeContentsList, type ContentsLine } from './write-contents-list.ts';
import { writeFacts } from './write-facts.ts';

const MOST_NAMED = 12;
const WHAT_IT_IS =
  'A planning report: what was recorded as able to burn in each room, the heat it holds, how fast that heat could come out and what it would do to the room, by published methods. Every number is derived in the workings at the end.';
const WHAT_IT_IS_NOT =
  'It is no approval and no finding of compliance. It compares rooms only with limits that a named person has set, and defers to the local fire code, the authority having jurisdiction and licensed practice. It has not been issued: the survey can change after this page was made.';

/** The first page: which book, made when and by whom, how the rooms stand, what this is and is not, what stands where. */
export function writeTitlePage(flow: Flow, report: ReportBook, contents: readonly ContentsLine[]): void {
  const { input, rooms, figures, document } = report;
  const sheet = flow.startSection('');
  const { book } = flow.file;
  drawMark(sheet, flow.left, flow.y - 18, 17);
  sheet.text('Embertally', flow.left + 27, flow.y - 5, { size: SIZE.heading, weight: 'bold', colour: INK });
  drawNotIssued(flow);
  flow.y += 46;
  const kind = input.kind === 'survey-report' ? 'Report of the working survey' : 'Tally of one room';
  writeText(flow, kind, { size: SIZE.lead, colour: SOFT, after: 2 });
  const size = input.building.length > LONG_TITLE ? SIZE.body : SIZE.figure;
  for (const line of wrapText(book, input.building, size, 'bold', flow.width)) {
    flow.need(size * 1.2);
    flow.sheet.text(line, flow.left, flow.y + size, { size, weight: 'bold', colour: INK });
    flow.y += size * 1.2;
  }
  flow.gap(2);
  const siteSize = input.site.length > LONG_TITLE ? SIZE.body : SIZE.heading;
  writeText(flow, input.site, { size: siteSize, colour: SOFT, after: 16 });

  const heat = rooms.reduce((sum, { tally }) => sum + (tally.load.total.value ?? 0), 0);
  const storeys = countText(report.storeys.length, 'storey');
  const entries = countText(
    rooms.reduce((sum, room) => sum + room.entries.length, 0),
    'entry',
    'entries',
  );
  writeFacts(flow, [
    ['Survey', `state ${document.sequence} of the working survey`],
    ['Made', `${reportDate(input.made_at, input.time_zone)}, by ${input.made_by}`],
    ['What it covers', `${storeys}, ${countText(rooms.length, 'room')}, ${entries}`],
    ['Heat kept, all rooms', figures.quantity(heat, 'MJ')],
    ['Units', input.units === 'SI' ? 'SI' : 'US customary; workings in SI, as the methods are written'],
    ['Engine', ENGINE],
  ]);
  flow.gap(18);
  writeStandings(flow, report);
  flow.gap(8);
  writeHeading(flow, 'What this is, and what it is not');
  writeText(flow, WHAT_IT_IS, { after: 5 });
  writeText(flow, WHAT_IT_IS_NOT, { after: 14 });
  writeHeading(flow, 'What stands where', Math.min(contents.length, 8) * SIZE.body * LEADING);
  writeContentsList(flow, contents);
}

function drawNotIssued(flow: Flow): void {
  const { sheet, right, y } = flow;
  const wide = flow.file.book.width(NOT_ISSUED, SIZE.body, 'bold');
  sheet.rect(right - wide - 14, y - 20, wide + 14, 19, { stroke: { colour: OCHRE, width: 1, dash: [2.2, 1.6] } });
  sheet.text(NOT_ISSUED, right - 7, y - 7, { size: SIZE.body, weight: 'bold', colour: OCHRE, align: 'right' });
}

/** How many rooms stand where, then each room that is over or near in its own sentence. */
function writeStandings(flow: Flow, report: ReportBook): void {
  const { rooms } = report;
  writeHeading(flow, 'How the rooms stand');
  if (rooms.length === 0) {
    writeText(
      flow,
      'No room has been drawn yet, so nothing can be tallied. Draw a room in the plan and make this again.',
    );
    return;
  }
  const counts = (['over', 'near', 'within', 'no limit set'] satisfies Standing[]).map((standing) => {
    const count = rooms.filter((room) => room.standing === standing).length;
    return standing === 'no limit set' ? `${count} without a limit` : `${count} ${standing}`;
  });
  writeText(flow, `${counts.join(' · ')}. Near means 90 % of a limit or more.`, { after: 6 });
  const named = [
    ...rooms.filter(({ standing }) => standing === 'over'),
    ...rooms.filter(({ standing }) => standing === 'near'),
  ];
  for (const room of named.slice(0, MOST_NAMED)) writeStanding(flow, report, room);
  if (named.length > MOST_NAMED) {
    writeText(flow, `and ${named.length - MOST_NAMED} more, marked in the room table.`, { colour: SOFT });
  }
}

function writeStanding(flow: Flow, { figures }: ReportBook, { room, tally, limits, standing }: RoomReport): void {
  const at = tally.limits.findIndex((limit) => limit.standing === standing);
  const stood = tally.limits[at];
  if (stood === undefined) return;
  const sentence = standingSentence(stood, limits[at], (value, unit) => figures.parts(value, unit));
  const [wordWidth, leading] = [52, SIZE.body * LEADING];
  const lines = wrapText(flow.file.book, `${room.name}: ${sentence}`, SIZE.body, 'regular', flow.width - wordWidth);
  flow.need(Math.min(lines.length, 4) * leading + 4);
  drawStanding(flow.sheet, flow.file.book, standing, flow.left, flow.y + SIZE.body, SIZE.table);
  for (const line of lines) {
    flow.need(leading);
    flow.sheet.text(line, flow.left + wordWidth, flow.y + SIZE.body, { size: SIZE.body, colour: INK });
    flow.y += leading;
  }
  flow.gap(5);
}
