import type { Standing } from '@embertally/shared/limits/standing';
import { entriesOfRoom } from '@embertally/shared/survey/derive/entries-of-room';
import { roomsInReadingOrder } from '@embertally/shared/survey/derive/rooms-in-reading-order';
import { roomInput } from '@embertally/shared/survey/room-input';
import { fromStored } from '@embertally/shared/survey/stored';
import type { Room, Storey, SurveyDocument } from '@embertally/shared/survey/survey-document';
import { estimateRoom } from '@embertally/shared/tally/estimate-room';
import type { RoomTally } from '@embertally/shared/tally/room-tally';
import { USUAL_SAMPLING } from '@embertally/shared/uncertainty/usual-sampling';
import { Figures } from './figures.ts';
import type { ReportBook, RoomReport } from './report-book.ts';
import type { ReportInput, ReportLimit } from './report-input.ts';

/** The room a tally was asked for is not in the survey any more. */
export class RoomGoneError extends Error {
  override readonly name = 'RoomGoneError';

  constructor() {
    super('The room is no longer in the survey, so its tally was not made. Open the survey and choose a room.');
  }
}

/**
 * With more rooms than this each is sampled less, or sampling would take longer than all pages; its pages say how many
 * samples it was. The 95 % place then moves by about 3 % of a standard deviation.
 */
const MANY_ROOMS = 20;
const SAMPLES_OF_MANY = 5_000;

const WORST: readonly Standing[] = ['over', 'near', 'within', 'no limit set'];
const byName = new Intl.Collator('en', { numeric: true });

/**
 * Tallies every room that is reported on with the same code as the screen, numbers the rooms from the lowest storey up and
 * finds how each stands.
 *
 * @param onRoom called after each room with the share of rooms done, 0 to 1
 * @throws RoomGoneError when one room is asked for and it is not there
 */
export function buildReportBook(input: ReportInput, onRoom: (fraction: number) => void = () => {}): ReportBook {
  const document = fromStored(input.document);
  const wanted = (room: Room) => input.kind === 'survey-report' || room.id === input.room_id;
  const storeys = [...document.storeys.values()].sort((a, b) => a.level_m - b.level_m || compare(a, b));
  const listed = storeys.map((storey) => ({
    storey,
    rooms: roomsInReadingOrder(document, storey.id),
  }));
  const count = listed.reduce((sum, { rooms }) => sum + rooms.filter(wanted).length, 0);
  if (count === 0 && input.kind === 'room-tally') throw new RoomGoneError();
  const sampling = count > MANY_ROOMS ? { ...USUAL_SAMPLING, samples: SAMPLES_OF_MANY } : USUAL_SAMPLING;
  let [number, done] = [0, 0];
  const reports = listed.map(({ storey, rooms }) => ({
    storey,
    rooms: rooms.flatMap((room) => {
      number++;
      if (!wanted(room)) return [];
      const report = reportRoom(document, storey, room, number, input.limits, sampling);
      onRoom(++done / count);
      return [report];
    }),
  }));
  const shown = input.kind === 'survey-report' ? reports : reports.filter(({ rooms }) => rooms.length > 0);
  return {
    input,
    document,
    storeys: shown,
    rooms: shown.flatMap(({ rooms }) => rooms),
    figures: new Figures(input.units),
  };
}

function reportRoom(
  document: SurveyDocument,
  storey: Storey,
  room: Room,
  number: number,
  limits: readonly ReportLimit[],
  sampling: { readonly samples: number; readonly seed: number },
): RoomReport {
  const input = roomInput(document, room.id, limits);
  const sampled = { ...input, options: { ...input.options, ...sampling } };
  const tally = estimateRoom(sampled, { workings: true });
  return {
    number,
    room,
    storey,
    entries: entriesOfRoom(document, room.id),
    tally,
    limits: limitsInOrder(tally, limits, room.id),
    standing: WORST.find((standing) => tally.limits.some((limit) => limit.standing === standing)) ?? 'no limit set',
  };
}

/** The limits of a room in the order the tally lists its standings. */
function limitsInOrder(tally: RoomTally, limits: readonly ReportLimit[], roomId: string): ReportLimit[] {
  const left = limits.filter((limit) => limit.room_id === roomId);
  return tally.limits.flatMap(({ quantity, bound }) => {
    const at = left.findIndex((limit) => limit.quantity === quantity && limit.bound === bound);
    return at < 0 ? [] : left.splice(at, 1);
  });
}

function compare(a: { readonly name: string; readonly id: string }, b: typeof a): number {
  return byName.compare(a.name, b.name) || (a.id < b.id ? -1 : 1);
}
