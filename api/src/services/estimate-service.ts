import { estimateRoom } from '@embertally/shared/tally/estimate-room';
import { parseRoomInput } from '@embertally/shared/tally/parse-room-input';
import type { RoomTally } from '@embertally/shared/tally/room-tally';
import { Fault } from '../fault.ts';

/** The tally of a room that is stored nowhere. @throws Fault 422 with every fault of the input */
export function estimateOnce(candidate: unknown, workings: boolean): RoomTally {
  const parsed = parseRoomInput(candidate);
  if (!parsed.ok)
    throw Fault.invalid(parsed.errors, 'Nothing was computed. The input has faults; each is listed with its place.');
  return estimateRoom(parsed.value, { workings });
}
