import type { Clock } from '../../api/src/clock.ts';

/** The machine's time, moved on by hand. */
export class TestClock implements Clock {
  private ahead_ms = 0;

  readonly now = (): Date => new Date(Date.now() + this.ahead_ms);

  forward(hours: number): void {
    this.ahead_ms += hours * 3600 * 1000;
  }
}
