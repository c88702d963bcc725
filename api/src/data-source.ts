import 'reflect-metadata';
import { DataSource } from 'typeorm';
import { ALL_ENTITIES } from './entities/all-entities.ts';
import { ALL_MIGRATIONS } from './migrations/all-migrations.ts';

export interface DatabaseSettings {
  readonly url: string;
  /** Connections this process may hold at most; default 10. */
  readonly poolSize?: number;
}

/**
 * A source of connections; the caller initialises and destroys it. The schema is changed by migrations only.
 * A server that is down is told within 3 s, so that a person gets an answer instead of a hanging page.
 */
export function dataSource({ url, poolSize = 10 }: DatabaseSettings): DataSource {
  return new DataSource({
    type: 'postgres',
    url,
    entities: ALL_ENTITIES,
    migrations: ALL_MIGRATIONS,
    migrationsTableName: 'migration',
    synchronize: false,
    migrationsRun: false,
    logging: false,
    uuidExtension: 'pgcrypto',
    installExtensions: false,
    poolSize,
    connectTimeoutMS: 3000,
    extra: { connectionTimeoutMillis: 3000, statement_timeout: 30_000, application_name: 'embertally' },
  });
}
