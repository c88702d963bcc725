import { hash, verify } from '@node-rs/argon2';
import { Fault } from '../fault.ts';

export interface HashCost {
  readonly memory_KiB: number;
  readonly passes: number;
}

/** argon2id in the library's numbering; its enum is not there at run time under isolated modules. */
const ARGON2ID = 2;
const AT_ONCE = 4;
const WAITING = 50;

/**
 * Hashes and checks passwords with argon2id. Four at once, fifty waiting, then a refusal: a crowd at the door must not
 * take the memory of everybody inside.
 */
export class PasswordHashes {
  private readonly cost: HashCost;
  private readonly waiting: (() => void)[] = [];
  private running = 0;
  /** Checked when there is no such account, so that the answer takes as long. */
  private readonly nobody: Promise<string>;

  constructor(cost: HashCost) {
    this.cost = cost;
    this.nobody = this.make('a password nobody has');
    // A failure shows where the hash is awaited; without this it would also be an unhandled rejection.
    this.nobody.catch(() => undefined);
  }

  make(password: string): Promise<string> {
    return this.inTurn(() =>
      hash(password, {
        algorithm: ARGON2ID,
        memoryCost: this.cost.memory_KiB,
        timeCost: this.cost.passes,
        parallelism: 1,
      }),
    );
  }

  /** @param stored the stored hash, or null when there is no such account: the work is the same, the answer false */
  async check(password: string, stored: string | null): Promise<boolean> {
    const against = stored ?? (await this.nobody);
    const right = await this.inTurn(() => verify(against, password));
    return right && stored !== null;
  }

  /** Whether a stored hash was made with less work than is now asked for. */
  isWeak(stored: string): boolean {
    const cost = /\$m=(\d+),t=(\d+),p=/.exec(stored);
    return cost === null || Number(cost[1]) < this.cost.memory_KiB || Number(cost[2]) < this.cost.passes;
  }

  private async inTurn<T>(work: () => Promise<T>): Promise<T> {
    if (this.running >= AT_ONCE) {
      if (this.waiting.length >= WAITING) {
        throw new Fault(
          'too-many',
          'sign-ins-busy',
          'Too many people are signing in at this moment. Nothing was changed; try again in a few seconds.',
          { retryAfter_s: 5 },
        );
      }
      await new Promise<void>((turn) => this.waiting.push(turn));
    } else {
      this.running += 1;
    }
    try {
      return await work();
    } finally {
      const next = this.waiting.shift();
      if (next === undefined) this.running -= 1;
      else next();
    }
  }
}
