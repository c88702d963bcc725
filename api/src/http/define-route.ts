import type { Contract, RoutePolicy } from '@embertally/shared/contracts/contract';
import type { Request, Response } from 'express';
import type { z } from 'zod/mini';
import type { Actor, SiteAccess, Trail } from '../actor.ts';
import type { SignedIn } from '../auth/sessions.ts';

type Schema = z.ZodMiniType;
/** What a schema gives; undefined where the contract has none. */
type Output<S> = [NonNullable<S>] extends [never]
  ? undefined
  : NonNullable<S> extends Schema
    ? z.output<NonNullable<S>>
    : undefined;
type Policy<C> = C extends { readonly policy: infer K } ? K : RoutePolicy;

/** What a handler is given: everything parsed and decided. */
export interface Call<C extends Contract> {
  readonly params: Output<C['params']>;
  readonly query: Output<C['query']>;
  readonly body: Output<C['body']>;
  /** Null on public routes. */
  readonly actor: Policy<C> extends { readonly kind: 'public' } ? null : Actor;
  readonly access: Policy<C> extends { readonly kind: 'site' } ? SiteAccess : null;
  /** The version named by If-Match where the contract asks for one; elsewhere no version at all. */
  readonly version: number;
  readonly trail: Trail;
  readonly signedIn: SignedIn | null;
  readonly request: Request;
}

interface AnswerParts {
  /** Strong tag, quotes included. */
  readonly etag?: string;
  readonly cookies?: readonly string[];
  readonly headers?: Readonly<Record<string, string>>;
}

/** What a handler gives back; it is written in one place. */
export type Answer<Body> = AnswerParts &
  (
    | { readonly kind: 'json'; readonly body: Body }
    /** JSON already written, for answers too large to be built twice. */
    | { readonly kind: 'text'; readonly text: string }
    | { readonly kind: 'nothing' }
    | { readonly kind: 'not-modified' }
    | { readonly kind: 'stream'; readonly write: (request: Request, response: Response) => Promise<void> }
  );

export type Handler<C extends Contract> = (call: Call<C>) => Promise<Answer<Output<C['response']>>>;

export interface Route {
  readonly contract: Contract;
  readonly handle: Handler<Contract>;
}

/** A contract with the function that serves it. The policy stands in the contract, so no route can be without one. */
export function defineRoute<C extends Contract>(contract: C, handle: Handler<C>): Route {
  // `serve-route` parses by this very contract before it calls, so the call is what the handler expects.
  return { contract, handle: handle };
}
