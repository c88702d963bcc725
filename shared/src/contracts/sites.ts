import { z } from 'zod/mini';
import { SITE_ROLES, type SiteRoleName } from '../policy/policy.ts';
import { defineContract } from './contract.ts';
import { emailSchema } from './sessions.ts';

export const siteRoleSchema = z.enum(SITE_ROLES as [SiteRoleName, ...SiteRoleName[]]);
const name = z.string().check(z.trim(), z.minLength(1), z.maxLength(200));
const address = z.string().check(z.trim(), z.maxLength(500));
const timeZone = z.string().check(z.minLength(1), z.maxLength(60));
const siteId = z.strictObject({ siteId: z.uuid() });

export const siteSummarySchema = z.strictObject({
  id: z.uuid(),
  name: z.string(),
  address: z.string(),
  time_zone: z.string(),
  keeper: z.strictObject({ id: z.uuid(), name: z.string() }),
  my_role: siteRoleSchema,
  of_keeper: z.boolean(),
  buildings: z.int(),
  rooms: z.int(),
  rooms_over: z.int(),
  rooms_near: z.int(),
  version: z.int(),
  updated_at: z.iso.datetime(),
});
export type SiteSummary = z.infer<typeof siteSummarySchema>;

export const buildingSummarySchema = z.strictObject({
  id: z.uuid(),
  site_id: z.uuid(),
  name: z.string(),
  /** The working survey; exactly one. */
  survey_id: z.uuid(),
  storeys: z.int(),
  rooms: z.int(),
  rooms_over: z.int(),
  rooms_near: z.int(),
  version: z.int(),
  updated_at: z.iso.datetime(),
});
export type BuildingSummary = z.infer<typeof buildingSummarySchema>;

export const sitePersonSchema = z.strictObject({
  id: z.uuid(),
  member_id: z.uuid(),
  name: z.string(),
  organisation_name: z.string(),
  role: siteRoleSchema,
});

export type SitePerson = z.infer<typeof sitePersonSchema>;

export const siteSchema = z.strictObject({
  ...siteSummarySchema.shape,
  building_list: z.array(buildingSummarySchema),
  people: z.array(sitePersonSchema),
});
export type Site = z.infer<typeof siteSchema>;

export const listSites = defineContract({
  id: 'sites.list',
  method: 'GET',
  path: '/api/sites',
  summary: 'Sites I have a role on',
  policy: { kind: 'signed-in' },
  query: z.strictObject({
    cursor: z.optional(z.string().check(z.maxLength(300))),
    limit: z.optional(z.coerce.number().check(z.int(), z.minimum(1), z.maximum(100))),
    search: z.optional(z.string().check(z.maxLength(200))),
  }),
  response: z.strictObject({ items: z.array(siteSummarySchema), next_cursor: z.nullable(z.string()) }),
  status: 200,
});

export const createSite = defineContract({
  id: 'sites.create',
  method: 'POST',
  path: '/api/sites',
  summary: 'Make a site; the maker becomes its manager',
  policy: { kind: 'organisation', action: 'site.create' },
  body: z.strictObject({ id: z.uuid(), name, address, time_zone: timeZone }),
  response: siteSchema,
  status: 201,
});

export const readSite = defineContract({
  id: 'sites.read',
  method: 'GET',
  path: '/api/sites/:siteId',
  summary: 'One site: its buildings and people',
  policy: { kind: 'site', action: 'site.read', of: 'site', param: 'siteId' },
  params: siteId,
  response: siteSchema,
  status: 200,
});

export const editSite = defineContract({
  id: 'sites.edit',
  method: 'PATCH',
  path: '/api/sites/:siteId',
  summary: 'Change a site’s name, address or time zone',
  policy: { kind: 'site', action: 'site.edit', of: 'site', param: 'siteId' },
  params: siteId,
  body: z.strictObject({ name: z.optional(name), address: z.optional(address), time_zone: z.optional(timeZone) }),
  response: siteSchema,
  status: 200,
  ifMatch: true,
});

export const giveSiteRole = defineContract({
  id: 'site-roles.give',
  method: 'POST',
  path: '/api/sites/:siteId/roles',
  summary: 'Give a person of any organisation a role on the site',
  policy: { kind: 'site', action: 'site-role.give', of: 'site', param: 'siteId' },
  params: siteId,
  body: z.strictObject({ id: z.uuid(), email: emailSchema, role: siteRoleSchema }),
  response: sitePersonSchema,
  status: 201,
});

export const takeSiteRole = defineContract({
  id: 'site-roles.take',
  method: 'DELETE',
  path: '/api/sites/:siteId/roles/:roleId',
  summary: 'Take a role away; the last manager stays',
  policy: { kind: 'site', action: 'site-role.give', of: 'site', param: 'siteId' },
  params: z.strictObject({ siteId: z.uuid(), roleId: z.uuid() }),
  status: 204,
});
