import type { VersionState } from '@embertally/shared/contracts/own-materials';
import type { DerivedMaterial } from '@embertally/shared/materials/derived-material';
import type { MaterialDraft } from '@embertally/shared/materials/material-draft';
import { SqlRepository } from './sql-repository.ts';

export interface OwnMaterialRow {
  readonly id: string;
  readonly label: string;
  readonly latest: number;
  readonly in_force: number | null;
  readonly tag: number;
}

type WithoutWorkings = Omit<DerivedMaterial, 'workings'>;

/** A version without what it says at length. */
export interface VersionRow {
  readonly id: string;
  readonly material_id: string;
  readonly version: number;
  readonly state: VersionState;
  readonly label: string;
  readonly way: string;
  readonly net_MJ_kg: number;
  readonly low_MJ_kg: number;
  readonly high_MJ_kg: number;
  readonly has_curve: boolean;
  readonly author_id: string;
  readonly author: string;
  readonly made_at: Date;
  readonly edited_at: Date;
  readonly put_forward_at: Date | null;
  readonly decided_by_id: string | null;
  readonly decided_by: string | null;
  readonly decided_at: Date | null;
  readonly decision_reason: string | null;
  readonly withdrawn_by_id: string | null;
  readonly withdrawn_by: string | null;
  readonly withdrawn_at: Date | null;
  readonly withdrawal_reason: string | null;
}

export interface FullVersionRow extends VersionRow {
  readonly draft: MaterialDraft;
  readonly derived: WithoutWorkings;
  readonly workings: DerivedMaterial['workings'];
  readonly tag: number;
}

export interface PlaceableRow {
  readonly material_id: string;
  readonly version: number;
  readonly draft: MaterialDraft;
  readonly derived: WithoutWorkings;
  readonly approved_by: string;
  readonly approved_at: Date;
}

const MATERIAL = 'm.id, m.label, m.latest, m.in_force, m.tag';

const VERSION = `v.id, v.material_id, v.version, v.state, v.draft->>'label' AS label, v.draft->>'way' AS way,
  v."net_MJ_kg", v."low_MJ_kg", v."high_MJ_kg", v.draft ? 'curve' AS has_curve,
  v.author_id, a.name AS author, v.made_at, v.edited_at, v.put_forward_at,
  v.decided_by AS decided_by_id, d.name AS decided_by, v.decided_at, v.decision_reason,
  v.withdrawn_by AS withdrawn_by_id, w.name AS withdrawn_by, v.withdrawn_at, v.withdrawal_reason`;
const VERSION_PEOPLE = `JOIN person a ON a.id = v.author_id
  LEFT JOIN person d ON d.id = v.decided_by LEFT JOIN person w ON w.id = v.withdrawn_by`;

/** Own materials and their versions. Every read names the organisation: those of another are not there. */
export class OwnMaterialRepository extends SqlRepository {
  find(organisationId: string, id: string): Promise<OwnMaterialRow | null> {
    return this.row<OwnMaterialRow>(
      `SELECT ${MATERIAL} FROM own_material m WHERE m.id = $1 AND m.organisation_id = $2`,
      [id, organisationId],
    );
  }

  /** Materials by name, after a cursor, whose name contains the text as typed; each with its version made last. */
  async list(
    organisationId: string,
    page: {
      readonly after: readonly [label: string, id: string] | null;
      readonly limit: number;
      readonly search: string;
      readonly state: VersionState | null;
    },
  ): Promise<readonly { readonly material: OwnMaterialRow; readonly latest: VersionRow }[]> {
    const rows = await this.rows<VersionRow & Pick<OwnMaterialRow, 'latest' | 'in_force' | 'tag'> & { name: string }>(
      `SELECT m.label AS name, m.latest, m.in_force, m.tag, ${VERSION} FROM own_material m
       JOIN own_material_version v ON v.material_id = m.id AND v.version = m.latest ${VERSION_PEOPLE}
       WHERE m.organisation_id = $1 AND ($2::text IS NULL OR (lower(m.label), m.id) > ($2, $3::uuid))
         AND ($4 = '' OR strpos(lower(m.label), lower($4)) > 0) AND ($5::text IS NULL OR v.state = $5)
       ORDER BY lower(m.label), m.id LIMIT $6`,
      [organisationId, page.after?.[0] ?? null, page.after?.[1] ?? null, page.search, page.state, page.limit],
    );
    return rows.map(({ name, latest, in_force, tag, ...version }) => ({
      material: { id: version.material_id, label: name, latest, in_force, tag },
      latest: version,
    }));
  }

  /** Versions of a material, newest first. Callers have found it in the organisation. */
  versions(materialId: string): Promise<readonly VersionRow[]> {
    return this.rows<VersionRow>(
      `SELECT ${VERSION} FROM own_material_version v ${VERSION_PEOPLE} WHERE v.material_id = $1 ORDER BY v.version DESC`,
      [materialId],
    );
  }

  version(organisationId: string, materialId: string, version: number): Promise<FullVersionRow | null> {
    return this.row<FullVersionRow>(
      `SELECT ${VERSION}, v.draft, v.derived, v.workings, m.tag FROM own_material_version v
       JOIN own_material m ON m.id = v.material_id ${VERSION_PEOPLE}
       WHERE m.organisation_id = $1 AND v.material_id = $2 AND v.version = $3`,
      [organisationId, materialId, version],
    );
  }

  /** Number of the version that was made with a client's id; null when there is none. */
  async numberOf(versionId: string): Promise<number | null> {
    const found = await this.row<{ version: number }>('SELECT version FROM own_material_version WHERE id = $1', [
      versionId,
    ]);
    return found?.version ?? null;
  }

  /** Approved versions of the organisation among those named, for compositions made of them. */
  approved(
    organisationId: string,
    wanted: readonly { readonly material: string; readonly version: number }[],
  ): Promise<readonly Omit<PlaceableRow, 'approved_by' | 'approved_at'>[]> {
    return this.rows(
      `SELECT v.material_id, v.version, v.draft, v.derived FROM own_material_version v
       JOIN own_material m ON m.id = v.material_id
       JOIN unnest($2::text[], $3::int[]) AS t (material, version) ON t.material = v.material_id::text AND t.version = v.version
       WHERE m.organisation_id = $1 AND v.state = 'approved'`,
      [organisationId, wanted.map(({ material }) => material), wanted.map(({ version }) => version)],
    );
  }

  /** The versions in force, by name. */
  placeable(organisationId: string): Promise<readonly PlaceableRow[]> {
    return this.rows<PlaceableRow>(
      `SELECT v.material_id, v.version, v.draft - 'curve' AS draft, v.derived,
         p.name AS approved_by, v.decided_at AS approved_at
       FROM own_material m JOIN own_material_version v ON v.material_id = m.id AND v.version = m.in_force
       JOIN person p ON p.id = v.decided_by
       WHERE m.organisation_id = $1 ORDER BY lower(m.label), m.id`,
      [organisationId],
    );
  }

  async add(id: string, organisationId: string, label: string, at: Date): Promise<void> {
    await this.rows(
      `INSERT INTO own_material (id, organisation_id, label, latest, in_force, tag, created_at)
       VALUES ($1, $2, $3, 1, NULL, 1, $4)`,
      [id, organisationId, label, at],
    );
  }

  /** Holds a material for the rest of the transaction. @returns null when it is not there */
  hold(organisationId: string, id: string): Promise<OwnMaterialRow | null> {
    return this.row<OwnMaterialRow>(
      `SELECT ${MATERIAL} FROM own_material m WHERE m.id = $1 AND m.organisation_id = $2 FOR UPDATE`,
      [id, organisationId],
    );
  }

  /** Writes down that something of a held material changed, and what is in force and made last now. */
  async touch(id: string, now: Pick<OwnMaterialRow, 'label' | 'latest' | 'in_force'>): Promise<void> {
    await this.rows('UPDATE own_material SET label = $2, latest = $3, in_force = $4, tag = tag + 1 WHERE id = $1', [
      id,
      now.label,
      now.latest,
      now.in_force,
    ]);
  }

  async remove(id: string): Promise<void> {
    await this.rows('DELETE FROM own_material WHERE id = $1', [id]);
  }

  async addVersion(row: {
    readonly id: string;
    readonly material_id: string;
    readonly version: number;
    readonly draft: MaterialDraft;
    readonly derived: DerivedMaterial;
    readonly author_id: string;
    readonly at: Date;
  }): Promise<void> {
    await this.rows(
      `INSERT INTO own_material_version (id, material_id, version, state, draft, author_id, made_at, edited_at,
         derived, "net_MJ_kg", "low_MJ_kg", "high_MJ_kg", workings)
       VALUES ($1, $2, $3, 'draft', $4, $5, $6, $6, $7, $8, $9, $10, $11)`,
      [row.id, row.material_id, row.version, row.draft, row.author_id, row.at, ...derivedColumns(row.derived)],
    );
  }

  async setContent(versionId: string, draft: MaterialDraft, derived: DerivedMaterial, at: Date): Promise<void> {
    await this.rows(
      `UPDATE own_material_version SET draft = $2, edited_at = $3, derived = $4, "net_MJ_kg" = $5, "low_MJ_kg" = $6,
         "high_MJ_kg" = $7, workings = $8 WHERE id = $1`,
      [versionId, draft, at, ...derivedColumns(derived)],
    );
  }

  async removeVersion(versionId: string): Promise<void> {
    await this.rows('DELETE FROM own_material_version WHERE id = $1', [versionId]);
  }

  async putForward(versionId: string, derived: DerivedMaterial, at: Date): Promise<void> {
    await this.rows(
      `UPDATE own_material_version SET state = 'put-forward', put_forward_at = $2, derived = $3, "net_MJ_kg" = $4,
         "low_MJ_kg" = $5, "high_MJ_kg" = $6, workings = $7 WHERE id = $1`,
      [versionId, at, ...derivedColumns(derived)],
    );
  }

  async decide(
    versionId: string,
    decision: {
      readonly state: 'approved' | 'returned';
      readonly by: string;
      readonly reason: string | null;
      readonly at: Date;
    },
  ): Promise<void> {
    await this.rows(
      `UPDATE own_material_version SET state = $2, decided_by = $3, decision_reason = $4, decided_at = $5 WHERE id = $1`,
      [versionId, decision.state, decision.by, decision.reason, decision.at],
    );
  }

  /** Withdraws every approved version of a material up to one. */
  async withdraw(
    materialId: string,
    upTo: number,
    withdrawal: { readonly by: string; readonly reason: string; readonly at: Date },
  ): Promise<void> {
    await this.rows(
      `UPDATE own_material_version SET state = 'withdrawn', withdrawn_by = $3, withdrawal_reason = $4, withdrawn_at = $5
       WHERE material_id = $1 AND version <= $2 AND state = 'approved'`,
      [materialId, upTo, withdrawal.by, withdrawal.reason, withdrawal.at],
    );
  }

  /** Files of a version in the order they were named. */
  async setEvidence(versionId: string, fileIds: readonly string[]): Promise<void> {
    await this.rows('DELETE FROM own_material_evidence WHERE version_id = $1', [versionId]);
    await this.rows(
      `INSERT INTO own_material_evidence (version_id, file_id, position)
       SELECT $1, t.id, t.position FROM unnest($2::uuid[]) WITH ORDINALITY AS t (id, position)`,
      [versionId, fileIds],
    );
  }
}

/** In the order `derived`, net, low, high, `workings`; the driver would take a list for one of PostgreSQL's own. */
function derivedColumns({ workings, ...derived }: DerivedMaterial): readonly unknown[] {
  return [derived, derived.net_MJ_kg, derived.low_MJ_kg, derived.high_MJ_kg, JSON.stringify(workings)];
}
