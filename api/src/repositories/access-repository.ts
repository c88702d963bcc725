import type { SiteRoleName } from '@embertally/shared/policy/policy';
import type { Actor, SiteAccess } from '../actor.ts';
import { SqlRepository } from './sql-repository.ts';

export type AccessTarget = 'site' | 'building' | 'survey' | 'limit' | 'export';

/** From the named thing up to its site; `id` is the first parameter. */
const PATHS: Readonly<Record<AccessTarget, { from: string; columns: string }>> = {
  site: {
    from: 'site s WHERE s.id = $1',
    columns: 'NULL::uuid AS building_id, NULL::uuid AS survey_id, NULL::int AS sequence',
  },
  building: {
    from: 'building b JOIN site s ON s.id = b.site_id WHERE b.id = $1',
    columns: 'b.id AS building_id, NULL::uuid AS survey_id, NULL::int AS sequence',
  },
  survey: {
    from: 'survey v JOIN building b ON b.id = v.building_id JOIN site s ON s.id = b.site_id WHERE v.id = $1',
    columns: 'b.id AS building_id, v.id AS survey_id, v.sequence',
  },
  limit: {
    from: 'room_limit l JOIN building b ON b.id = l.building_id JOIN site s ON s.id = b.site_id WHERE l.id = $1',
    columns: 'b.id AS building_id, NULL::uuid AS survey_id, NULL::int AS sequence',
  },
  export: {
    from: 'export e JOIN survey v ON v.id = e.survey_id JOIN building b ON b.id = v.building_id JOIN site s ON s.id = b.site_id WHERE e.id = $1',
    columns: 'b.id AS building_id, v.id AS survey_id, v.sequence',
  },
};

interface AccessRow {
  site_id: string;
  role: SiteRoleName;
  organisation_id: string;
  building_id: string | null;
  survey_id: string | null;
  sequence: number | null;
}

/** Whether and how a person reaches a site. A person without a role finds nothing, as if it did not exist. */
export class AccessRepository extends SqlRepository {
  async find(actor: Actor, target: AccessTarget, id: string): Promise<SiteAccess | null> {
    const { from, columns } = PATHS[target];
    const found = await this.row<AccessRow>(
      `SELECT t.*, r.role FROM (SELECT s.id AS site_id, s.organisation_id, ${columns} FROM ${from}) t
       JOIN site_role r ON r.site_id = t.site_id AND r.member_id = $2`,
      [id, actor.memberId],
    );
    if (found === null) return null;
    return {
      siteId: found.site_id,
      role: found.role,
      ofKeeper: found.organisation_id === actor.organisationId,
      buildingId: found.building_id,
      surveyId: found.survey_id,
      sequence: found.sequence,
    };
  }
}
