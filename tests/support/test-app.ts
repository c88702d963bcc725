import { randomUUID } from 'node:crypto';
import { once } from 'node:events';
import { mkdtempSync, rmSync } from 'node:fs';
import { createServer, type Server } from 'node:http';
import type { AddressInfo } from 'node:net';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import pg from 'pg';
import { pino, type Logger } from 'pino';
import type { SiteRoleName } from '@embertally/shared/policy/policy';
import type { Changes } from '@embertally/shared/survey/change';
import type { SurveyDocument } from '@embertally/shared/survey/survey-document';
import type { Actor } from '../../api/src/actor.ts';
import { readEnv } from '../../api/src/env.ts';
import { House, type HouseOptions } from '../../api/src/house.ts';
import { createTestDatabase, type TestDatabase } from './test-database.ts';
import { TestClock } from './test-clock.ts';
import { Visitor } from './visitor.ts';

export const PASSWORD = 'seven lanterns over the harbour';
const TRAIL = { requestId: 'test', ip: '127.0.0.1' };

export interface TestPerson extends Actor {
  readonly email: string;
  /** A browser in which the person is signed in. */
  readonly visitor: Visitor;
}

export interface TestBook {
  readonly siteId: string;
  readonly buildingId: string;
  readonly surveyId: string;
  readonly storeyId: string;
}

export interface TestAppOptions extends HouseOptions {
  /** Another process's database, to stand beside it. */
  readonly database?: TestDatabase;
  /** Another way to the database than the direct one. */
  readonly databaseUrl?: string;
  readonly log?: Logger;
  readonly env?: Readonly<Record<string, string>>;
}

/** The whole product on a database of its own, without the web client, and people made through its services. */
export class TestApp {
  readonly house: House;
  readonly server: Server;
  readonly url: string;
  readonly database: TestDatabase;
  readonly clock: TestClock;
  /** Looks at rows from outside, with the owner's rights. */
  readonly owner: pg.Pool;
  private readonly folder: string;
  private readonly ownsDatabase: boolean;

  private constructor(parts: {
    house: House;
    server: Server;
    url: string;
    database: TestDatabase;
    clock: TestClock;
    folder: string;
    ownsDatabase: boolean;
  }) {
    this.house = parts.house;
    this.server = parts.server;
    this.url = parts.url;
    this.database = parts.database;
    this.clock = parts.clock;
    this.folder = parts.folder;
    this.ownsDatabase = parts.ownsDatabase;
    this.owner = new pg.Pool({ connectionString: parts.database.ownerUrl, max: 2 });
    this.owner.on('error', () => undefined);
  }

  static async open(options: TestAppOptions = {}): Promise<TestApp> {
    const database = options.database ?? (await createTestDatabase());
    const folder = mkdtempSync(join(tmpdir(), 'embertally-files-'));
    const clock = new TestClock();
    const server = createServer();
    server.listen(0, '127.0.0.1');
    await once(server, 'listening');
    const url = `http://127.0.0.1:${(server.address() as AddressInfo).port}`;
    const env = readEnv({
      NODE_ENV: 'test',
      BASE_URL: url,
      DATABASE_URL: options.databaseUrl ?? database.appUrl,
      DATA_DIR: folder,
      WEB_DIST: join(folder, 'no-web-client'),
      DATABASE_POOL: '5',
      HASH_MEMORY_KIB: '19456',
      HASH_PASSES: '2',
      ...options.env,
    });
    const house = new House(env, options.log ?? pino({ level: 'silent' }), { clock, ...options });
    await house.open();
    server.on('request', house.app);
    return new TestApp({ house, server, url, database, clock, folder, ownsDatabase: options.database === undefined });
  }

  async close(): Promise<void> {
    this.house.endStreams();
    this.server.closeAllConnections();
    this.server.close();
    await this.house.close();
    await this.owner.end();
    if (this.ownsDatabase) await this.database.drop();
    rmSync(this.folder, { recursive: true, force: true });
  }

  /** Where the files store keeps what it was given. */
  get filesFolder(): string {
    return join(this.folder, 'files');
  }

  /** Somebody who is not signed in. */
  visitor(): Visitor {
    return new Visitor(this.server, this.url);
  }

  /** Signs a new organisation up and its first member in. */
  async person(name = 'Odo Marsh', organisation = 'Quayside Works'): Promise<TestPerson> {
    const email = `${randomUUID().slice(0, 8)}@quayside.example`;
    const { accounts } = this.house.services;
    await accounts.signUp(
      { id: randomUUID(), organisation_name: organisation, name, email, password: PASSWORD },
      TRAIL,
    );
    return this.signedIn(email);
  }

  /** A further member of an admin's organisation. */
  async colleague(of: Actor, role: 'admin' | 'member' = 'member', name = 'Wren Tolly'): Promise<TestPerson> {
    const email = `${randomUUID().slice(0, 8)}@quayside.example`;
    await this.house.services.accounts.addMember(of, { name, email, password: PASSWORD, role }, TRAIL);
    return this.signedIn(email);
  }

  async signedIn(email: string): Promise<TestPerson> {
    const visitor = this.visitor();
    const { me, token } = await this.house.services.accounts.signIn({ email, password: PASSWORD }, null, TRAIL);
    visitor.cookies.set('__Host-sid', token);
    const member = me.members[0];
    if (member === undefined) throw new Error('a person without an organisation');
    return {
      email,
      visitor,
      personId: me.person.id,
      name: me.person.name,
      memberId: member.id,
      organisationId: member.organisation_id,
      organisationName: member.organisation_name,
      organisationRole: member.role,
    };
  }

  /** A site with one building, made by its manager. */
  async book(manager: TestPerson): Promise<TestBook> {
    const { sites, buildings, access } = this.house.services;
    const [siteId, buildingId, surveyId, storeyId] = [randomUUID(), randomUUID(), randomUUID(), randomUUID()];
    await sites.create(manager, { id: siteId, name: 'Gull Street', address: '', time_zone: 'Europe/London' }, TRAIL);
    const found = await access.find(manager, 'site', siteId);
    if (found === null) throw new Error('the maker of a site has no role on it');
    await buildings.create(
      manager,
      found,
      { id: buildingId, survey_id: surveyId, storey_id: storeyId, name: 'Store', storey_name: 'Ground floor' },
      TRAIL,
    );
    return { siteId, buildingId, surveyId, storeyId };
  }

  async give(manager: TestPerson, siteId: string, to: TestPerson, role: SiteRoleName): Promise<string> {
    const id = randomUUID();
    await this.house.services.siteRoles.give(manager, siteId, { id, email: to.email, role }, TRAIL);
    return id;
  }

  /** Sends changes as one set and gives back its sequence. */
  async change(actor: Actor, surveyId: string, changes: Changes, label = 'test'): Promise<number> {
    const body = { id: randomUUID(), label, changes: changes.map((change) => ({ ...change })) };
    return (await this.house.services.changeSets.apply(actor, surveyId, body)).sequence;
  }
}

/** Everything a document holds, as changes that make it from nothing. */
export function creating(document: SurveyDocument, without: readonly string[] = []): Changes {
  const kinds = [
    ['storey', document.storeys],
    ['corner', document.corners],
    ['room', document.rooms],
    ['opening', document.openings],
    ['entry', document.entries],
  ] as const;
  return kinds.flatMap(([kind, rows]) =>
    [...rows.values()]
      .filter((row) => !without.includes(row.id))
      .map((row) => ({ kind, id: row.id, before: null, after: { ...row } })),
  );
}
