import type { OrganisationRole } from '@embertally/shared/policy/policy';
import { SqlRepository } from './sql-repository.ts';

export interface SessionRow {
  readonly token_hash: string;
  readonly person_id: string;
  readonly member_id: string;
  readonly created_at: Date;
  readonly expires_at: Date;
}

/** A session with the person and membership it stands for, read in one go because every request needs it. */
export interface SessionWithActor extends SessionRow {
  readonly name: string;
  readonly organisation_id: string;
  readonly organisation_name: string;
  readonly organisation_role: OrganisationRole;
}

/** Sessions by the hash of their token. */
export class SessionRepository extends SqlRepository {
  find(tokenHash: string): Promise<SessionWithActor | null> {
    return this.row<SessionWithActor>(
      `SELECT s.token_hash, s.person_id, s.member_id, s.created_at, s.expires_at, p.name,
              m.organisation_id, o.name AS organisation_name, m.role AS organisation_role
       FROM session s
       JOIN person p ON p.id = s.person_id
       JOIN member m ON m.id = s.member_id AND m.person_id = s.person_id
       JOIN organisation o ON o.id = m.organisation_id
       WHERE s.token_hash = $1`,
      [tokenHash],
    );
  }

  ofPerson(personId: string): Promise<readonly SessionRow[]> {
    return this.rows<SessionRow>(
      'SELECT token_hash, person_id, member_id, created_at, expires_at FROM session WHERE person_id = $1',
      [personId],
    );
  }

  async add(row: SessionRow): Promise<void> {
    await this.rows(
      'INSERT INTO session (token_hash, person_id, member_id, created_at, expires_at) VALUES ($1, $2, $3, $4, $5)',
      [row.token_hash, row.person_id, row.member_id, row.created_at, row.expires_at],
    );
  }

  async extend(tokenHash: string, expiresAt: Date): Promise<void> {
    await this.rows('UPDATE session SET expires_at = $2 WHERE token_hash = $1', [tokenHash, expiresAt]);
  }

  async remove(tokenHash: string): Promise<void> {
    await this.rows('DELETE FROM session WHERE token_hash = $1', [tokenHash]);
  }

  async removeOfPerson(personId: string): Promise<void> {
    await this.rows('DELETE FROM session WHERE person_id = $1', [personId]);
  }

  async removeExpired(now: Date): Promise<void> {
    await this.rows('DELETE FROM session WHERE expires_at <= $1', [now]);
  }
}
