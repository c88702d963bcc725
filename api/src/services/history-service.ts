import type { HistoryEvent } from '@embertally/shared/contracts/history';
import type { Database } from '../repositories/database.ts';
import { AuditRepository } from '../repositories/audit-repository.ts';
import type { AuditRecord } from './audit-record.ts';

const PAGE = 50;

/** A site's history for reading. Network addresses and request numbers stay in the chain. */
export class HistoryService {
  private readonly database: Database;

  constructor(database: Database) {
    this.database = database;
  }

  async ofSite(
    siteId: string,
    query: { readonly before?: number | undefined; readonly limit?: number | undefined },
  ): Promise<{ items: HistoryEvent[]; next_before: number | null }> {
    const limit = query.limit ?? PAGE;
    const rows = await new AuditRepository(this.database.statements).page(
      { kind: 'site', id: siteId },
      query.before ?? null,
      limit,
    );
    const items = rows.map((row): HistoryEvent => {
      const record = JSON.parse(row.record) as AuditRecord;
      return {
        position: row.position,
        at: record.at,
        action: record.action,
        by: record.by === null ? null : { name: record.by.name, organisation_name: record.by.organisation_name },
        object: record.object,
        facts: record.facts,
        hash: row.hash,
      };
    });
    const last = items.at(-1);
    return { items, next_before: last !== undefined && last.position > 1 ? last.position : null };
  }
}
