import { describe, expect, it } from 'vitest';
import { roomHeightLever, storageHeightLever } from '@embertally/shared/questions/height-lever';
import { openingLever, type OpeningVaried } from '@embertally/shared/questions/opening-lever';
import { READINGS, type ReadingName } from '@embertally/shared/questions/reading';
import { whatChanges } from '@embertally/shared/questions/what-changes';
import { estimateRoom } from '@embertally/shared/tally/estimate-room';
import type { RoomInput } from '@embertally/shared/tally/room-input';
import { expectFinite } from '../tally/expect-finite.ts';
import { SCENERY_DOCK } from '../tally/scenery-dock.ts';

function opening(input: RoomInput, place: number | null, varied: OpeningVaried) {
  const lever = openingLever(input, place, varied);
  if (!lever) throw new Error('There is such an opening.');
  return lever;
}
const CLOSED: RoomInput = { ...SCENERY_DOCK, room: { ...SCENERY_DOCK.room, openings: [] } };

describe('what changes a reading', () => {
  it('gives a value at which the tally itself reads otherwise', () => {
    const lever = opening(SCENERY_DOCK, 0, 'width');
    const { estimate, before, after } = whatChanges(lever, 'governed-by', 'less');
    if (estimate.value === null) throw new Error('There is an answer.');
    expect(estimateRoom(lever.apply(estimate.value)).growth.governedBy).toBe('openings');
    expect(estimateRoom(lever.apply(estimate.value + 0.001)).growth.governedBy).toBe('fuel');
    expect([before.state, after.state]).toEqual(['the fuel governs', 'the openings govern']);
  });

  it('says with the range that there is no answer', () => {
    const { estimate } = whatChanges(opening(SCENERY_DOCK, 0, 'width'), 'governed-by', 'more');
    expect(estimate).toMatchObject({
      value: null,
      never: 'No answer between 2 and 12 m. What holds the fire down: the fuel governs, all the way.',
    });
  });

  it('finds the further opening that ends a closed room', () => {
    const { estimate, after } = whatChanges(opening(CLOSED, null, 'width'), 'governed-by', 'more');
    expect(estimate.value).toBeLessThanOrEqual(0.25 + 0.001);
    expect(after.state).not.toBe('no opening feeds the fire');
  });

  it('finds a number of openings, whole', () => {
    const { estimate } = whatChanges(opening(SCENERY_DOCK, 0, 'number'), 'governed-by', 'less');
    expect(estimate.value).toBe(0);
  });

  it('tells both sides of the leap of the burn-out', () => {
    const heavy: RoomInput = {
      ...SCENERY_DOCK,
      contents: SCENERY_DOCK.contents.map((entry) => ({ ...entry, count: 150 })),
    };
    const { estimate, before, after } = whatChanges(opening(heavy, 0, 'width'), 'burnout', 'more');
    if (estimate.value === null) throw new Error('A wider door makes the fuel control the burn-out.');
    expect([before.state, after.state]).toEqual([
      'the openings control the burn-out',
      'the fuel controls the burn-out',
    ]);
    // 0.2e-3 q_t/O = t_lim with O = w 2.4^1.5/336, so w = 0.2e-3 q_t 336/(t_lim 2.4^1.5); m q A_f / A_t, 20 min.
    const q_t = (0.8 * 150 * (18 * 16.8 + 2 * 16.3)) / 336;
    expect(estimate.value).toBeCloseTo((0.2e-3 * q_t * 336) / ((20 / 60) * 2.4 ** 1.5), 2);
    expect(estimate.warnings.map(({ code }) => code)).toContain('JUMP');
  });

  it('follows goods stored higher: a bound on the load is passed in proportion', () => {
    const bounded: RoomInput = { ...SCENERY_DOCK, limits: [{ quantity: 'load_total_MJ', bound: 20_000 }] };
    const lever = storageHeightLever(bounded, 'a');
    if (!lever) throw new Error('The stack has a height.');
    const { estimate, after } = whatChanges(lever, 'limits', 'more');
    expect(estimate.value).toBeCloseTo((2 * 0.9 * 20_000) / 13_400, 2);
    expect(after.state).toBe('near');
  });

  it('stays inside the room: no goods above the ceiling, no opening above the wall', () => {
    expect(storageHeightLever(SCENERY_DOCK, 'a')?.most).toBe(3.6);
    expect(opening(SCENERY_DOCK, 0, 'height').most).toBe(3.6);
    expect(roomHeightLever(SCENERY_DOCK).least).toBe(2.4);
  });

  it('knows when there is nothing to vary', () => {
    expect(openingLever(SCENERY_DOCK, 7, 'width')).toBeUndefined();
    expect(storageHeightLever(SCENERY_DOCK, 'nobody')).toBeUndefined();
  });

  it('reads and searches every reading in odd rooms without a number that is none', () => {
    const rooms: RoomInput[] = [
      SCENERY_DOCK,
      CLOSED,
      { ...SCENERY_DOCK, contents: [] },
      {
        room: {
          name: 'Bare',
          ring_m: [
            [0, 0],
            [0.01, 0],
            [0.01, 0.01],
          ],
          height_m: 2,
        },
        contents: [],
      },
    ];
    for (const room of rooms) {
      for (const name of Object.keys(READINGS) as ReadingName[]) {
        const answer = whatChanges(opening(room, null, 'width'), name, 'more');
        expectFinite(answer);
        expect(answer.estimate.value === null).toBe(answer.estimate.never !== undefined);
      }
      expectFinite(whatChanges(roomHeightLever(room), 'smoke-layer', 'more'));
    }
  }, 30_000);
});
