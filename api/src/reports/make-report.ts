import { buildReportBook } from './build-report-book.ts';
import { Flow } from './layout/flow.ts';
import { writeCautionsPage } from './pages/cautions-page.ts';
import { writeMethodsPage } from './pages/methods-page.ts';
import { drawFurniture, NOT_ISSUED } from './pages/page-furniture.ts';
import { writePlanPage } from './pages/plan-pages.ts';
import { writeRoomsPage } from './pages/rooms-page.ts';
import { writeTallyPages } from './pages/tally-pages.ts';
import { writeTitlePage } from './pages/title-page.ts';
import { writeWorkingsPages } from './pages/workings-pages.ts';
import type { ContentsLine } from './pages/write-contents-list.ts';
import { PdfFile } from './pdf/pdf-file.ts';
import type { Sheet } from './pdf/sheet.ts';
import type { ReportBook } from './report-book.ts';
import type { ReportInput } from './report-input.ts';

/** Shares of the whole that the steps take, for the progress a person sees. */
const TALLIES = 0.25;
const TALLY_PAGES = 0.35;
const WORKINGS = 0.25;

/**
 * The PDF of a working survey, or of one room's tally: tallies are computed here with the code the screen uses, so print
 * and screen agree. The same input always gives the same bytes. Never reads a clock, a database or the network.
 *
 * @param onProgress called with the share done, rising from 0 to 1
 * @throws RoomGoneError when a `room-tally` names a room that is not in the document
 */
export async function makeReport(
  input: ReportInput,
  onProgress: (fraction: number) => void = () => {},
): Promise<Uint8Array> {
  onProgress(0);
  const report = buildReportBook(input, (share) => onProgress(share * TALLIES));
  const file = await PdfFile.create(JSON.stringify(input));
  const flow = new Flow(file);
  const cautions =
    input.kind === 'survey-report' ? writeSurvey(flow, report, onProgress) : writeRoom(flow, report, onProgress);
  drawFurniture(flow, input, cautions);
  flow.drawWaiting();
  const [only] = report.rooms;
  const what = input.kind === 'survey-report' || only === undefined ? input.building : only.room.name;
  const bytes = await file.finish({
    title: `${what} – ${input.site}`,
    author: input.made_by,
    subject: `${NOT_ISSUED}: fire load report, survey state ${input.document.sequence}`,
    made: new Date(input.made_at),
  });
  onProgress(1);
  return bytes;
}

function writeSurvey(flow: Flow, report: ReportBook, onProgress: (fraction: number) => void): Sheet {
  const { file } = flow;
  const tallies = new Map<string, Sheet>();
  const workings = new Map<string, Sheet>();
  const plans = new Map<string, Sheet>();
  const parts: { rooms?: Sheet; methods?: Sheet; cautions?: Sheet } = {};
  const first = report.rooms[0]?.room.id ?? '';
  const contents: ContentsLine[] = [
    ...report.storeys.map(({ storey }) => ({ title: `Plan: ${storey.name}`, sheet: () => plans.get(storey.id) })),
    { title: 'Rooms: every room in one table', sheet: () => parts.rooms },
    ...(report.rooms.length === 0
      ? []
      : [
          { title: 'Tallies: one room after another', sheet: () => tallies.get(first) },
          { title: 'Workings: how every number was found', sheet: () => workings.get(first) },
          { title: 'Methods', sheet: () => parts.methods },
        ]),
    { title: 'Cautions in full', sheet: () => parts.cautions },
  ];
  writeTitlePage(flow, report, contents);
  file.bookmark('Title', flow.pages[0]?.sheet ?? flow.sheet);
  for (const storey of report.storeys) {
    const sheet = writePlanPage(flow, report, storey);
    plans.set(storey.storey.id, sheet);
    file.bookmark(`Plan: ${storey.storey.name}`, sheet);
  }
  parts.rooms = writeRoomsPage(flow, report, (id) => tallies.get(id));
  file.bookmark('Rooms', parts.rooms);
  for (const [index, room] of report.rooms.entries()) {
    const sheet = writeTallyPages(flow, report, room, () => workings.get(room.room.id));
    tallies.set(room.room.id, sheet);
    if (index === 0) file.bookmark('Tallies', sheet);
    file.bookmark(room.room.name, sheet, 1);
    onProgress(TALLIES + (TALLY_PAGES * (index + 1)) / report.rooms.length);
  }
  for (const [index, room] of report.rooms.entries()) {
    const sheet = writeWorkingsPages(flow, report, room);
    workings.set(room.room.id, sheet);
    if (index === 0) file.bookmark('Workings', sheet);
    file.bookmark(room.room.name, sheet, 1);
    onProgress(TALLIES + TALLY_PAGES + (WORKINGS * (index + 1)) / report.rooms.length);
  }
  if (report.rooms.length > 0) {
    parts.methods = writeMethodsPage(flow, report.rooms);
    file.bookmark('Methods', parts.methods);
  }
  parts.cautions = writeCautionsPage(flow);
  file.bookmark('Cautions', parts.cautions);
  return parts.cautions;
}

function writeRoom(flow: Flow, report: ReportBook, onProgress: (fraction: number) => void): Sheet {
  const { file } = flow;
  for (const room of report.rooms) {
    const parts: { workings?: Sheet } = {};
    file.bookmark(
      'Tally',
      writeTallyPages(flow, report, room, () => parts.workings),
    );
    onProgress(TALLIES + TALLY_PAGES);
    parts.workings = writeWorkingsPages(flow, report, room);
    file.bookmark('Workings', parts.workings);
    onProgress(TALLIES + TALLY_PAGES + WORKINGS);
  }
  file.bookmark('Methods', writeMethodsPage(flow, report.rooms));
  const cautions = writeCautionsPage(flow);
  file.bookmark('Cautions', cautions);
  return cautions;
}
