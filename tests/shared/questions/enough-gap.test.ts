import { describe, expect, it } from 'vitest';
import { enoughGap } from '@embertally/shared/questions/enough-gap';
import type { RoomInput, RoomInputEntry } from '@embertally/shared/tally/room-input';
import { expectFinite } from '../tally/expect-finite.ts';

const entry = (id: string, x: number, more: Partial<RoomInputEntry>): RoomInputEntry => ({
  id,
  count: 1,
  parts: [],
  x_m: x,
  y_m: 30,
  height_m: 1,
  growth: 'fast',
  radiative_fraction: 0.35,
  ...more,
});
const heat = (MJ: number) => [{ mass_kg: MJ / 20, net_heat_MJ_kg: 20, cellulosic: false }];
const A = entry('a', 30, { parts: heat(800), peak_kW: 2500, width_m: 1.4, depth_m: 1.4, ignition_class: 'hard' });
const B = (x: number) =>
  entry('b', x, { parts: heat(300), peak_kW: 1500, width_m: 1, depth_m: 1, ignition_class: 'normal' });
/** A hall: too large for a hot layer or flashover, its openings far too wide to hold the fire down. */
const hall = (...contents: RoomInputEntry[]): RoomInput => ({
  room: {
    name: 'Hall',
    ring_m: [
      [0, 0],
      [60, 0],
      [60, 60],
      [0, 60],
    ],
    height_m: 8,
    openings: [{ width_m: 10, height_m: 5, state: 'open', leads_to: 'outside' }],
  },
  contents,
});

function answerOf(input: RoomInput, from = 'a', to = 'b') {
  const result = enoughGap(input, from, to);
  if (!('answer' in result)) throw new Error(result.why);
  return result.answer;
}
const why = (input: RoomInput, from = 'a', to = 'b') => {
  const result = enoughGap(input, from, to);
  return 'why' in result ? result.why : 'answered';
};

describe('what gap is enough', () => {
  it('is what the pair of the specification has: 1.405 and 2.277 m, for ever 3.032 m', () => {
    const { gap, justNot, enough, longExposure, standing } = answerOf(hall(A, B(32.5)));
    expect(gap.value).toBeCloseTo(1.3, 3);
    expect(justNot.value).toBeCloseTo(1.405, 2);
    expect(enough.value).toBeCloseTo(2.277, 2);
    expect(longExposure.value).toBeCloseTo(3.032, 2);
    expect(standing).toBe('too small');
    expectFinite(enough);
    expect(enough.inputs?.find(({ name }) => name === 'k_f')?.value).toBe(2);
  });

  it('is told for a pair that stands far enough apart as well, and not beyond 10 m', () => {
    expect(answerOf(hall(A, B(35))).standing).toBe('enough');
    expect(why(hall(A, B(45)))).toMatch(/more than 10 m apart/);
  });

  it('says what is lacking', () => {
    expect(why(hall(A), 'a', 'b')).toMatch(/two entries of this room/);
    expect(why(hall(A, B(32)), 'a', 'a')).toMatch(/two different entries/);
    expect(why(hall(A, { ...B(32), x_m: null }))).toMatch(/place on the plan/);
    expect(why(hall(A, { ...B(32), enclosure: 'cabinet' }))).toMatch(/enclosed/);
    expect(why(hall({ ...A, parts: [] }, B(32)))).toMatch(/does not burn by itself/);
    expect(why(hall(A, { ...B(32), parts: [] }))).toMatch(/no heat to give/);
  });
});
