import type { EntityManager } from 'typeorm';

/**
 * A repository works inside whatever the manager stands for: a transaction or single statements. `rows` gives back
 * what the statement returns, also for UPDATE and DELETE … RETURNING, which the driver wraps in a pair.
 */
export abstract class SqlRepository {
  protected readonly manager: EntityManager;

  constructor(manager: EntityManager) {
    this.manager = manager;
  }

  protected async rows<Row>(sql: string, values: readonly unknown[] = []): Promise<readonly Row[]> {
    const result: unknown = await this.manager.query(sql, [...values]);
    if (!Array.isArray(result)) return [];
    const [first, count] = result as unknown[];
    return (Array.isArray(first) && typeof count === 'number' ? first : result) as readonly Row[];
  }

  protected async row<Row>(sql: string, values: readonly unknown[] = []): Promise<Row | null> {
    return (await this.rows<Row>(sql, values))[0] ?? null;
  }
}
