import type { OrganisationRole } from '@embertally/shared/policy/policy';
import { SqlRepository } from './sql-repository.ts';

export interface PersonForSignIn {
  readonly id: string;
  readonly password_hash: string;
  readonly member_id: string;
  readonly organisation_id: string;
}

export interface PersonRow {
  readonly id: string;
  readonly name: string;
  readonly email: string;
  readonly units: 'SI' | 'US';
}

export interface MembershipRow {
  readonly id: string;
  readonly organisation_id: string;
  readonly organisation_name: string;
  readonly role: OrganisationRole;
}

/** People, their memberships and the devices they are known on. */
export class PersonRepository extends SqlRepository {
  /** With the membership that was there first, which a new session acts for. */
  forSignIn(email: string): Promise<PersonForSignIn | null> {
    return this.row<PersonForSignIn>(
      `SELECT p.id, p.password_hash, m.id AS member_id, m.organisation_id FROM person p
       JOIN member m ON m.person_id = p.id WHERE p.email = $1 ORDER BY m.created_at, m.id LIMIT 1`,
      [email],
    );
  }

  /** Whether anybody has ever signed up. */
  async hasAny(): Promise<boolean> {
    return (await this.row('SELECT 1 AS yes FROM person LIMIT 1')) !== null;
  }

  find(personId: string): Promise<PersonRow | null> {
    return this.row<PersonRow>('SELECT id, name, email, units FROM person WHERE id = $1', [personId]);
  }

  memberships(personId: string): Promise<readonly MembershipRow[]> {
    return this.rows<MembershipRow>(
      `SELECT m.id, m.organisation_id, o.name AS organisation_name, m.role FROM member m
       JOIN organisation o ON o.id = m.organisation_id WHERE m.person_id = $1 ORDER BY m.created_at, m.id`,
      [personId],
    );
  }

  async add(person: PersonRow & { readonly password_hash: string; readonly created_at: Date }): Promise<void> {
    await this.rows(
      'INSERT INTO person (id, name, email, password_hash, units, created_at) VALUES ($1, $2, $3, $4, $5, $6)',
      [person.id, person.name, person.email, person.password_hash, person.units, person.created_at],
    );
  }

  async addOrganisation(id: string, name: string, at: Date): Promise<void> {
    await this.rows('INSERT INTO organisation (id, name, created_at) VALUES ($1, $2, $3)', [id, name, at]);
  }

  async addMember(member: {
    readonly id: string;
    readonly person_id: string;
    readonly organisation_id: string;
    readonly role: OrganisationRole;
    readonly created_at: Date;
  }): Promise<void> {
    await this.rows(
      'INSERT INTO member (id, person_id, organisation_id, role, created_at) VALUES ($1, $2, $3, $4, $5)',
      [member.id, member.person_id, member.organisation_id, member.role, member.created_at],
    );
  }

  async edit(
    personId: string,
    patch: { readonly name?: string | undefined; readonly units?: 'SI' | 'US' | undefined },
  ): Promise<void> {
    await this.rows('UPDATE person SET name = coalesce($2, name), units = coalesce($3, units) WHERE id = $1', [
      personId,
      patch.name ?? null,
      patch.units ?? null,
    ]);
  }

  async setPasswordHash(personId: string, passwordHash: string): Promise<void> {
    await this.rows('UPDATE person SET password_hash = $2 WHERE id = $1', [personId, passwordHash]);
  }

  async knowsDevice(personId: string | null, tokenHash: string): Promise<boolean> {
    const found = await this.row('SELECT 1 AS known FROM known_device WHERE token_hash = $1 AND person_id = $2', [
      tokenHash,
      personId ?? '00000000-0000-0000-0000-000000000000',
    ]);
    return found !== null;
  }

  async rememberDevice(personId: string, tokenHash: string, at: Date): Promise<void> {
    await this.rows(
      `INSERT INTO known_device (token_hash, person_id, last_used_at) VALUES ($2, $1, $3)
       ON CONFLICT (token_hash, person_id) DO UPDATE SET last_used_at = excluded.last_used_at`,
      [personId, tokenHash, at],
    );
  }
}
