import { randomUUID } from 'node:crypto';
import type { Database } from '../repositories/database.ts';
import type { Clock } from '../clock.ts';
import { Fault } from '../fault.ts';
import { SignInAttemptRepository } from '../repositories/sign-in-attempt-repository.ts';
import { hashToken } from './tokens.ts';

const WINDOW_s = 15 * 60;
const PER_ACCOUNT = 10;
const PER_IP = 60;
const PER_SERVICE_AND_MINUTE = 600;
const SIGN_UPS_PER_IP = 60;
const FIRST_WAIT_s = 30;

/**
 * Holds back guessing. A try counts as failed from the moment it is let through until the password proves right, so
 * that many at once gain nothing. After ten failures the wait doubles with each further one.
 */
export class SignInThrottle {
  private readonly database: Database;
  private readonly clock: Clock;

  constructor(database: Database, clock: Clock) {
    this.database = database;
    this.clock = clock;
  }

  /**
   * Lets one try through and counts it.
   * @param account what is guessed at; a known device has an account of its own, so guesses elsewhere do not lock it out
   * @returns the try's id, for `succeeded`
   * @throws Fault 429 with the time to wait
   */
  reserve(account: string, ip: string): Promise<string> {
    const accountHash = hashToken(account);
    return this.database.transaction(async (statements) => {
      const attempts = new SignInAttemptRepository(statements);
      await attempts.lock(accountHash, ip);
      const now = this.clock.now();
      const counts = await attempts.count(accountHash, ip, now, WINDOW_s);
      if (counts.service >= PER_SERVICE_AND_MINUTE) throw tooMany(60);
      if (counts.ip >= PER_IP) throw tooMany(WINDOW_s);
      if (counts.account >= PER_ACCOUNT && counts.last_at !== null) {
        const wait_s = Math.min(WINDOW_s, FIRST_WAIT_s * 2 ** (counts.account - PER_ACCOUNT));
        const left_s = wait_s - (now.getTime() - counts.last_at.getTime()) / 1000;
        if (left_s > 0) throw tooMany(Math.ceil(left_s));
      }
      const id = randomUUID();
      await attempts.add(id, accountHash, ip, true, now);
      return id;
    });
  }

  async succeeded(id: string): Promise<void> {
    await new SignInAttemptRepository(this.database.statements).markSucceeded(id);
  }

  /** Counts a sign-up. @throws Fault 429 when this network address has made very many */
  reserveSignUp(ip: string): Promise<void> {
    const accountHash = hashToken(`sign-up from ${ip}`);
    return this.database.transaction(async (statements) => {
      const attempts = new SignInAttemptRepository(statements);
      await attempts.lock(accountHash, ip);
      const now = this.clock.now();
      const counts = await attempts.count(accountHash, ip, now, WINDOW_s);
      if (counts.account_all >= SIGN_UPS_PER_IP) throw tooMany(WINDOW_s);
      await attempts.add(randomUUID(), accountHash, ip, false, now);
    });
  }

  async forgetOld(): Promise<void> {
    const dayAgo = new Date(this.clock.now().getTime() - 24 * 3600 * 1000);
    await new SignInAttemptRepository(this.database.statements).removeBefore(dayAgo);
  }
}

function tooMany(wait_s: number): Fault {
  const words = wait_s < 90 ? `${wait_s} seconds` : `${Math.ceil(wait_s / 60)} minutes`;
  return new Fault(
    'too-many',
    'too-many-attempts',
    `There were too many attempts. Nothing was changed; wait ${words} and try again.`,
    { retryAfter_s: wait_s },
  );
}
