import type { Database } from '../repositories/database.ts';
import type { Actor, SiteAccess, Trail } from '../actor.ts';
import type { Clock } from '../clock.ts';
import { AccessRepository, type AccessTarget } from '../repositories/access-repository.ts';
import { recordEvent } from './audit-record.ts';

/** Finds what a person's role opens and writes down what was refused. */
export class AccessService {
  private readonly database: Database;
  private readonly clock: Clock;

  constructor(database: Database, clock: Clock) {
    this.database = database;
    this.clock = clock;
  }

  find(actor: Actor, target: AccessTarget, id: string): Promise<SiteAccess | null> {
    return new AccessRepository(this.database.statements).find(actor, target, id);
  }

  refusedOnSite(actor: Actor, access: SiteAccess, action: string, trail: Trail): Promise<void> {
    return recordEvent(this.database.statements, {
      chain: { kind: 'site', id: access.siteId },
      actor,
      action: 'access.refused',
      object: { kind: 'site', id: access.siteId },
      facts: { wanted: action, role: access.role },
      trail,
      at: this.clock.now(),
    });
  }

  refusedInOrganisation(actor: Actor, action: string, trail: Trail): Promise<void> {
    return recordEvent(this.database.statements, {
      chain: { kind: 'organisation', id: actor.organisationId },
      actor,
      action: 'access.refused',
      object: { kind: 'organisation', id: actor.organisationId },
      facts: { wanted: action, role: actor.organisationRole },
      trail,
      at: this.clock.now(),
    });
  }
}
