import { readLive, readReady } from '@embertally/shared/contracts/health';
import { defineRoute, type Route } from '../http/define-route.ts';
import type { HealthService } from '../services/health-service.ts';

export function healthRoutes(health: HealthService): Route[] {
  return [
    defineRoute(readLive, () => Promise.resolve({ kind: 'json', body: { live: true as const } })),
    defineRoute(readReady, async () => {
      await health.ready();
      return { kind: 'json', body: { ready: true as const } };
    }),
  ];
}
