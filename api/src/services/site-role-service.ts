import type { SitePerson } from '@embertally/shared/contracts/sites';
import type { SiteRoleName } from '@embertally/shared/policy/policy';
import type { Database, Statements } from '../repositories/database.ts';
import type { Actor, Trail } from '../actor.ts';
import type { Clock } from '../clock.ts';
import { Fault } from '../fault.ts';
import { SiteRepository } from '../repositories/site-repository.ts';
import { SiteRoleRepository, type SiteRoleRow } from '../repositories/site-role-repository.ts';
import { recordEvent } from './audit-record.ts';
import { claimId } from './claim-id.ts';

/** Who has which role on a site. The last manager of the keeper stays. */
export class SiteRoleService {
  private readonly database: Database;
  private readonly clock: Clock;

  constructor(database: Database, clock: Clock) {
    this.database = database;
    this.clock = clock;
  }

  /** Gives a person of any organisation a role; one they had before is replaced, because there is exactly one. */
  async give(
    actor: Actor,
    siteId: string,
    input: { readonly id: string; readonly email: string; readonly role: SiteRoleName },
    trail: Trail,
  ): Promise<SitePerson> {
    const at = this.clock.now();
    await this.database.transaction(async (statements) => {
      await new SiteRepository(statements).lock(siteId);
      if (!(await claimId(statements, actor, input, at))) return;
      const roles = new SiteRoleRepository(statements);
      const memberId = await roles.memberByEmail(input.email);
      if (memberId === null) {
        throw Fault.invalid([
          {
            pointer: '/email',
            code: 'PERSON_UNKNOWN',
            message: 'Nobody has signed up with this address yet; ask them to sign up, then give the role again.',
          },
        ]);
      }
      const present = await roles.ofMember(siteId, memberId);
      if (present !== null) {
        if (input.role !== 'manager') await keepAManager(statements, siteId, present);
        await roles.remove(siteId, present.id);
      }
      await roles.add(input.id, siteId, memberId, input.role, at);
      await recordEvent(statements, {
        chain: { kind: 'site', id: siteId },
        actor,
        action: 'site-role.given',
        object: { kind: 'member', id: memberId },
        facts: { role: input.role, before: present?.role ?? null },
        trail,
        at,
      });
    });
    const person = (await new SiteRepository(this.database.statements).people(siteId)).find(
      (one) => one.id === input.id,
    );
    if (person === undefined) {
      throw new Fault(
        'conflict',
        'role-replaced',
        'This role was given and has been changed since; read the site again.',
      );
    }
    return person;
  }

  async take(actor: Actor, siteId: string, roleId: string, trail: Trail): Promise<void> {
    const at = this.clock.now();
    await this.database.transaction(async (statements) => {
      await new SiteRepository(statements).lock(siteId);
      const roles = new SiteRoleRepository(statements);
      const present = await roles.find(siteId, roleId);
      if (present === null) throw Fault.notFound();
      await keepAManager(statements, siteId, present);
      await roles.remove(siteId, roleId);
      await recordEvent(statements, {
        chain: { kind: 'site', id: siteId },
        actor,
        action: 'site-role.taken',
        object: { kind: 'member', id: present.member_id },
        facts: { role: present.role },
        trail,
        at,
      });
    });
  }
}

async function keepAManager(statements: Statements, siteId: string, losing: SiteRoleRow): Promise<void> {
  const roles = new SiteRoleRepository(statements);
  if (!(await roles.isKeeperManager(siteId, losing.id))) return;
  if ((await roles.countManagers(siteId)) > 1) return;
  throw new Fault(
    'conflict',
    'last-manager',
    'This is the last manager of the site in its keeper organisation, so the role stays. Make somebody else manager first.',
  );
}
