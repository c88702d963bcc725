import type { Limit } from '@embertally/shared/contracts/limits';
import { canOnSite } from '@embertally/shared/policy/policy';
import type { Database, Statements } from '../repositories/database.ts';
import type { Actor, SiteAccess, Trail } from '../actor.ts';
import type { Clock } from '../clock.ts';
import { Fault } from '../fault.ts';
import { LimitRepository, type LimitValues } from '../repositories/limit-repository.ts';
import { RoomSummaryRepository } from '../repositories/room-summary-repository.ts';
import type { AccessService } from './access-service.ts';
import { recordEvent } from './audit-record.ts';
import { claimId } from './claim-id.ts';
import { staleVersion } from './stale-version.ts';
import type { SummaryService } from './summary-service.ts';

interface LimitParts {
  readonly database: Database;
  readonly clock: Clock;
  readonly access: AccessService;
  readonly summaries: SummaryService;
}

/** Limits on rooms: who may set which, and the rooms' standings after. */
export class LimitService {
  private readonly parts: LimitParts;

  constructor(parts: LimitParts) {
    this.parts = parts;
  }

  async list(buildingId: string): Promise<Limit[]> {
    return [...(await new LimitRepository(this.parts.database.statements).ofBuilding(buildingId))];
  }

  async create(
    actor: Actor,
    access: SiteAccess,
    buildingId: string,
    input: LimitValues & { readonly id: string },
    trail: Trail,
  ): Promise<Limit> {
    await this.checkSource(actor, access, input.source, trail);
    const at = this.parts.clock.now();
    await this.change(buildingId, input.room_id, async (statements, surveyId) => {
      if (!(await claimId(statements, actor, input, at))) return;
      if (surveyId === null) {
        throw Fault.invalid([
          {
            pointer: '/room_id',
            code: 'ROOM_UNKNOWN',
            message: 'This room is not in the building any more; choose another.',
          },
        ]);
      }
      await new LimitRepository(statements).add(input.id, buildingId, input, actor.personId, at);
      await recordEvent(statements, {
        chain: { kind: 'site', id: access.siteId },
        actor,
        action: 'limit.set',
        object: { kind: 'room', id: input.room_id },
        facts: { quantity: input.quantity, bound: input.bound, source: input.source, set_by: input.set_by },
        trail,
        at,
      });
    });
    return this.read(input.id);
  }

  async edit(
    actor: Actor,
    access: SiteAccess,
    limitId: string,
    version: number,
    patch: {
      readonly bound?: number | undefined;
      readonly set_by?: string | undefined;
      readonly since?: string | undefined;
    },
    trail: Trail,
  ): Promise<Limit> {
    const before = await this.read(limitId);
    await this.checkSource(actor, access, before.source, trail);
    await this.change(before.building_id, before.room_id, async (statements) => {
      if (!(await new LimitRepository(statements).edit(limitId, version, patch))) throw staleVersion(before);
      await recordEvent(statements, {
        chain: { kind: 'site', id: access.siteId },
        actor,
        action: 'limit.edited',
        object: { kind: 'room', id: before.room_id },
        facts: { quantity: before.quantity, before: before.bound, bound: patch.bound ?? before.bound },
        trail,
        at: this.parts.clock.now(),
      });
    });
    return this.read(limitId);
  }

  async remove(actor: Actor, access: SiteAccess, limitId: string, version: number, trail: Trail): Promise<void> {
    const before = await this.read(limitId);
    await this.checkSource(actor, access, before.source, trail);
    await this.change(before.building_id, before.room_id, async (statements) => {
      if (!(await new LimitRepository(statements).remove(limitId, version))) throw staleVersion(before);
      await recordEvent(statements, {
        chain: { kind: 'site', id: access.siteId },
        actor,
        action: 'limit.taken-away',
        object: { kind: 'room', id: before.room_id },
        facts: { quantity: before.quantity, bound: before.bound, source: before.source, set_by: before.set_by },
        trail,
        at: this.parts.clock.now(),
      });
    });
  }

  private async read(id: string): Promise<Limit> {
    const found = await new LimitRepository(this.parts.database.statements).find(id);
    if (found === null) throw Fault.notFound();
    return found;
  }

  /** A manager sets house rules; a permit or policy clause is an inspector's or reviewer's to enter. */
  private async checkSource(actor: Actor, access: SiteAccess, source: Limit['source'], trail: Trail): Promise<void> {
    const action = source === 'house-rule' ? 'house-rule.set' : 'limit.set';
    if (canOnSite(access, action)) return;
    await this.parts.access.refusedOnSite(actor, access, action, trail);
    throw new Fault(
      'forbidden',
      'role-too-small',
      `As ${access.role} of this site you can set house rules only; a limit from a permit or a policy is set by an inspector or a reviewer. Nothing was changed.`,
    );
  }

  /** Changes a limit and marks its room's summary stale in one transaction, then has it computed again. */
  private async change(
    buildingId: string,
    roomId: string,
    work: (statements: Statements, surveyId: string | null) => Promise<void>,
  ): Promise<void> {
    const surveyId = await this.parts.database.transaction(async (statements) => {
      const found = await new LimitRepository(statements).surveyOfRoom(buildingId, roomId);
      await work(statements, found);
      if (found !== null) await new RoomSummaryRepository(statements).markStale(found, [roomId]);
      return found;
    });
    if (surveyId !== null) this.parts.summaries.recomputeSoon(surveyId);
  }
}
