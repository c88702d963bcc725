import { SqlRepository } from './sql-repository.ts';

export interface AuditChainKey {
  readonly kind: 'site' | 'organisation' | 'house';
  readonly id: string;
}

export interface AuditRow {
  readonly position: number;
  readonly record: string;
  readonly hash: string;
}

/** Chains of audit events. Each hash covers the one before, so a row that is changed or taken out shows. */
export class AuditRepository extends SqlRepository {
  /** Adds an event; the head row stays locked until the transaction ends, so events of a chain queue up. */
  async add(chain: AuditChainKey, record: string): Promise<void> {
    await this.rows(
      `WITH head AS (
         INSERT INTO audit_chain AS c (kind, id, position, hash)
         VALUES ($1, $2, 1, encode(sha256(convert_to(E'\\n1\\n' || $3, 'UTF8')), 'hex'))
         ON CONFLICT (kind, id) DO UPDATE SET
           position = c.position + 1,
           hash = encode(sha256(convert_to(c.hash || E'\\n' || (c.position + 1)::text || E'\\n' || $3, 'UTF8')), 'hex')
         RETURNING position, hash)
       INSERT INTO audit_event (chain_kind, chain_id, position, record, hash)
       SELECT $1, $2, position, $3, hash FROM head`,
      [chain.kind, chain.id, record],
    );
  }

  /** Events of a chain from newest to oldest, below a position when one is given. */
  page(chain: AuditChainKey, before: number | null, limit: number): Promise<readonly AuditRow[]> {
    return this.rows<AuditRow>(
      `SELECT position, record, hash FROM audit_event
       WHERE chain_kind = $1 AND chain_id = $2 AND ($3::int IS NULL OR position < $3) ORDER BY position DESC LIMIT $4`,
      [chain.kind, chain.id, before, limit],
    );
  }

  /** A whole chain, oldest first, with the head it must end at. */
  async chain(
    chain: AuditChainKey,
  ): Promise<{ rows: readonly AuditRow[]; head: { position: number; hash: string } | null }> {
    const rows = await this.rows<AuditRow>(
      'SELECT position, record, hash FROM audit_event WHERE chain_kind = $1 AND chain_id = $2 ORDER BY position',
      [chain.kind, chain.id],
    );
    const head = await this.row<{ position: number; hash: string }>(
      'SELECT position, hash FROM audit_chain WHERE kind = $1 AND id = $2',
      [chain.kind, chain.id],
    );
    return { rows, head };
  }
}
