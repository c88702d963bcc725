import type { DataSource, EntityManager } from 'typeorm';

/** Where statements go: into a transaction, or each on its own. Repositories are made on it. */
export type Statements = EntityManager;

/** The database as everything above the repositories sees it. */
export class Database {
  private readonly source: DataSource;

  constructor(source: DataSource) {
    this.source = source;
  }

  /** Statements on their own, outside any transaction. */
  get statements(): Statements {
    return this.source.manager;
  }

  get isOpen(): boolean {
    return this.source.isInitialized;
  }

  /** All of the work or nothing of it. */
  transaction<T>(work: (statements: Statements) => Promise<T>): Promise<T> {
    return this.source.transaction(work);
  }

  async open(): Promise<void> {
    await this.source.initialize();
  }

  async close(): Promise<void> {
    if (this.source.isInitialized) await this.source.destroy();
  }

  /** Answers when the database does. */
  async ping(): Promise<void> {
    await this.source.query('SELECT 1');
  }
}
