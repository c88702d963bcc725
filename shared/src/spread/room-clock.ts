import type { Polynomial } from './piece-clock.ts';

/** Why the room's clock stopped before the burning time it was sent to. */
export type ClockStop = 'flashover' | 'starved' | 'time';

interface Marks {
  /** Rate the openings can feed, kW; Infinity: nothing holds the fire back. */
  cap_kW: number;
  flashover_kW: number;
  /** Heat that the air allows, kJ. */
  heat_kJ: number;
  /** s */
  time_s: number;
}

/**
 * The fire of the whole room. The entries ask for a rate Q(T); the openings feed no more than the cap, and the curves are
 * stretched, dT = min(1, cap/Q) dt, so that no heat is lost. Time and heat follow in closed form from the polynomial
 * that Q is between two changes.
 */
export class RoomClock {
  /** Time since first ignition, s. */
  t = 0;
  /** Burning time, s. */
  T = 0;
  /** Heat released, kJ. */
  heat = 0;
  peak = 0;
  atCap_s = 0;
  /** Room curve, `[s, kW]`, straight lines between. */
  readonly points: [number, number][] = [];
  /** Heat released at each point, kJ. */
  readonly heats: number[] = [];
  private c0 = 0;
  private c1 = 0;
  private c2 = 0;

  constructor(private readonly marks: Marks) {}

  /** What the entries ask for now, kW. */
  get demand(): number {
    return this.demandAt(this.T);
  }

  get cap(): number {
    return this.marks.cap_kW;
  }

  /** From now on the entries ask for this. */
  follow({ c0, c1, c2 }: Polynomial): void {
    [this.c0, this.c1, this.c2] = [c0, c1, c2];
    this.record();
  }

  /** After flashover: other openings, and no second one. */
  flashed(cap_kW: number): void {
    this.marks.cap_kW = cap_kW;
    this.marks.flashover_kW = Infinity;
    this.record();
  }

  record(): void {
    const rate = Math.min(this.demand, this.marks.cap_kW);
    const last = this.points.at(-1);
    if (last?.[0] === this.t && last[1] === rate) return;
    this.points.push([this.t, rate]);
    this.heats.push(this.heat);
    if (rate > this.peak) this.peak = rate;
  }

  /** Runs to a burning time without a change of any curve on the way; stops at the first mark it meets. */
  runTo(T: number): ClockStop | undefined {
    while (this.T < T) {
      const stop = this.runPart(this.capCrossing(T));
      if (stop !== undefined) return stop;
    }
    return undefined;
  }

  private runPart(to: number): ClockStop | undefined {
    const { marks, T: from } = this;
    if (Math.min(this.demand, marks.cap_kW) >= marks.flashover_kW) return 'flashover';
    const capped = this.demandAt((from + to) / 2) > marks.cap_kW;
    let end = to;
    let stop: ClockStop | undefined;
    if (Math.min(this.demandAt(end), marks.cap_kW) >= marks.flashover_kW) {
      end = firstAt((T) => this.demandAt(T) >= marks.flashover_kW, from, end);
      stop = 'flashover';
    }
    if (this.heat + this.heatBetween(from, end) >= marks.heat_kJ) {
      end = firstAt((T) => this.heat + this.heatBetween(from, T) >= marks.heat_kJ, from, end);
      stop = 'starved';
    }
    if (this.t + this.timeTo(end, capped) >= marks.time_s) {
      end = firstAt((T) => this.t + this.timeTo(T, capped) >= marks.time_s, from, end);
      stop = 'time';
    }
    const time = this.timeTo(end, capped);
    this.heat += this.heatBetween(from, end);
    this.t = stop === 'time' ? marks.time_s : this.t + time;
    this.T = end;
    if (capped) this.atCap_s += time;
    this.record();
    return stop;
  }

  /** Clock time to a burning time ahead, s. */
  private timeTo(T: number, capped: boolean): number {
    return capped ? this.heatBetween(this.T, T) / this.marks.cap_kW : T - this.T;
  }

  private demandAt(T: number): number {
    return Math.max(0, this.c0 + T * (this.c1 + T * this.c2));
  }

  private heatBetween(from: number, to: number): number {
    const middle = (from + to) / 2;
    const half = (to - from) / 2;
    const rate = this.c0 + middle * (this.c1 + middle * this.c2);
    return Math.max(0, 2 * half * (rate + (this.c2 * half * half) / 3));
  }

  /** The burning time at which the rate passes the cap, if it does before `to`. */
  private capCrossing(to: number): number {
    const cap = this.marks.cap_kW;
    const above = this.demandAt(this.T) > cap;
    if (above === this.demandAt(to) > cap) return to;
    return firstAt((T) => this.demandAt(T) > cap !== above, this.T, to);
  }
}

const HALVINGS = 60;

/** The first place between `from` and `to` where `reached` holds; it holds at `to`. */
function firstAt(reached: (x: number) => boolean, from: number, to: number): number {
  let [low, high] = [from, to];
  for (let i = 0; i < HALVINGS; i += 1) {
    const middle = (low + high) / 2;
    if (middle <= low || middle >= high) break;
    if (reached(middle)) high = middle;
    else low = middle;
  }
  return high;
}
