import type { Database } from '../repositories/database.ts';

/** Whether the process can do its work at this moment. */
export class HealthService {
  private readonly database: Database;

  constructor(database: Database) {
    this.database = database;
  }

  /** @throws what the database client throws when the database does not answer */
  ready(): Promise<void> {
    return this.database.ping();
  }
}
