const FIRST_S = 1;
const LONGEST_S = 60;

/**
 * Seconds to wait before trying again: 1, 2, 4 … up to 60, each drawn between half and the whole, so that many tablets
 * back in range do not all knock at once.
 * @param attempt 0 for the first failure
 * @param jitter 0 to 1
 */
export function backOff_s(attempt: number, jitter: number): number {
  const whole = Math.min(LONGEST_S, FIRST_S * 2 ** Math.min(attempt, 10));
  return whole * (0.5 + jitter / 2);
}
