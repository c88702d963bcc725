import { jetUnderCeiling, type CeilingJet } from './jet-under-ceiling.ts';

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
    const jetAt = (time: number): CeilingJet =>
      jetUnderCeiling(device.factor * Math.max(0, rateAt(time)), device.height, device.radius);
    const after = (time: number, length: number, start: number): number => {
      const before = jetAt(time).rise;
      const end = jetAt(time + length).rise;
      const x = (Math.sqrt(jetAt(time + length / 2).velocity) / device.rti) * length;
      if (x < STILL) return start + x * ((before + end) / 2 - start);
      return end + ((end - before) / x) * Math.expm1(-x) + (start - before) * Math.exp(-x);
    };
    for (let time = from; time < to;) {
      const length = Math.min(step, to - time);
      const whole = after(time, length, rise);
      const halves = after(time + length / 2, length / 2, after(time, length / 2, rise));
      const error = Math.abs(halves - whole) / 3;
      const fits = error <= TOLERANCE_K || length <= shortest;
      if (fits) {
        const next = halves + (halves - whole) / 3;
        if (next >= device.needed) {
          const reached = time + crossing((tau) => after(time, tau, rise) >= device.needed, length);
          return { time: reached, rate: rateAt(reached), hottest: device.needed };
        }
        rise = next;
        hottest = Math.max(hottest, rise);
        time = to - time - length <= shortest / 1000 ? to : time + length;
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
