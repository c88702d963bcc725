import { makeReport } from '../../api/src/reports/make-report.ts';
import { pageTexts } from '../support/poppler.ts';
import { sampleInput } from '../api/reports/sample-report.ts';
import { box, crate, groundFloor, withEntries, withRoom } from '../support/survey-builder.ts';
import { atMost, median, type BenchRow } from './bench-row.ts';

const [ROOMS, ENTRIES, ROUNDS] = [60, 5000, 5];
const AT_ONCE = 1000;
const MS_PER_PAGE = 1000 / 60;
const MB = 1024 * 1024;

/** A storey of 60 rooms with 5,000 entries. */
function survey() {
  let document = groundFloor({ wall_thickness_m: 0.2 });
  const corner = (room: number) => [(room % 10) * 6, Math.floor(room / 10) * 6] as const;
  for (let room = 0; room < ROOMS; room++) document = withRoom(document, `Room ${room}`, box(...corner(room), 6, 6));
  const entries = Array.from({ length: ENTRIES }, (_, index) => {
    const [room, place] = [index % ROOMS, Math.floor(index / ROOMS)];
    const [x, y] = corner(room);
    const at = [x + 0.7 + (place % 10) * 0.5, y + 0.7 + Math.floor(place / 10) * 0.5] as const;
    const id = `00000000-0000-4000-8000-${String(index).padStart(12, '0')}`;
    return crate(`Entry ${index}`, `Room ${room}`, ...at, { id, width_m: 0.4, depth_m: 0.4 });
  });
  for (let from = 0; from < ENTRIES; from += AT_ONCE) {
    document = withEntries(document, ...entries.slice(from, from + AT_ONCE));
  }
  return document;
}

/** How long a page of a large report takes, and the memory it needs above what was there. */
export async function benchReport(): Promise<readonly BenchRow[]> {
  const input = sampleInput(survey(), { limits: [] });
  const before = process.memoryUsage().rss;
  const pages = pageTexts(await makeReport(input)).length;
  const grown = (process.memoryUsage().rss - before) / MB;
  const times: number[] = [];
  for (let round = 0; round < ROUNDS; round++) {
    const from = performance.now();
    await makeReport(input);
    times.push(performance.now() - from);
  }
  return [
    atMost(`PDF of ${ROOMS} rooms and ${ENTRIES} entries, pages`, pages, '', null),
    atMost('PDF, one page of text (60 pages/s or more)', median(times) / pages, 'ms', MS_PER_PAGE),
    atMost('PDF, memory above what was there', grown, 'MB', 300),
  ];
}
