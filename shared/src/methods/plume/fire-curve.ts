import { OutOfRangeError } from '../estimate.ts';

/** Checks a curve given as two lists. @throws OutOfRangeError naming what to change. */
export function checkCurve(t: readonly number[], Q: readonly number[]): void {
  if (t.length !== Q.length) throw new OutOfRangeError('The curve has not as many rates as times.');
  if (t.length < 2) throw new OutOfRangeError('The curve has fewer than two points.');
  for (let i = 1; i < t.length; i += 1) {
    if (!(t[i]! >= t[i - 1]!)) throw new OutOfRangeError(`The times of the curve go back at point ${i + 1}.`);
  }
}

/** First time at which the curve reaches a rate, s; null where it never does. */
export function timeAtRate(t: readonly number[], Q: readonly number[], rate: number): number | null {
  if (Q[0]! >= rate) return t[0]!;
  for (let i = 1; i < t.length; i += 1) {
    if (Q[i]! < rate) continue;
    return t[i - 1]! + ((t[i]! - t[i - 1]!) * (rate - Q[i - 1]!)) / (Q[i]! - Q[i - 1]!);
  }
  return null;
}
