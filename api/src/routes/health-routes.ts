import { readLive, readReady } from '@embertally/shared/contracts/health';
import type { DataSource } from 'typeorm';
import { defineRoute, type Route } from '../http/define-route.ts';

export function healthRoutes(database: DataSource): Route[] {
  return [
    defineRoute(readLive, () => Promise.resolve({ kind: 'json', body: { live: true } })),
    defineRoute(readReady, async () => {
      await database.query('SELECT 1');
      return { kind: 'json', body: { ready: true as const } };
    }),
  ];
}
