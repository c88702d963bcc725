import { jetRise, jetVelocity } from './jet-under-ceiling.ts';

/** Error of one step that is let pass, K. */
const TOLERANCE_K = 2e-4;
const SHORTEST_S = 1e-3;
/** Below this share of its time constant a device follows the gas in a straight line. */
const STILL = 1e-9;
/** Points nearer than this are a jump of the curve. */
const JUMP_S = 1e-6;
/** At most about this many steps, however long the curve is. */
const MOST_STEPS = 5_000;
const HALVINGS = 48;

export interface Device {
  /** (m s)^½ */
  readonly rti: number;
  /** Rise at which it responds, K, above 0. */
  readonly needed: number;
  /** Ceiling above the fuel and distance from the axis, m. */
  readonly height: number;
  readonly radius: number;
  /** What the rate is multiplied by for a wall or corner. */
  readonly factor: number;
}

export interface Response {
  /** s; null where it never responds. */
  readonly time: number | null;
  /** Heat release rate then, kW. */
  readonly rate: number | null;
  /** Highest rise of the device until then, K. */
  readonly hottest: number;
}

/**
 * dT/dt = √u (T_g − T)/RTI along a curve of straight pieces. Each step takes the gas as rising evenly and its velocity
 * as that of the middle, which has a closed form; a step and its two halves are compared, and the length follows their difference.
 */
export function heatDevice(t: readonly number[], Q: readonly number[], device: Device): Response {
  let rise = 0;
  let hottest = 0;
  let step = 1;
  const shortest = Math.max(SHORTEST_S, (t[t.length - 1]! - t[0]!) / MOST_STEPS);
  for (let i = 1; i < t.length; i += 1) {
    const from = t[i - 1]!;
    const to = t[i]!;
    if (to - from < JUMP_S) continue;
    const slope = (Q[i]! - Q[i - 1]!) / (to - from);
    const rateAt = (time: number): number => Q[i - 1]! + slope * (time - from);
    const strengthAt = (time: number): number => device.factor * Math.max(0, rateAt(time));
    const gasAt = (time: number): number => jetRise(strengthAt(time), device.height, device.radius);
    /** The device after a stretch in which the gas goes evenly from one rise to another. */
    const after = (time: number, length: number, start: number, before: number, end: number): number => {
      const velocity = jetVelocity(strengthAt(time + length / 2), device.height, device.radius);
      const x = (Math.sqrt(velocity) / device.rti) * length;
      if (x < STILL) return start + x * ((before + end) / 2 - start);
      return end + ((end - before) / x) * Math.expm1(-x) + (start - before) * Math.exp(-x);
    };
    let gas = gasAt(from);
    for (let time = from; time < to;) {
      const length = Math.min(step, to - time);
      const half = length / 2;
      const [gasHalf, gasEnd] = [gasAt(time + half), gasAt(time + length)];
      const whole = after(time, length, rise, gas, gasEnd);
      const halves = after(time + half, half, after(time, half, rise, gas, gasHalf), gasHalf, gasEnd);
      const error = Math.abs(halves - whole) / 3;
      const fits = error <= TOLERANCE_K || length <= shortest;
      if (fits) {
        const next = halves + (halves - whole) / 3;
        if (next >= device.needed) {
          const isReached = (tau: number): boolean => after(time, tau, rise, gas, gasAt(time + tau)) >= device.needed;
          const reached = time + crossing(isReached, length);
          return { time: reached, rate: rateAt(reached), hottest: device.needed };
        }
        rise = next;
        hottest = Math.max(hottest, rise);
        time = to - time - length <= shortest / 1000 ? to : time + length;
        gas = gasEnd;
      }
      const change = error > 0 ? 0.9 * Math.cbrt(TOLERANCE_K / error) : 4;
      step = Math.max(shortest, length * Math.min(4, Math.max(0.2, change)));
    }
  }
  return { time: null, rate: null, hottest };
}

/** Shortest length at which `reached` holds, by halving; the whole length when it holds only there. */
function crossing(reached: (length: number) => boolean, whole: number): number {
  let low = 0;
  let high = whole;
  for (let i = 0; i < HALVINGS; i += 1) {
    const middle = (low + high) / 2;
    if (reached(middle)) high = middle;
    else low = middle;
  }
  return high;
}
