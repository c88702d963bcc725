import type { Me } from '@embertally/shared/contracts/sessions';
import { canInOrganisation, type OrganisationRole } from '@embertally/shared/policy/policy';
import { randomUUID } from 'node:crypto';
import type { Database } from '../repositories/database.ts';
import type { Actor, Trail } from '../actor.ts';
import type { PasswordHashes } from '../auth/password-hashes.ts';
import { MAX_PASSWORD_BYTES, passwordFault } from '../auth/password-rules.ts';
import type { Sessions } from '../auth/sessions.ts';
import type { SignInThrottle } from '../auth/sign-in-throttle.ts';
import { hashToken, newToken } from '../auth/tokens.ts';
import type { Clock } from '../clock.ts';
import { Fault } from '../fault.ts';
import { PersonRepository } from '../repositories/person-repository.ts';
import { HOUSE_CHAIN, recordEvent } from './audit-record.ts';
import { uniqueViolation } from '../repositories/unique-violation.ts';

export interface SignUpInput {
  readonly id: string;
  readonly organisation_name: string;
  readonly name: string;
  readonly email: string;
  readonly password: string;
}

interface AccountParts {
  readonly database: Database;
  readonly clock: Clock;
  readonly sessions: Sessions;
  readonly hashes: PasswordHashes;
  readonly throttle: SignInThrottle;
}

/** Signing up, in and out, and what a person may change about themselves. */
export class AccountService {
  private readonly parts: AccountParts;

  constructor(parts: AccountParts) {
    this.parts = parts;
  }

  /**
   * Makes an organisation and its first member, an admin. An address that already has an account changes nothing, takes
   * as long and is answered the same.
   */
  async signUp(input: SignUpInput, trail: Trail): Promise<void> {
    const { database, clock, hashes, throttle } = this.parts;
    const fault = passwordFault(
      input.password,
      { email: input.email, name: input.name, organisation: input.organisation_name },
      '/password',
    );
    if (fault !== null) throw Fault.invalid([fault]);
    await throttle.reserveSignUp(trail.ip);
    const passwordHash = await hashes.make(input.password);
    const at = clock.now();
    const actor: Actor = {
      personId: randomUUID(),
      name: input.name,
      memberId: randomUUID(),
      organisationId: input.id,
      organisationName: input.organisation_name,
      organisationRole: 'admin',
    };
    await unlessAddressIsTaken(() =>
      database.transaction(async (statements) => {
        const people = new PersonRepository(statements);
        await people.add({
          id: actor.personId,
          name: input.name,
          email: input.email,
          password_hash: passwordHash,
          units: 'SI',
          created_at: at,
        });
        await people.addOrganisation(input.id, input.organisation_name, at);
        await people.addMember({
          id: actor.memberId,
          person_id: actor.personId,
          organisation_id: input.id,
          role: 'admin',
          created_at: at,
        });
        await recordEvent(statements, {
          chain: { kind: 'organisation', id: input.id },
          actor,
          action: 'organisation.made',
          object: { kind: 'organisation', id: input.id },
          facts: { name: input.organisation_name },
          trail,
          at,
        });
      }),
    );
  }

  /**
   * Makes an account in the acting admin's organisation: how a colleague comes in where no invitation can be mailed.
   * An address that has an account already changes nothing, so doing it twice is the same as doing it once.
   */
  async addMember(
    actor: Actor,
    input: Pick<SignUpInput, 'name' | 'email' | 'password'> & { readonly role: OrganisationRole },
    trail: Trail,
  ): Promise<void> {
    const { database, clock, hashes } = this.parts;
    if (!canInOrganisation(actor.organisationRole, 'organisation.edit')) {
      throw new Fault(
        'forbidden',
        'role-too-small',
        'Only an admin of the organisation can add people; nothing was changed.',
      );
    }
    const fault = passwordFault(
      input.password,
      { email: input.email, name: input.name, organisation: actor.organisationName },
      '/password',
    );
    if (fault !== null) throw Fault.invalid([fault]);
    const passwordHash = await hashes.make(input.password);
    const at = clock.now();
    const [personId, memberId] = [randomUUID(), randomUUID()];
    await unlessAddressIsTaken(() =>
      database.transaction(async (statements) => {
        const people = new PersonRepository(statements);
        await people.add({
          id: personId,
          name: input.name,
          email: input.email,
          password_hash: passwordHash,
          units: 'SI',
          created_at: at,
        });
        await people.addMember({
          id: memberId,
          person_id: personId,
          organisation_id: actor.organisationId,
          role: input.role,
          created_at: at,
        });
        await recordEvent(statements, {
          chain: { kind: 'organisation', id: actor.organisationId },
          actor,
          action: 'member.added',
          object: { kind: 'member', id: memberId },
          facts: { name: input.name, role: input.role },
          trail,
          at,
        });
      }),
    );
  }

  /**
   * Checks a password and begins a session.
   * @param deviceToken what the browser's device cookie holds, if anything
   */
  async signIn(
    input: { readonly email: string; readonly password: string },
    deviceToken: string | null,
    trail: Trail,
  ): Promise<{ me: Me; token: string; deviceToken: string }> {
    const { database, clock, sessions, hashes, throttle } = this.parts;
    if (Buffer.byteLength(input.password) > MAX_PASSWORD_BYTES) {
      throw Fault.invalid([
        {
          pointer: '/password',
          code: 'PASSWORD_TOO_LONG',
          message: `Enter a password of at most ${MAX_PASSWORD_BYTES} bytes.`,
        },
      ]);
    }
    const people = new PersonRepository(database.statements);
    const person = await people.forSignIn(input.email);
    const deviceHash = hashToken(deviceToken ?? 'no device');
    const known = await people.knowsDevice(person?.id ?? null, deviceHash);
    const attempt = await throttle.reserve(known ? `${input.email} on ${deviceHash}` : input.email, trail.ip);
    const right = await hashes.check(input.password, person?.password_hash ?? null);
    const at = clock.now();
    if (person === null || !right) {
      await recordEvent(database.statements, {
        chain: person === null ? HOUSE_CHAIN : { kind: 'organisation', id: person.organisation_id },
        actor: null,
        action: 'session.refused',
        object: { kind: 'account', id: hashToken(input.email) },
        trail,
        at,
      });
      throw new Fault(
        'not-signed-in',
        'wrong-credentials',
        'The e-mail address and the password do not belong together. Nothing was changed; check both and try again.',
      );
    }
    await throttle.succeeded(attempt);
    if (hashes.isWeak(person.password_hash)) {
      await people.setPasswordHash(person.id, await hashes.make(input.password));
    }
    const { token, expiresAt } = await sessions.begin(person.id, person.member_id);
    const device = deviceToken ?? newToken();
    await people.rememberDevice(person.id, hashToken(device), at);
    const me = await this.describe(person.id, person.member_id, expiresAt);
    await recordEvent(database.statements, {
      chain: { kind: 'organisation', id: person.organisation_id },
      actor: actorOf(me),
      action: 'session.begun',
      object: { kind: 'person', id: person.id },
      trail,
      at,
    });
    return { me, token, deviceToken: device };
  }

  async signOut(actor: Actor, token: string, trail: Trail): Promise<void> {
    await this.parts.sessions.end(token);
    await recordEvent(this.parts.database.statements, {
      chain: { kind: 'organisation', id: actor.organisationId },
      actor,
      action: 'session.ended',
      object: { kind: 'person', id: actor.personId },
      trail,
      at: this.parts.clock.now(),
    });
  }

  async describe(personId: string, memberId: string, expiresAt: Date): Promise<Me> {
    const people = new PersonRepository(this.parts.database.statements);
    const person = await people.find(personId);
    if (person === null) throw Fault.notFound();
    const members = await people.memberships(personId);
    return { person, members: [...members], member_id: memberId, session: { expires_at: expiresAt.toISOString() } };
  }

  async edit(
    actor: Actor,
    patch: { readonly name?: string | undefined; readonly units?: 'SI' | 'US' | undefined },
    expiresAt: Date,
  ): Promise<Me> {
    await new PersonRepository(this.parts.database.statements).edit(actor.personId, patch);
    return this.describe(actor.personId, actor.memberId, expiresAt);
  }
}

/** An address that has an account is no fault: whether it has one is told to nobody. */
async function unlessAddressIsTaken(work: () => Promise<void>): Promise<void> {
  try {
    await work();
  } catch (error) {
    const broken = uniqueViolation(error);
    if (broken === 'person_email_unique') return;
    if (broken === 'organisation_pk') {
      throw new Fault(
        'conflict',
        'id-taken',
        'This id has been used already; nothing was changed. Send the form again.',
      );
    }
    throw error;
  }
}

function actorOf(me: Me): Actor {
  const member = me.members.find((one) => one.id === me.member_id);
  if (member === undefined) throw Fault.notFound();
  return {
    personId: me.person.id,
    name: me.person.name,
    memberId: member.id,
    organisationId: member.organisation_id,
    organisationName: member.organisation_name,
    organisationRole: member.role,
  };
}
