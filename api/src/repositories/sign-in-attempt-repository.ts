import { SqlRepository } from './sql-repository.ts';

export interface AttemptCounts {
  /** Failures on the account in the window and when the last one was. */
  readonly account: number;
  readonly last_at: Date | null;
  readonly ip: number;
  /** Failures of everybody in the last minute. */
  readonly service: number;
  /** Rows on the account in the window, failed or not. */
  readonly account_all: number;
}

/** Tries at passwords, counted in the database so that a restart forgets nothing. */
export class SignInAttemptRepository extends SqlRepository {
  /** Makes tries on one address and from one network address wait for each other until the transaction ends. */
  async lock(accountHash: string, ip: string): Promise<void> {
    await this.rows('SELECT pg_advisory_xact_lock(1, hashtext($1))', [ip]);
    await this.rows('SELECT pg_advisory_xact_lock(2, hashtext($1))', [accountHash]);
  }

  async count(accountHash: string, ip: string, now: Date, window_s: number): Promise<AttemptCounts> {
    const counts = await this.row<AttemptCounts>(
      `SELECT
         (SELECT count(*)::int FROM sign_in_attempt WHERE account_hash = $1 AND failed AND at > $3::timestamptz - make_interval(secs => $4)) AS account,
         (SELECT max(at) FROM sign_in_attempt WHERE account_hash = $1 AND failed AND at > $3::timestamptz - make_interval(secs => $4)) AS last_at,
         (SELECT count(*)::int FROM sign_in_attempt WHERE ip = $2 AND failed AND at > $3::timestamptz - make_interval(secs => $4)) AS ip,
         (SELECT count(*)::int FROM sign_in_attempt WHERE failed AND at > $3::timestamptz - interval '1 minute') AS service,
         (SELECT count(*)::int FROM sign_in_attempt WHERE account_hash = $1 AND at > $3::timestamptz - make_interval(secs => $4)) AS account_all`,
      [accountHash, ip, now, window_s],
    );
    return counts ?? { account: 0, last_at: null, ip: 0, service: 0, account_all: 0 };
  }

  async add(id: string, accountHash: string, ip: string, failed: boolean, at: Date): Promise<void> {
    await this.rows('INSERT INTO sign_in_attempt (id, account_hash, ip, failed, at) VALUES ($1, $2, $3, $4, $5)', [
      id,
      accountHash,
      ip,
      failed,
      at,
    ]);
  }

  async markSucceeded(id: string): Promise<void> {
    await this.rows('UPDATE sign_in_attempt SET failed = false WHERE id = $1', [id]);
  }

  async removeBefore(at: Date): Promise<void> {
    await this.rows('DELETE FROM sign_in_attempt WHERE at < $1', [at]);
  }
}
