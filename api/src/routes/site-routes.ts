import {
  createSite,
  editSite,
  giveSiteRole,
  listSites,
  readSite,
  takeSiteRole,
} from '@embertally/shared/contracts/sites';
import { readHistory } from '@embertally/shared/contracts/history';
import { defineRoute, type Route } from '../http/define-route.ts';
import { versionTag } from '../http/etags.ts';
import type { HistoryService } from '../services/history-service.ts';
import type { SiteRoleService } from '../services/site-role-service.ts';
import type { SiteService } from '../services/site-service.ts';

export function siteRoutes(sites: SiteService, roles: SiteRoleService, history: HistoryService): Route[] {
  return [
    defineRoute(listSites, async ({ actor, query }) => ({ kind: 'json', body: await sites.list(actor, query) })),
    defineRoute(createSite, async ({ actor, body, trail }) => {
      const site = await sites.create(actor, body, trail);
      return { kind: 'json', body: site, etag: versionTag(site.version) };
    }),
    defineRoute(readSite, async ({ actor, access }) => {
      const site = await sites.read(actor, access.siteId);
      return { kind: 'json', body: site, etag: versionTag(site.version) };
    }),
    defineRoute(editSite, async ({ actor, access, version, body, trail }) => {
      const site = await sites.edit(actor, access.siteId, version, body, trail);
      return { kind: 'json', body: site, etag: versionTag(site.version) };
    }),
    defineRoute(giveSiteRole, async ({ actor, access, body, trail }) => ({
      kind: 'json',
      body: await roles.give(actor, access.siteId, body, trail),
    })),
    defineRoute(takeSiteRole, async ({ actor, access, params, trail }) => {
      await roles.take(actor, access.siteId, params.roleId, trail);
      return { kind: 'nothing' };
    }),
    defineRoute(readHistory, async ({ access, query }) => ({
      kind: 'json',
      body: await history.ofSite(access.siteId, query),
    })),
  ];
}
