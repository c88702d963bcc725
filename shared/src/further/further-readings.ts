import { roomBasis } from '../tally/room-basis.ts';
import type { RoomInput } from '../tally/room-input.ts';
import type { RoomTally } from '../tally/room-tally.ts';
import { burnoutOtherwise } from './burnout-otherwise.ts';
import { USUAL_FURTHER, type FurtherAsked } from './further-asked.ts';
import type { FurtherReading } from './further-reading.ts';
import { goodsOtherwise } from './goods.ts';
import { largeRoom } from './large-room.ts';
import { loadOtherwise } from './load-otherwise.ts';
import { nextDoor } from './next-door.ts';
import { oneFire } from './one-fire.ts';
import { openingsOtherwise } from './openings-otherwise.ts';
import { smokeOtherwise } from './smoke-otherwise.ts';
import { waterAndSprinklers } from './water-and-sprinklers.ts';

/** What is said beside every one of them. */
export const FURTHER_LABEL = 'variant, not used in the tally';

/**
 * Readings by methods that stand in no section of the tally, from what the room already has. Every number comes with its
 * working; a reading that does not apply says why.
 *
 * @param tally of the same input
 * @param asked distances and times nobody has recorded; usual ones where nothing is said
 */
export function furtherReadings(
  input: RoomInput,
  tally: RoomTally,
  asked: FurtherAsked = USUAL_FURTHER,
): readonly FurtherReading[] {
  const given = { input, tally, basis: roomBasis(input, { workings: false, missing: [] }), asked };
  return [
    ...loadOtherwise(given),
    ...openingsOtherwise(given),
    ...oneFire(given),
    ...largeRoom(given),
    ...smokeOtherwise(given),
    ...burnoutOtherwise(given),
    ...nextDoor(given),
    ...goodsOtherwise(given),
    ...waterAndSprinklers(given),
  ];
}
