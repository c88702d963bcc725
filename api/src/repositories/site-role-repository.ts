import type { SiteRoleName } from '@embertally/shared/policy/policy';
import { SqlRepository } from './sql-repository.ts';

export interface SiteRoleRow {
  readonly id: string;
  readonly member_id: string;
  readonly role: SiteRoleName;
}

/** Roles on sites: one per member and site. */
export class SiteRoleRepository extends SqlRepository {
  /** The membership a person of any organisation would get a role as; null when nobody has the address. */
  async memberByEmail(email: string): Promise<string | null> {
    const found = await this.row<{ id: string }>(
      'SELECT m.id FROM person p JOIN member m ON m.person_id = p.id WHERE p.email = $1 ORDER BY m.created_at, m.id LIMIT 1',
      [email],
    );
    return found?.id ?? null;
  }

  find(siteId: string, roleId: string): Promise<SiteRoleRow | null> {
    return this.row<SiteRoleRow>('SELECT id, member_id, role FROM site_role WHERE site_id = $1 AND id = $2', [
      siteId,
      roleId,
    ]);
  }

  ofMember(siteId: string, memberId: string): Promise<SiteRoleRow | null> {
    return this.row<SiteRoleRow>('SELECT id, member_id, role FROM site_role WHERE site_id = $1 AND member_id = $2', [
      siteId,
      memberId,
    ]);
  }

  /** Managers that belong to the keeper: only they can give roles. */
  async countManagers(siteId: string): Promise<number> {
    const found = await this.row<{ count: number }>(
      `SELECT count(*)::int AS count FROM site_role r JOIN site s ON s.id = r.site_id
       JOIN member m ON m.id = r.member_id AND m.organisation_id = s.organisation_id
       WHERE r.site_id = $1 AND r.role = 'manager'`,
      [siteId],
    );
    return found?.count ?? 0;
  }

  async isKeeperManager(siteId: string, roleId: string): Promise<boolean> {
    const found = await this.row(
      `SELECT 1 AS yes FROM site_role r JOIN site s ON s.id = r.site_id
       JOIN member m ON m.id = r.member_id AND m.organisation_id = s.organisation_id
       WHERE r.site_id = $1 AND r.id = $2 AND r.role = 'manager'`,
      [siteId, roleId],
    );
    return found !== null;
  }

  async add(id: string, siteId: string, memberId: string, role: SiteRoleName, at: Date): Promise<void> {
    await this.rows('INSERT INTO site_role (id, site_id, member_id, role, given_at) VALUES ($1, $2, $3, $4, $5)', [
      id,
      siteId,
      memberId,
      role,
      at,
    ]);
  }

  async remove(siteId: string, roleId: string): Promise<void> {
    await this.rows('DELETE FROM site_role WHERE site_id = $1 AND id = $2', [siteId, roleId]);
  }
}
