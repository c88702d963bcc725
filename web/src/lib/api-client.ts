import type { Contract } from '@embertally/shared/contracts/contract';
import { problemSchema, type Problem } from '@embertally/shared/contracts/problem';
import type { z } from 'zod/mini';
import { ContractError, OfflineError, problemError } from './api-errors.ts';
import { contractUrl } from './contract-url.ts';
import { sessionEnded } from './session-ended.ts';

type Schema = z.ZodMiniType | undefined;
type In<S extends Schema> = S extends z.ZodMiniType ? z.input<S> : undefined;
type Out<S extends Schema> = S extends z.ZodMiniType ? z.output<S> : undefined;
type Part<Name extends string, S extends Schema> = [S] extends [z.ZodMiniType]
  ? { readonly [K in Name]: In<S> }
  : { readonly [K in Name]?: undefined };
type QueryPart<S extends Schema> = [S] extends [z.ZodMiniType]
  ? { readonly query?: In<S> }
  : { readonly query?: undefined };

export type CallInput<P extends Schema, Q extends Schema, B extends Schema> = Part<'params', P> &
  QueryPart<Q> &
  Part<'body', B> & {
    /** The version that was read of a mutable resource; sent as its strong ETag. */
    readonly ifMatch?: number;
    readonly signal?: AbortSignal;
  };

/**
 * Calls one operation of the API and parses its answer with the contract.
 *
 * Returns the parsed body, or `undefined` where the contract has none. Throws `OfflineError` when nothing was
 * answered, a `ProblemError` class by status for an answer that is not 2xx, `ContractError` when the answer is not what
 * the contract promises. An aborted call rejects with the signal's own reason.
 */
export async function call<
  P extends Schema = undefined,
  Q extends Schema = undefined,
  B extends Schema = undefined,
  R extends Schema = undefined,
>(contract: Contract<P, Q, B, R>, input: CallInput<P, Q, B>): Promise<Out<R>> {
  const url = contractUrl(
    contract,
    input.params as Record<string, string> | undefined,
    input.query as Record<string, string | number | boolean | undefined> | undefined,
  );
  const response = await send(contract, url, input.body, input.ifMatch, input.signal);
  if (!response.ok) {
    // Asked for something that needs a session and had none: whoever shows the screens hears of it, whatever asked.
    if (response.status === 401 && contract.policy.kind !== 'public') sessionEnded.set(true);
    throw problemError(await readProblem(contract, response), retryAfter(response));
  }
  const schema = contract.response;
  if (schema === undefined) return undefined as Out<R>;
  const parsed = schema.safeParse(await readJson(contract, response));
  if (!parsed.success) throw new ContractError(contract.id, where(parsed.error.issues), { cause: parsed.error });
  return parsed.data as Out<R>;
}

async function send(
  contract: Pick<Contract, 'method'>,
  url: string,
  body: unknown,
  ifMatch: number | undefined,
  signal: AbortSignal | undefined,
): Promise<Response> {
  const headers = new Headers({ accept: 'application/json, application/problem+json' });
  // A header no form and no foreign page can send: one of the three layers against forged requests.
  if (contract.method !== 'GET') headers.set('x-embertally', 'web');
  if (body !== undefined) headers.set('content-type', 'application/json');
  if (ifMatch !== undefined) headers.set('if-match', `"v${ifMatch}"`);
  try {
    return await fetch(url, {
      method: contract.method,
      headers,
      credentials: 'same-origin',
      ...(body === undefined ? {} : { body: JSON.stringify(body) }),
      ...(signal === undefined ? {} : { signal }),
    });
  } catch (error) {
    if (signal?.aborted) throw error;
    throw new OfflineError({ cause: error });
  }
}

async function readJson(contract: Pick<Contract, 'id'>, response: Response): Promise<unknown> {
  try {
    return await response.json();
  } catch (error) {
    throw new ContractError(contract.id, 'the answer is not JSON', { cause: error });
  }
}

async function readProblem(contract: Pick<Contract, 'id'>, response: Response): Promise<Problem> {
  // Something between us and the server (a proxy, a portal) may answer a failure in its own words.
  if (!(response.headers.get('content-type') ?? '').includes('json')) return wordlessProblem(response);
  const parsed = problemSchema.safeParse(await readJson(contract, response));
  return parsed.success ? parsed.data : wordlessProblem(response);
}

function wordlessProblem(response: Response): Problem {
  return {
    type: 'about:blank',
    title: response.statusText,
    status: response.status,
    detail: `The server answered ${response.status} and gave no reason. What you typed is kept; try again.`,
    instance: response.url,
    requestId: '',
  };
}

function retryAfter(response: Response): number | null {
  const seconds = Number(response.headers.get('retry-after') ?? Number.NaN);
  return Number.isFinite(seconds) ? seconds : null;
}

function where(issues: readonly { path: readonly PropertyKey[]; message: string }[]): string {
  return issues
    .slice(0, 3)
    .map((issue) => `${issue.path.map(String).join('.') || 'answer'}: ${issue.message}`)
    .join('; ');
}
