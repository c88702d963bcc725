import type { Clock } from '../clock.ts';
import { Fault } from '../fault.ts';

const BURST = 60;
const PER_SECOND = 15;
const KEPT = 10_000;

interface Bucket {
  left: number;
  at: number;
}

/** How often one person may ask this process for costly work: a bucket per person, filled at a steady rate. */
export class RequestRate {
  private readonly buckets = new Map<string, Bucket>();
  private readonly clock: Clock;

  constructor(clock: Clock) {
    this.clock = clock;
  }

  /** @throws Fault 429 when the person's bucket is empty */
  take(key: string): void {
    const now = this.clock.now().getTime();
    const bucket = this.buckets.get(key) ?? { left: BURST, at: now };
    bucket.left = Math.min(BURST, bucket.left + (Math.max(0, now - bucket.at) / 1000) * PER_SECOND);
    bucket.at = now;
    this.buckets.delete(key);
    this.buckets.set(key, bucket);
    for (const oldest of this.buckets.keys()) {
      if (this.buckets.size <= KEPT) break;
      this.buckets.delete(oldest);
    }
    if (bucket.left < 1) {
      throw new Fault(
        'too-many',
        'too-often',
        'This was asked for very often. Nothing was changed; wait a second and try again.',
        {
          retryAfter_s: 1,
        },
      );
    }
    bucket.left -= 1;
  }
}
