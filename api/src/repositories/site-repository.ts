import type { SitePerson, SiteSummary } from '@embertally/shared/contracts/sites';
import type { SiteRoleName } from '@embertally/shared/policy/policy';
import type { Actor } from '../actor.ts';
import { SqlRepository } from './sql-repository.ts';

interface SiteRow {
  id: string;
  name: string;
  address: string;
  time_zone: string;
  keeper_id: string;
  keeper_name: string;
  my_role: SiteRoleName;
  of_keeper: boolean;
  buildings: number;
  rooms: number;
  rooms_over: number;
  rooms_near: number;
  version: number;
  updated_at: Date;
}

export interface SiteValues {
  readonly name: string;
  readonly address: string;
  readonly time_zone: string;
}

const COLUMNS = `s.id, s.name, s.address, s.time_zone, o.id AS keeper_id, o.name AS keeper_name, r.role AS my_role,
  s.organisation_id = $2 AS of_keeper, t.buildings, t.rooms, t.rooms_over, t.rooms_near, s.version, s.updated_at`;

/** Sites the actor has a role on ($1 member, $2 organisation), with the counts of their working surveys. */
const FROM = `site_role r JOIN site s ON s.id = r.site_id JOIN organisation o ON o.id = s.organisation_id
  CROSS JOIN LATERAL (
    SELECT count(DISTINCT b.id)::int AS buildings, count(m.room_id)::int AS rooms,
      (count(*) FILTER (WHERE m.standing = 'over'))::int AS rooms_over,
      (count(*) FILTER (WHERE m.standing = 'near'))::int AS rooms_near
    FROM building b LEFT JOIN survey v ON v.building_id = b.id AND v.kind = 'working'
    LEFT JOIN room_summary m ON m.survey_id = v.id WHERE b.site_id = s.id) t`;

/** Sites as the actor may see them: every read goes through the actor's role. */
export class SiteRepository extends SqlRepository {
  async find(actor: Actor, siteId: string): Promise<SiteSummary | null> {
    const row = await this.row<SiteRow>(`SELECT ${COLUMNS} FROM ${FROM} WHERE r.member_id = $1 AND s.id = $3`, [
      actor.memberId,
      actor.organisationId,
      siteId,
    ]);
    return row === null ? null : summary(row);
  }

  /** Sites by name, after a cursor, whose name or address contains the text as typed. */
  async list(
    actor: Actor,
    page: {
      readonly after: readonly [name: string, id: string] | null;
      readonly limit: number;
      readonly search: string;
    },
  ): Promise<readonly SiteSummary[]> {
    const rows = await this.rows<SiteRow>(
      `SELECT ${COLUMNS} FROM ${FROM} WHERE r.member_id = $1
         AND ($3::text IS NULL OR (lower(s.name), s.id) > ($3, $4::uuid))
         AND ($5 = '' OR strpos(lower(s.name || E'\\n' || s.address), lower($5)) > 0)
       ORDER BY lower(s.name), s.id LIMIT $6`,
      [actor.memberId, actor.organisationId, page.after?.[0] ?? null, page.after?.[1] ?? null, page.search, page.limit],
    );
    return rows.map(summary);
  }

  people(siteId: string): Promise<readonly SitePerson[]> {
    return this.rows<SitePerson>(
      `SELECT r.id, r.member_id, p.name, o.name AS organisation_name, r.role FROM site_role r
       JOIN member m ON m.id = r.member_id JOIN person p ON p.id = m.person_id
       JOIN organisation o ON o.id = m.organisation_id
       WHERE r.site_id = $1 ORDER BY p.name, r.id`,
      [siteId],
    );
  }

  async add(id: string, values: SiteValues, organisationId: string, at: Date): Promise<void> {
    await this.rows(
      `INSERT INTO site (id, name, address, time_zone, organisation_id, version, created_at, updated_at)
       VALUES ($1, $2, $3, $4, $5, 1, $6, $6)`,
      [id, values.name, values.address, values.time_zone, organisationId, at],
    );
  }

  /** @returns whether the version was the present one */
  async edit(id: string, version: number, patch: Partial<SiteValues>, at: Date): Promise<boolean> {
    const changed = await this.rows(
      `UPDATE site SET name = coalesce($3, name), address = coalesce($4, address), time_zone = coalesce($5, time_zone),
         version = version + 1, updated_at = $6 WHERE id = $1 AND version = $2 RETURNING id`,
      [id, version, patch.name ?? null, patch.address ?? null, patch.time_zone ?? null, at],
    );
    return changed.length > 0;
  }

  /** Holds the site for the rest of the transaction, so that two managers cannot take each other's role away. */
  async lock(id: string): Promise<void> {
    await this.rows('SELECT id FROM site WHERE id = $1 FOR UPDATE', [id]);
  }
}

function summary({ keeper_id, keeper_name, ...row }: SiteRow): SiteSummary {
  return { ...row, keeper: { id: keeper_id, name: keeper_name }, updated_at: row.updated_at.toISOString() };
}
