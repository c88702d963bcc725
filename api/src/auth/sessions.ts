import { Lucia, TimeSpan, type Adapter, type DatabaseSession, type DatabaseUser } from 'lucia';
import type { Database } from '../repositories/database.ts';
import type { Actor } from '../actor.ts';
import type { Clock } from '../clock.ts';
import { SessionRepository, type SessionWithActor } from '../repositories/session-repository.ts';
import { hashToken, newToken } from './tokens.ts';

declare module 'lucia' {
  interface Register {
    Lucia: Lucia<{ member_id: string }, SessionWithActor>;
    DatabaseSessionAttributes: { member_id: string };
    DatabaseUserAttributes: SessionWithActor;
  }
}

/** A walk round a building takes a working day: a session lasts that long without use, and a week at most. */
const IDLE_h = 12;
const ABSOLUTE_ms = 7 * 24 * 3600 * 1000;
const IDLE_ms = IDLE_h * 3600 * 1000;
/** Use moves the end of a session at most this often, so that reading does not write. */
const TOUCH_ms = 60_000;

export interface SignedIn {
  readonly actor: Actor;
  readonly token: string;
  readonly expiresAt: Date;
}

/**
 * Sessions; the only file that knows the session library. The library compares with the machine's clock, the adapter
 * translates to ours, so that limits hold on the clock that was handed in. Tokens are stored as SHA-256 only.
 */
export class Sessions {
  private readonly lucia: Lucia<{ member_id: string }, SessionWithActor>;
  private readonly repository: SessionRepository;
  private readonly clock: Clock;

  constructor(database: Database, clock: Clock) {
    this.repository = new SessionRepository(database.statements);
    this.clock = clock;
    this.lucia = new Lucia<{ member_id: string }, SessionWithActor>(this.adapter(), {
      sessionExpiresIn: new TimeSpan(IDLE_h, 'h'),
      sessionCookie: { name: '__Host-sid', attributes: { secure: true, sameSite: 'lax', path: '/' } },
      getSessionAttributes: (attributes) => ({ member_id: attributes.member_id }),
      getUserAttributes: (attributes) => attributes,
    });
  }

  /** The token in a Cookie header; nothing else carries one. */
  readCookie(header: string | undefined): string | null {
    return header === undefined ? null : this.lucia.readSessionCookie(header);
  }

  /** A new session; its token is made here, so a token planted before signing in never becomes valid. */
  async begin(personId: string, memberId: string): Promise<{ token: string; expiresAt: Date }> {
    const token = newToken();
    await this.lucia.createSession(personId, { member_id: memberId }, { sessionId: token });
    return { token, expiresAt: new Date(this.clock.now().getTime() + IDLE_ms) };
  }

  async find(token: string): Promise<SignedIn | null> {
    const { session, user } = await this.lucia.validateSession(token);
    if (session === null) return null;
    const now = this.clock.now().getTime();
    const end = Math.min(now + IDLE_ms, user.created_at.getTime() + ABSOLUTE_ms);
    let expiresAt = user.expires_at;
    if (end - expiresAt.getTime() > TOUCH_ms) {
      expiresAt = new Date(end);
      await this.repository.extend(hashToken(token), expiresAt);
    }
    return {
      token,
      expiresAt,
      actor: {
        personId: user.person_id,
        name: user.name,
        memberId: session.member_id,
        organisationId: user.organisation_id,
        organisationName: user.organisation_name,
        organisationRole: user.organisation_role,
      },
    };
  }

  end(token: string): Promise<void> {
    return this.lucia.invalidateSession(token);
  }

  endAll(personId: string): Promise<void> {
    return this.lucia.invalidateUserSessions(personId);
  }

  removeExpired(): Promise<void> {
    return this.lucia.deleteExpiredSessions();
  }

  cookie(token: string): string {
    const cookie = this.lucia.createSessionCookie(token);
    cookie.attributes.maxAge = ABSOLUTE_ms / 1000;
    return cookie.serialize();
  }

  blankCookie(): string {
    return this.lucia.createBlankSessionCookie().serialize();
  }

  private adapter(): Adapter {
    const { repository, clock } = this;
    const toMachine = (ours: Date): Date => new Date(Date.now() + ours.getTime() - clock.now().getTime());
    const toOurs = (machine: Date): Date => new Date(clock.now().getTime() + machine.getTime() - Date.now());
    const pastAbsolute = (created: Date): boolean => clock.now().getTime() >= created.getTime() + ABSOLUTE_ms;
    return {
      async getSessionAndUser(token): Promise<[DatabaseSession | null, DatabaseUser | null]> {
        const row = await repository.find(hashToken(token));
        if (row === null) return [null, null];
        if (pastAbsolute(row.created_at)) {
          await repository.remove(row.token_hash);
          return [null, null];
        }
        return [
          {
            id: token,
            userId: row.person_id,
            expiresAt: toMachine(row.expires_at),
            attributes: { member_id: row.member_id },
          },
          { id: row.person_id, attributes: row },
        ];
      },
      async getUserSessions(personId) {
        const rows = await repository.ofPerson(personId);
        return rows.map((row) => ({
          id: row.token_hash,
          userId: row.person_id,
          expiresAt: toMachine(row.expires_at),
          attributes: { member_id: row.member_id },
        }));
      },
      async setSession(session) {
        const now = clock.now();
        await repository.add({
          token_hash: hashToken(session.id),
          person_id: session.userId,
          member_id: session.attributes.member_id,
          created_at: now,
          expires_at: toOurs(session.expiresAt),
        });
      },
      // Sliding is done in `find`, which also knows the absolute limit.
      updateSessionExpiration: () => Promise.resolve(),
      deleteSession: (token) => repository.remove(hashToken(token)),
      deleteUserSessions: (personId) => repository.removeOfPerson(personId),
      deleteExpiredSessions: () => repository.removeExpired(clock.now()),
    };
  }
}
