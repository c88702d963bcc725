import type { SpreadTallyEvent } from '@embertally/shared/tally/room-tally';

/** One ignition, or the air used up, as it is played. */
export interface PlayedEvent extends Pick<SpreadTallyEvent, 'id' | 'cause'> {
  readonly t_s: number;
  /** The burning entry that radiated most onto it. */
  readonly from: string | null;
}

/** A fire in one room, ready to be played on the plan. */
export interface PlayedFire {
  readonly roomId: string;
  /** What it was worked out from: the same object until the room changes. */
  readonly of: unknown;
  /** In order of time, the first at 0. */
  readonly events: readonly PlayedEvent[];
  readonly flashover_s: number | null;
  /** Nothing happens on the plan after it. */
  readonly end_s: number;
}

/** Two entries with their gap, drawn on the plan. */
export interface ShownGap {
  readonly roomId: string;
  readonly of: unknown;
  readonly from: string;
  readonly to: string;
  /** Clear distance as they stand. */
  readonly gap_m: number;
  /** Null where no gap is enough. */
  readonly enough_m: number | null;
}

export interface PlayState {
  readonly fire: PlayedFire | null;
  readonly at_s: number;
  readonly running: boolean;
  /** Seconds of the fire in one second. */
  readonly speed: number;
  readonly gap: ShownGap | null;
}

/** Calls back before the next picture, with the time in ms; returns what calls it off. */
export type NextFrame = (callback: (now_ms: number) => void) => () => void;

export const SPEEDS = [1, 5, 10, 30, 60, 120] as const;
/** The whole of it is to be seen in about so long, s. */
const WHOLE_S = 20;

const NOTHING: PlayState = { fire: null, at_s: 0, running: false, speed: 1, gap: null };

/** What the plan shows of a fire, moment by moment. Framework-free; React reads it through `useSpreadPlay`. */
export class SpreadPlay {
  #state: PlayState = NOTHING;
  readonly #readers = new Set<() => void>();
  readonly #nextFrame: NextFrame;
  #callOff: (() => void) | null = null;

  constructor(nextFrame: NextFrame) {
    this.#nextFrame = nextFrame;
  }

  readonly get = (): PlayState => this.#state;

  readonly subscribe = (reader: () => void): (() => void) => {
    this.#readers.add(reader);
    return () => this.#readers.delete(reader);
  };

  /** Puts a fire on the plan, standing still. The same fire stays at the speed that was chosen. */
  show(fire: PlayedFire, at_s = 0): void {
    this.pause();
    const speed = this.#state.fire === fire ? this.#state.speed : usualSpeed(fire.end_s);
    this.#set({ ...NOTHING, fire, speed, at_s: within(at_s, fire) });
  }

  showGap(gap: ShownGap): void {
    this.pause();
    this.#set({ ...NOTHING, gap });
  }

  /** Takes everything off the plan. */
  hide(): void {
    this.pause();
    if (this.#state !== NOTHING) this.#set(NOTHING);
  }

  /** Lets time run; from the start when it is over. */
  run(): void {
    const { fire, running, at_s } = this.#state;
    if (fire === null || running) return;
    this.#set({ ...this.#state, running: true, at_s: at_s >= fire.end_s ? 0 : at_s });
    let before_ms: number | null = null;
    const frame = (now_ms: number): void => {
      const state = this.#state;
      if (state.fire === null) return;
      const at = state.at_s + ((now_ms - (before_ms ?? now_ms)) / 1000) * state.speed;
      before_ms = now_ms;
      const over = at >= state.fire.end_s;
      this.#callOff = over ? null : this.#nextFrame(frame);
      this.#set({ ...state, at_s: within(at, state.fire), running: !over });
    };
    this.#callOff = this.#nextFrame(frame);
  }

  pause(): void {
    this.#callOff?.();
    this.#callOff = null;
    if (this.#state.running) this.#set({ ...this.#state, running: false });
  }

  seek(at_s: number): void {
    const { fire } = this.#state;
    if (fire !== null) this.#set({ ...this.#state, at_s: within(at_s, fire) });
  }

  /** To the next moment at which something happens, or the one before; stands still there. */
  step(way: 'on' | 'back'): void {
    this.pause();
    const { fire, at_s } = this.#state;
    if (fire === null) return;
    const times = fire.events.map((event) => event.t_s);
    const next = way === 'on' ? times.find((t) => t > at_s) : times.findLast((t) => t < at_s);
    this.seek(next ?? (way === 'on' ? fire.end_s : 0));
  }

  setSpeed(speed: number): void {
    this.#set({ ...this.#state, speed });
  }

  #set(state: PlayState): void {
    this.#state = state;
    for (const reader of this.#readers) reader();
  }
}

const within = (at_s: number, fire: PlayedFire): number => Math.min(fire.end_s, Math.max(0, at_s));

function usualSpeed(end_s: number): number {
  return SPEEDS.find((speed) => end_s / speed <= WHOLE_S) ?? SPEEDS[SPEEDS.length - 1] ?? 1;
}
