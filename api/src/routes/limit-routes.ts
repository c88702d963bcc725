import { createLimit, deleteLimit, editLimit, listLimits } from '@embertally/shared/contracts/limits';
import { defineRoute, type Route } from '../http/define-route.ts';
import { versionTag } from '../http/etags.ts';
import type { LimitService } from '../services/limit-service.ts';

export function limitRoutes(limits: LimitService): Route[] {
  return [
    defineRoute(listLimits, async ({ params }) => ({
      kind: 'json',
      body: { items: await limits.list(params.buildingId) },
    })),
    defineRoute(createLimit, async ({ actor, access, params, body, trail }) => {
      const limit = await limits.create(actor, access, params.buildingId, body, trail);
      return { kind: 'json', body: limit, etag: versionTag(limit.version) };
    }),
    defineRoute(editLimit, async ({ actor, access, params, version, body, trail }) => {
      const limit = await limits.edit(actor, access, params.limitId, version, body, trail);
      return { kind: 'json', body: limit, etag: versionTag(limit.version) };
    }),
    defineRoute(deleteLimit, async ({ actor, access, params, version, trail }) => {
      await limits.remove(actor, access, params.limitId, version, trail);
      return { kind: 'nothing' };
    }),
  ];
}
