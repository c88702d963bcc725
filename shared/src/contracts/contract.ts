import type { z } from 'zod/mini';
import type { OrganisationAction, SiteAction } from '../policy/policy.ts';

/**
 * Who may call a route, stated with it. `site` names where the site is found: the path parameter that holds a site,
 * building, survey, limit or export id. A person without any role there gets 404, one whose role is too small 403.
 */
export type RoutePolicy =
  | { readonly kind: 'public'; readonly why: string }
  | { readonly kind: 'signed-in' }
  | { readonly kind: 'organisation'; readonly action: OrganisationAction }
  | {
      readonly kind: 'site';
      readonly action: SiteAction;
      readonly of: 'site' | 'building' | 'survey' | 'limit' | 'export';
      readonly param: string;
    };

type Schema = z.ZodMiniType;

/** One operation of the API: the API validates with it, the web client calls and parses with it, OpenAPI is made of it. */
export interface Contract<
  P extends Schema | undefined = Schema | undefined,
  Q extends Schema | undefined = Schema | undefined,
  B extends Schema | undefined = Schema | undefined,
  R extends Schema | undefined = Schema | undefined,
  K extends RoutePolicy = RoutePolicy,
> {
  /** Noun and verb, as `sites.create`. */
  readonly id: string;
  readonly method: 'GET' | 'POST' | 'PATCH' | 'PUT' | 'DELETE';
  /** Express form: `/api/sites/:siteId`. */
  readonly path: string;
  readonly summary: string;
  readonly policy: K;
  readonly params?: P;
  readonly query?: Q;
  readonly body?: B;
  /** What the body looks like in the description, where the service lists the faults of a looser `body` itself. */
  readonly bodyShape?: Schema;
  /** Largest body taken; 64 KiB when nothing is said. */
  readonly maxBodyBytes?: number;
  /** The body is a file: its types by media type, each with the most bytes taken. The handler reads it as it comes in. */
  readonly upload?: Readonly<Record<string, { readonly maxBytes: number }>>;
  /** Takes the server some work: one person may ask for it only so often. */
  readonly costly?: true;
  readonly response?: R;
  readonly status: 200 | 201 | 202 | 204;
  /** Mutable resource: the caller must send `If-Match` with the strong ETag it read. */
  readonly ifMatch?: true;
  /** Answers that are not JSON (PDF, event stream) are named by media type and have no response schema. */
  readonly media?: 'application/pdf' | 'application/octet-stream' | 'text/event-stream' | 'text/html';
}

export function defineContract<
  P extends Schema | undefined = undefined,
  Q extends Schema | undefined = undefined,
  B extends Schema | undefined = undefined,
  R extends Schema | undefined = undefined,
  const K extends RoutePolicy = RoutePolicy,
>(contract: Contract<P, Q, B, R, K>): Contract<P, Q, B, R, K> {
  return contract;
}
