/**
 * Who may do what: one table, deny by default. The API decides with it; the web client hides what would be refused.
 * An action nobody listed, or a person without the role, gets "no".
 */
export type SiteRoleName = 'manager' | 'inspector' | 'reviewer' | 'viewer';
export const SITE_ROLES: readonly SiteRoleName[] = ['manager', 'inspector', 'reviewer', 'viewer'];
export type OrganisationRole = 'admin' | 'member';
export const ORGANISATION_ROLES: readonly OrganisationRole[] = ['admin', 'member'];

/** Actions on one site and everything in it; decided by the person's one role on that site. */
const SITE_ACTIONS = {
  'site.read': ['manager', 'inspector', 'reviewer', 'viewer'],
  'site.edit': ['manager'],
  'site.delete': ['manager'],
  'site-role.read': ['manager', 'inspector', 'reviewer', 'viewer'],
  'site-role.give': ['manager'],
  'building.create': ['manager', 'inspector'],
  'building.edit': ['manager', 'inspector'],
  'survey.read': ['manager', 'inspector', 'reviewer', 'viewer'],
  'survey.edit': ['manager', 'inspector'],
  'limit.read': ['manager', 'inspector', 'reviewer', 'viewer'],
  'limit.set': ['inspector', 'reviewer'],
  'house-rule.set': ['manager', 'inspector', 'reviewer'],
  'export.create': ['manager', 'inspector', 'reviewer', 'viewer'],
  'history.read': ['manager', 'inspector', 'reviewer', 'viewer'],
} as const satisfies Record<string, readonly SiteRoleName[]>;

/** Actions in the person's own organisation; decided by the member's role there. */
const ORGANISATION_ACTIONS = {
  'organisation.read': ['admin', 'member'],
  'organisation.edit': ['admin'],
  'site.create': ['admin', 'member'],
  'material.read': ['admin', 'member'],
  'material.write': ['admin', 'member'],
  /** Put forward one's own, approve or return another's, withdraw. Nobody approves what they wrote. */
  'material.decide': ['admin', 'member'],
  /** Throw away another member's draft. */
  'material.discard-of-others': ['admin'],
  'file.send': ['admin', 'member'],
  'file.read': ['admin', 'member'],
} as const satisfies Record<string, readonly OrganisationRole[]>;

export type SiteAction = keyof typeof SITE_ACTIONS;
export type OrganisationAction = keyof typeof ORGANISATION_ACTIONS;

/** Actions that only a person of the site's keeper organisation can do, whatever the role table says. */
const KEEPER_ONLY: ReadonlySet<SiteAction> = new Set<SiteAction>(['site.edit', 'site.delete', 'site-role.give']);

export interface SiteStanding {
  readonly role: SiteRoleName | null;
  /** Whether the member acting belongs to the organisation that keeps the site. */
  readonly ofKeeper: boolean;
}

export function canOnSite(standing: SiteStanding, action: SiteAction): boolean {
  if (standing.role === null) return false;
  if (KEEPER_ONLY.has(action) && !standing.ofKeeper) return false;
  return (SITE_ACTIONS[action] as readonly SiteRoleName[]).includes(standing.role);
}

export function canInOrganisation(role: OrganisationRole | null, action: OrganisationAction): boolean {
  return role !== null && (ORGANISATION_ACTIONS[action] as readonly OrganisationRole[]).includes(role);
}

export const siteActions = Object.keys(SITE_ACTIONS) as readonly SiteAction[];
export const organisationActions = Object.keys(ORGANISATION_ACTIONS) as readonly OrganisationAction[];
