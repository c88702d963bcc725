import type { RoomInput, RoomInputOpening } from '../tally/room-input.ts';
import type { Lever } from './lever.ts';

export type OpeningVaried = 'width' | 'height' | 'number';

const MILLIMETRE = 0.001;
const LEAST_M = 0.01;
const MOST_ALIKE = 20;
/** An opening that is not there yet: as high as a usual door, open, to the outside. */
const FURTHER_HEIGHT_M = 2.1;

/**
 * The width, the height or the number of one opening. Widths go up to the longest wall of the room, heights from the sill to
 * the ceiling, numbers to 20 alike.
 *
 * @param place position in the room's list of openings; null: a further one, open to the outside, that is not there yet
 * @returns undefined when the room has no such opening
 */
export function openingLever(input: RoomInput, place: number | null, varied: OpeningVaried): Lever | undefined {
  const openings = input.room.openings ?? [];
  const opening = place === null ? furtherOpening(input) : openings[place];
  if (!opening) return undefined;
  const others = openings.filter((_, index) => index !== place);
  const withThese = (these: readonly RoomInputOpening[]): RoomInput => ({
    ...input,
    room: { ...input.room, openings: [...others, ...these] },
  });
  const name = nameOf(opening, place);
  if (varied === 'number') {
    return {
      title: `Number of openings like ${name}`,
      output: 'alike',
      unit: '',
      now: place === null ? 0 : 1,
      least: 0,
      most: MOST_ALIKE,
      tolerance: 1,
      whole: true,
      apply: (n) => withThese(Array.from({ length: n }, () => opening)),
    };
  }
  const isWidth = varied === 'width';
  const most = isWidth ? longestWall(input) : input.room.height_m - (opening.sill_m ?? 0);
  const now = place === null && isWidth ? 0 : isWidth ? opening.width_m : opening.height_m;
  return {
    title: `${isWidth ? 'Width' : 'Height'} of ${name}`,
    output: isWidth ? 'width' : 'openingHeight',
    unit: 'm',
    now,
    least: place === null && isWidth ? 0 : Math.min(LEAST_M, now),
    most: Math.max(most, now),
    tolerance: MILLIMETRE,
    apply: (x) => withThese(x > 0 ? [isWidth ? { ...opening, width_m: x } : { ...opening, height_m: x }] : []),
  };
}

function furtherOpening({ room }: RoomInput): RoomInputOpening {
  return { width_m: 1, height_m: Math.min(FURTHER_HEIGHT_M, room.height_m), state: 'open', leads_to: 'outside' };
}

function nameOf({ label, kind }: RoomInputOpening, place: number | null): string {
  if (place === null) return 'a further opening';
  const own = label?.trim() ?? '';
  return own === '' ? `${kind ?? 'opening'} ${place + 1}` : own;
}

function longestWall({ room }: RoomInput): number {
  const ring = room.ring_m;
  return ring.reduce((longest, [x, y], i) => {
    const [nextX, nextY] = ring[(i + 1) % ring.length] ?? [x, y];
    return Math.max(longest, Math.hypot(nextX - x, nextY - y));
  }, 0);
}
