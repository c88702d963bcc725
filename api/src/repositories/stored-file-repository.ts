import type { FileType, StoredFile } from '@embertally/shared/contracts/files';
import { SqlRepository } from './sql-repository.ts';

export interface StoredFileRow {
  readonly id: string;
  readonly organisation_id: string;
  readonly person_id: string;
  readonly name: string;
  readonly type: FileType;
  readonly bytes: number;
  readonly sha256: string;
  readonly file_key: string;
  readonly state: 'arriving' | 'here' | 'leaving';
  readonly created_at: Date;
  readonly sent_by: string;
}

const SELECT = `SELECT f.id, f.organisation_id, f.person_id, f.name, f.type, f.bytes, f.sha256, f.file_key, f.state,
    f.created_at, p.name AS sent_by
  FROM stored_file f JOIN person p ON p.id = f.person_id`;

/** Whatever can point at a file `f`. A new thing that holds files is added here, or its files go after a day. */
const REFERRED = `EXISTS (SELECT 1 FROM own_material_evidence e WHERE e.file_id = f.id)
  OR EXISTS (SELECT 1 FROM entry e WHERE e.photos @> to_jsonb(f.id::text))
  OR EXISTS (SELECT 1 FROM room r WHERE r.photos @> to_jsonb(f.id::text))
  OR EXISTS (SELECT 1 FROM storey s WHERE s.plan_picture->>'file_id' = f.id::text)`;

/** Files people sent, each of one organisation. */
export class StoredFileRepository extends SqlRepository {
  /** A file of the organisation that is there. */
  find(organisationId: string, id: string): Promise<StoredFileRow | null> {
    return this.row<StoredFileRow>(`${SELECT} WHERE f.id = $1 AND f.organisation_id = $2 AND f.state = 'here'`, [
      id,
      organisationId,
    ]);
  }

  /** The files of a version of an own material, in the order they were named. */
  ofVersion(versionId: string): Promise<readonly StoredFileRow[]> {
    return this.rows<StoredFileRow>(
      `${SELECT} JOIN own_material_evidence e ON e.file_id = f.id WHERE e.version_id = $1 ORDER BY e.position`,
      [versionId],
    );
  }

  /** Holds the organisation's account of bytes for the rest of the transaction. @returns bytes it keeps at present */
  async lockBytes(organisationId: string): Promise<number> {
    await this.rows('SELECT id FROM organisation WHERE id = $1 FOR NO KEY UPDATE', [organisationId]);
    const found = await this.row<{ bytes: string }>(
      `SELECT coalesce(sum(bytes), 0)::bigint AS bytes FROM stored_file WHERE organisation_id = $1`,
      [organisationId],
    );
    return Number(found?.bytes ?? 0);
  }

  async add(row: Omit<StoredFileRow, 'state' | 'sent_by'>): Promise<void> {
    await this.rows(
      `INSERT INTO stored_file (id, organisation_id, person_id, name, type, bytes, sha256, file_key, state, created_at)
       VALUES ($1, $2, $3, $4, $5, $6, $7, $8, 'arriving', $9) ON CONFLICT (id) DO NOTHING`,
      [
        row.id,
        row.organisation_id,
        row.person_id,
        row.name,
        row.type,
        row.bytes,
        row.sha256,
        row.file_key,
        row.created_at,
      ],
    );
  }

  /** @returns whether the store's copy still counts */
  async arrived(id: string): Promise<boolean> {
    const moved = await this.rows(
      `UPDATE stored_file SET state = 'here' WHERE id = $1 AND state IN ('arriving', 'here') RETURNING id`,
      [id],
    );
    return moved.length > 0;
  }

  /** Marks what is to go: what did not arrive by one moment, what nothing refers to and is older than another. */
  async markLeaving(before: { readonly arriving: Date; readonly unreferred: Date }): Promise<readonly StoredFileRow[]> {
    const old = await this.rows<{ id: string }>(
      `SELECT f.id FROM stored_file f
       WHERE f.state = 'leaving' OR (f.state = 'arriving' AND f.created_at < $1)
         OR (f.state = 'here' AND f.created_at < $2 AND NOT (${REFERRED}))
       ORDER BY f.created_at LIMIT 200 FOR UPDATE OF f SKIP LOCKED`,
      [before.arriving, before.unreferred],
    );
    // Read again now that the rows are held: somebody may have attached one between.
    return this.rows<StoredFileRow>(
      `UPDATE stored_file f SET state = 'leaving' WHERE f.id = ANY($1::uuid[]) AND NOT (${REFERRED}) RETURNING f.id, f.file_key`,
      [old.map(({ id }) => id)],
    );
  }

  async forget(id: string): Promise<void> {
    await this.rows(`DELETE FROM stored_file WHERE id = $1 AND state = 'leaving'`, [id]);
  }

  /** Files of the organisation among the ids, held so that none of them leaves before the transaction ends. */
  async hold(organisationId: string, ids: readonly string[]): Promise<ReadonlySet<string>> {
    const found = await this.rows<{ id: string }>(
      `SELECT id FROM stored_file WHERE id = ANY($1::uuid[]) AND organisation_id = $2 AND state = 'here' ORDER BY id FOR SHARE`,
      [ids, organisationId],
    );
    return new Set(found.map(({ id }) => id));
  }
}

/** What an answer says of a file. */
export function storedFile(row: StoredFileRow): StoredFile {
  return {
    id: row.id,
    name: row.name,
    type: row.type,
    bytes: row.bytes,
    sha256: row.sha256,
    sent_by: row.sent_by,
    sent_at: row.created_at.toISOString(),
  };
}
