import type { OrganisationRole, SiteRoleName } from '@embertally/shared/policy/policy';

/** Who is acting: a signed-in person in the organisation they act for. */
export interface Actor {
  readonly personId: string;
  readonly name: string;
  readonly memberId: string;
  readonly organisationId: string;
  readonly organisationName: string;
  readonly organisationRole: OrganisationRole;
}

/** What the actor's one role on a site opens, with the ids found on the way there. */
export interface SiteAccess {
  readonly siteId: string;
  readonly role: SiteRoleName;
  readonly ofKeeper: boolean;
  readonly buildingId: string | null;
  readonly surveyId: string | null;
  /** Sequence of the survey when the request names one. */
  readonly sequence: number | null;
}

/** Where a request came from; written into the audit. */
export interface Trail {
  readonly requestId: string;
  readonly ip: string;
}
