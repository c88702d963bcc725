import { parseRoomInput } from '@embertally/shared/tally/parse-room-input';
import type { RoomInput } from '@embertally/shared/tally/room-input';
import { makeEstimate } from '../estimates/make-estimate.ts';
import { Fault } from '../fault.ts';
import type { EstimateMaker } from './estimate-maker.ts';

/** Above this even the plain sections hold up other requests. */
const MOST_AT_ONCE = 300;

/** Tallies of rooms that are stored nowhere. */
export class EstimateService {
  private readonly makeInThread: EstimateMaker;

  /** @param makeInThread for what takes longer than a request should hold the process */
  constructor(makeInThread: EstimateMaker) {
    this.makeInThread = makeInThread;
  }

  /**
   * The tally of a room as JSON; the same whichever thread makes it.
   * @throws Fault 422 with every fault of the input; 503 when too many are asked for at once
   */
  async make(candidate: unknown, workings: boolean, signal: AbortSignal): Promise<string> {
    const parsed = parseRoomInput(candidate);
    if (!parsed.ok)
      throw Fault.invalid(parsed.errors, 'Nothing was computed. The input has faults; each is listed with its place.');
    const task = { input: parsed.value, workings };
    return takesLong(parsed.value) ? this.makeInThread(task, signal) : makeEstimate(task);
  }
}

/** Sampling, and following a fire from entry to entry, take up to seconds. */
function takesLong({ contents, options }: RoomInput): boolean {
  const placed = contents.some(({ x_m, y_m }) => x_m != null && y_m != null);
  return (options?.samples ?? 0) > 0 || placed || contents.length > MOST_AT_ONCE;
}
