import type { SiteRoleName } from '@embertally/shared/policy/policy';
import { createHash, randomBytes } from 'node:crypto';
import { existsSync, mkdirSync, readFileSync, renameSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import type { Actor, Trail } from '../src/actor.ts';
import type { Clock } from '../src/clock.ts';
import type { Database } from '../src/repositories/database.ts';
import { PersonRepository } from '../src/repositories/person-repository.ts';
import type { Services } from '../src/services/services.ts';
import { demoChanges } from './demo/demo-changes.ts';
import { DEMO_LIMITS } from './demo/demo-limits.ts';
import { makeDemoMaterials } from './demo/make-demo-materials.ts';
import { DEMO_BUILDING, DEMO_PEOPLE, DEMO_SITE, type DemoPerson } from './demo/demo-people.ts';

const TRAIL: Trail = { requestId: 'demo-book', ip: '127.0.0.1' };

interface DemoFile {
  /** Every id of the demo is made of this and a name. */
  readonly seed: string;
  readonly at: string;
  readonly complete: boolean;
  readonly people: readonly (DemoPerson & { readonly password: string })[];
}

export interface SeedParts {
  readonly services: Services;
  readonly database: Database;
  readonly clock: Clock;
  /** Where `demo.json`, with the passwords of the demo's people, is kept. */
  readonly dataDir: string;
}

/**
 * Fills an empty database with the demo book, through the services people use. A run that was cut short is finished by
 * the next one: every step carries the id it had the first time, and a step already done changes nothing.
 */
export async function seedDemo(parts: SeedParts): Promise<void> {
  const file = join(parts.dataDir, 'demo.json');
  const demo = readDemo(file);
  if (demo?.complete === true) return;
  if (demo === null && (await new PersonRepository(parts.database.statements).hasAny())) return;
  const begun = demo ?? beginDemo(file, parts.clock);
  await fill(parts.services, begun);
  writeDemo(file, { ...begun, complete: true });
}

function readDemo(file: string): DemoFile | null {
  return existsSync(file) ? (JSON.parse(readFileSync(file, 'utf8')) as DemoFile) : null;
}

function writeDemo(file: string, demo: DemoFile): void {
  writeFileSync(`${file}.new`, `${JSON.stringify(demo, null, 2)}\n`, { mode: 0o600 });
  renameSync(`${file}.new`, file);
}

function beginDemo(file: string, clock: Clock): DemoFile {
  mkdirSync(join(file, '..'), { recursive: true });
  const people = DEMO_PEOPLE.map((person) => ({ ...person, password: randomBytes(12).toString('base64url') }));
  const demo = { seed: randomBytes(16).toString('hex'), at: clock.now().toISOString(), complete: false, people };
  writeDemo(file, demo);
  return demo;
}

/** A UUID that is always the same for the same seed and name (the layout of version 8: made by us). */
function idFrom(seed: string, name: string): string {
  const hex = createHash('sha256').update(`${seed} ${name}`).digest('hex');
  const variant = ((parseInt(hex[16] ?? '0', 16) & 0x3) | 0x8).toString(16);
  return [
    hex.slice(0, 8),
    hex.slice(8, 12),
    `8${hex.slice(13, 16)}`,
    `${variant}${hex.slice(17, 20)}`,
    hex.slice(20, 32),
  ].join('-');
}

async function fill(services: Services, demo: DemoFile): Promise<void> {
  const id = (name: string): string => idFrom(demo.seed, name);
  const actors = new Map<SiteRoleName, Actor>();
  for (const person of demo.people) {
    const admin = [...actors.values()].find((actor) => actor.organisationName === person.organisation) ?? null;
    actors.set(person.role, await signInAs(services, person, id(`organisation ${person.organisation}`), admin));
  }
  const as = (role: SiteRoleName): Actor => {
    const actor = actors.get(role);
    if (actor === undefined) throw new Error(`The demo has no ${role}.`);
    return actor;
  };

  const siteId = id('site');
  await services.sites.create(as('manager'), { id: siteId, ...DEMO_SITE }, TRAIL);
  for (const person of demo.people.filter(({ role }) => role !== 'manager')) {
    const role = { id: id(`role ${person.email}`), email: person.email, role: person.role };
    await services.siteRoles.give(as('manager'), siteId, role, TRAIL);
  }
  const access = async (role: SiteRoleName) => {
    const found = await services.access.find(as(role), 'site', siteId);
    if (found === null) throw new Error(`The demo's ${role} has no way to the site.`);
    return found;
  };
  const buildingId = id('building');
  const survey = {
    survey_id: id('survey'),
    storey_id: id('storey'),
    idOf: id,
    recorded_by: as('inspector').name,
    recorded_at: demo.at,
  };
  const building = {
    id: buildingId,
    survey_id: survey.survey_id,
    storey_id: survey.storey_id,
    name: DEMO_BUILDING,
    storey_name: 'Ground floor',
  };
  await services.buildings.create(as('manager'), await access('manager'), building, TRAIL);

  const { steps } = demoChanges(survey);
  for (const [index, { label, changes }] of steps.entries()) {
    await services.changeSets.apply(as('inspector'), survey.survey_id, {
      id: id(`change set ${index}`),
      label,
      changes: [...changes],
    });
  }
  for (const { room, as: role, ...limit } of DEMO_LIMITS) {
    const input = { id: id(`limit ${room} ${limit.quantity}`), room_id: id(`room ${room}`), ...limit };
    await services.limits.create(as(role), await access(role), buildingId, input, TRAIL);
  }
  await makeDemoMaterials({ services, as, idOf: id, trail: TRAIL });
}

/**
 * Signs a person up, or has the admin of their organisation add them, and signs them in; says who is acting. An address
 * that is there already changes nothing.
 */
async function signInAs(
  services: Services,
  person: DemoFile['people'][number],
  organisationId: string,
  admin: Actor | null,
): Promise<Actor> {
  const { name, email, password } = person;
  if (admin === null) {
    const signUp = { id: organisationId, organisation_name: person.organisation, name, email, password };
    await services.accounts.signUp(signUp, TRAIL);
  } else {
    await services.accounts.addMember(admin, { name, email, password, role: 'member' }, TRAIL);
  }
  const { me } = await services.accounts.signIn({ email: person.email, password: person.password }, null, TRAIL);
  const member = me.members.find((one) => one.id === me.member_id);
  if (member === undefined) throw new Error(`${person.name} has no organisation.`);
  return {
    personId: me.person.id,
    name: me.person.name,
    memberId: member.id,
    organisationId: member.organisation_id,
    organisationName: member.organisation_name,
    organisationRole: member.role,
  };
}
