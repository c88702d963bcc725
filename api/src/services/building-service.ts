import type { BuildingSummary } from '@embertally/shared/contracts/sites';
import { newStorey } from '@embertally/shared/survey/new-storey';
import type { Database } from '../repositories/database.ts';
import type { Actor, SiteAccess, Trail } from '../actor.ts';
import type { Clock } from '../clock.ts';
import { Fault } from '../fault.ts';
import { BuildingRepository } from '../repositories/building-repository.ts';
import { recordEvent } from './audit-record.ts';
import { claimId } from './claim-id.ts';
import { staleVersion } from './stale-version.ts';
import { uniqueViolation } from '../repositories/unique-violation.ts';

interface BuildingInput {
  readonly id: string;
  readonly survey_id: string;
  readonly storey_id: string;
  readonly name: string;
  readonly storey_name: string;
}

/** Buildings; each is made with its working survey and first storey. */
export class BuildingService {
  private readonly database: Database;
  private readonly clock: Clock;

  constructor(database: Database, clock: Clock) {
    this.database = database;
    this.clock = clock;
  }

  async read(access: SiteAccess, buildingId: string): Promise<BuildingSummary> {
    const building = await new BuildingRepository(this.database.statements).find(access.siteId, buildingId);
    if (building === null) throw Fault.notFound();
    return building;
  }

  async create(actor: Actor, access: SiteAccess, input: BuildingInput, trail: Trail): Promise<BuildingSummary> {
    const at = this.clock.now();
    try {
      await this.database.transaction(async (statements) => {
        if (!(await claimId(statements, actor, input, at))) return;
        const buildings = new BuildingRepository(statements);
        await buildings.add(input.id, access.siteId, input.name, at);
        const storey = newStorey({ id: input.storey_id, name: input.storey_name });
        await buildings.addWorkingSurvey(input.survey_id, input.id, storey, at);
        await recordEvent(statements, {
          chain: { kind: 'site', id: access.siteId },
          actor,
          action: 'building.made',
          object: { kind: 'building', id: input.id },
          facts: { name: input.name },
          trail,
          at,
        });
      });
    } catch (error) {
      if (uniqueViolation(error) === null) throw error;
      throw new Fault(
        'conflict',
        'id-taken',
        'The id of the survey has been used already; nothing was made. Send it with a new one.',
      );
    }
    return this.read(access, input.id);
  }

  async rename(
    actor: Actor,
    access: SiteAccess,
    buildingId: string,
    version: number,
    name: string,
    trail: Trail,
  ): Promise<BuildingSummary> {
    const at = this.clock.now();
    const changed = await this.database.transaction(async (statements) => {
      if (!(await new BuildingRepository(statements).rename(buildingId, version, name, at))) return false;
      await recordEvent(statements, {
        chain: { kind: 'site', id: access.siteId },
        actor,
        action: 'building.renamed',
        object: { kind: 'building', id: buildingId },
        facts: { name },
        trail,
        at,
      });
      return true;
    });
    const building = await this.read(access, buildingId);
    if (!changed) throw staleVersion(building);
    return building;
  }
}
