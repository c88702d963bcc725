import type { Site, SiteSummary } from '@embertally/shared/contracts/sites';
import { randomUUID } from 'node:crypto';
import type { Database } from '../repositories/database.ts';
import type { Actor, Trail } from '../actor.ts';
import type { Clock } from '../clock.ts';
import { Fault } from '../fault.ts';
import { BuildingRepository } from '../repositories/building-repository.ts';
import { SiteRepository, type SiteValues } from '../repositories/site-repository.ts';
import { SiteRoleRepository } from '../repositories/site-role-repository.ts';
import { recordEvent } from './audit-record.ts';
import { claimId } from './claim-id.ts';
import { readCursor, writeCursor } from './cursor.ts';
import { staleVersion } from './stale-version.ts';

const PAGE = 50;

/** Sites: the list a person sees, one with its buildings and people, making and editing. */
export class SiteService {
  private readonly database: Database;
  private readonly clock: Clock;

  constructor(database: Database, clock: Clock) {
    this.database = database;
    this.clock = clock;
  }

  async list(
    actor: Actor,
    query: {
      readonly cursor?: string | undefined;
      readonly limit?: number | undefined;
      readonly search?: string | undefined;
    },
  ): Promise<{ items: SiteSummary[]; next_cursor: string | null }> {
    const limit = query.limit ?? PAGE;
    const found = await new SiteRepository(this.database.statements).list(actor, {
      after: readCursor(query.cursor),
      limit: limit + 1,
      search: query.search?.trim() ?? '',
    });
    const items = found.slice(0, limit);
    const last = items.at(-1);
    const more = found.length > limit && last !== undefined;
    return { items: [...items], next_cursor: more ? writeCursor([last.name.toLowerCase(), last.id]) : null };
  }

  async read(actor: Actor, siteId: string): Promise<Site> {
    const sites = new SiteRepository(this.database.statements);
    const summary = await sites.find(actor, siteId);
    if (summary === null) throw Fault.notFound();
    const building_list = [...(await new BuildingRepository(this.database.statements).ofSite(siteId))];
    const people = [...(await sites.people(siteId))];
    return { ...summary, building_list, people };
  }

  async create(actor: Actor, input: SiteValues & { readonly id: string }, trail: Trail): Promise<Site> {
    checkTimeZone(input.time_zone);
    const at = this.clock.now();
    await this.database.transaction(async (statements) => {
      if (!(await claimId(statements, actor, input, at))) return;
      await new SiteRepository(statements).add(input.id, input, actor.organisationId, at);
      await new SiteRoleRepository(statements).add(randomUUID(), input.id, actor.memberId, 'manager', at);
      await recordEvent(statements, {
        chain: { kind: 'site', id: input.id },
        actor,
        action: 'site.made',
        object: { kind: 'site', id: input.id },
        facts: { name: input.name },
        trail,
        at,
      });
    });
    return this.read(actor, input.id);
  }

  async edit(
    actor: Actor,
    siteId: string,
    version: number,
    patch: { readonly [K in keyof SiteValues]?: SiteValues[K] | undefined },
    trail: Trail,
  ): Promise<Site> {
    if (patch.time_zone !== undefined) checkTimeZone(patch.time_zone);
    const at = this.clock.now();
    const changed = await this.database.transaction(async (statements) => {
      if (!(await new SiteRepository(statements).edit(siteId, version, { ...patch }, at))) return false;
      await recordEvent(statements, {
        chain: { kind: 'site', id: siteId },
        actor,
        action: 'site.edited',
        object: { kind: 'site', id: siteId },
        facts: Object.fromEntries(
          Object.entries(patch).filter((entry): entry is [string, string] => entry[1] !== undefined),
        ),
        trail,
        at,
      });
      return true;
    });
    const site = await this.read(actor, siteId);
    if (!changed) throw staleVersion(site);
    return site;
  }
}

function checkTimeZone(zone: string): void {
  try {
    new Intl.DateTimeFormat('en', { timeZone: zone });
  } catch (error) {
    if (!(error instanceof RangeError)) throw error;
    throw Fault.invalid([
      {
        pointer: '/time_zone',
        code: 'TIME_ZONE_UNKNOWN',
        message: 'Enter a time zone by its name, like Europe/London.',
      },
    ]);
  }
}
