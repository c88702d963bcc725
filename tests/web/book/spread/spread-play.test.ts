import { spreadMoment } from '@embertally/web/src/book/spread/spread-moment.ts';
import { type PlayedFire, SpreadPlay } from '@embertally/web/src/book/spread/spread-play.ts';
import { describe, expect, it } from 'vitest';

/** Three entries: the second lights after 100 s, the third with flashover after 150 s, and the air is used up at 180 s. */
const fire: PlayedFire = {
  roomId: 'room',
  of: {},
  events: [
    { id: 'a', t_s: 0, cause: 'first', from: null },
    { id: 'b', t_s: 100, cause: 'radiation', from: 'a' },
    { id: 'c', t_s: 150, cause: 'flashover', from: null },
    { id: 'd', t_s: 150, cause: 'flashover', from: null },
    { id: null, t_s: 180, cause: 'starved', from: null },
  ],
  flashover_s: 150,
  end_s: 200,
};

/** A clock that draws pictures when it is told to. */
function pictures() {
  let waiting: ((now_ms: number) => void) | null = null;
  let now_ms = 5000;
  return {
    play: new SpreadPlay((callback) => {
      waiting = callback;
      return () => {
        waiting = null;
      };
    }),
    draw: (after_ms: number) => {
      now_ms += after_ms;
      const next = waiting;
      waiting = null;
      next?.(now_ms);
    },
    isWaiting: () => waiting !== null,
  };
}

describe('a fire on the plan', () => {
  it('runs as fast as it is told to and stands still at its end', () => {
    const { play, draw, isWaiting } = pictures();
    play.show(fire);
    play.setSpeed(30);
    play.run();
    draw(16);
    draw(1000);
    expect(play.get().at_s).toBeCloseTo(30, 9);
    draw(10_000);
    expect(play.get()).toMatchObject({ at_s: 200, running: false });
    expect(isWaiting()).toBe(false);
  });

  it('takes about twenty seconds unless told otherwise', () => {
    const { play } = pictures();
    play.show(fire);
    expect(play.get().speed).toBe(10);
  });

  it('begins again when it is run after its end', () => {
    const { play } = pictures();
    play.show(fire, 200);
    play.run();
    expect(play.get()).toMatchObject({ at_s: 0, running: true });
  });

  it('goes from event to event and stands still there', () => {
    const { play, isWaiting } = pictures();
    play.show(fire);
    play.run();
    const seen = [0, 1, 2, 3, 4].map(() => {
      play.step('on');
      return play.get().at_s;
    });
    expect(seen).toEqual([100, 150, 180, 200, 200]);
    play.step('back');
    play.step('back');
    expect(play.get().at_s).toBe(150);
    expect(isWaiting()).toBe(false);
  });

  it('never leaves its time', () => {
    const { play } = pictures();
    play.show(fire);
    play.seek(-5);
    expect(play.get().at_s).toBe(0);
    play.seek(1e6);
    expect(play.get().at_s).toBe(200);
  });

  it('keeps the chosen speed when another moment of it is shown', () => {
    const { play } = pictures();
    play.show(fire);
    play.setSpeed(60);
    play.show(fire, 100);
    expect(play.get()).toMatchObject({ speed: 60, at_s: 100, running: false });
  });

  it('gives way to a gap, and everything goes when it is taken off', () => {
    const { play, isWaiting } = pictures();
    play.show(fire);
    play.run();
    play.showGap({ roomId: 'room', of: fire.of, from: 'a', to: 'b', gap_m: 0.4, enough_m: 1.8 });
    expect(play.get().fire).toBeNull();
    expect(isWaiting()).toBe(false);
    play.hide();
    expect(play.get()).toMatchObject({ fire: null, gap: null, running: false });
  });
});

describe('a moment of a fire', () => {
  it('tells what burns in which order, what was just lit and what comes next', () => {
    const at = spreadMoment(fire, 110);
    expect(at.lit).toEqual([
      { id: 'a', order: 1, stage: 'burning' },
      { id: 'b', order: 2, stage: 'just lit' },
    ]);
    expect(at.latest?.id).toBe('b');
    expect(at.next.map((event) => event.id)).toEqual(['c', 'd']);
    expect(at.flashedOver).toBe(false);
  });

  it('knows flashover, and that nothing comes after the last event', () => {
    const at = spreadMoment(fire, 185);
    expect(at.flashedOver).toBe(true);
    expect(at.lit).toHaveLength(4);
    expect(at.latest?.cause).toBe('starved');
    expect(at.next).toEqual([]);
  });
});
