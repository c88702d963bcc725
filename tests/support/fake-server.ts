import type { Contract } from '@embertally/shared/contracts/contract';
import { contractUrl } from '@embertally/web/src/lib/contract-url.ts';
import { vi } from 'vitest';
import type { z } from 'zod/mini';

type Schema = z.ZodMiniType | undefined;

export interface FakeRequest {
  readonly method: string;
  readonly path: string;
  readonly query: URLSearchParams;
  readonly headers: Headers;
  readonly body: unknown;
}

type Answer = (request: FakeRequest) => Response | Promise<Response>;

export interface FakeServer {
  /** Everything that was asked, in order. */
  readonly requests: readonly FakeRequest[];
  /** Answers one operation; what is asked and what is answered are held to the contract, so that the fake cannot take or say what the API never would. */
  readonly answer: <P extends Schema, Q extends Schema, B extends Schema, R extends Schema>(
    contract: Contract<P, Q, B, R>,
    params: Record<string, string>,
    body: R extends z.ZodMiniType ? z.input<R> | ((request: FakeRequest) => z.input<R>) : undefined,
  ) => void;
  /** Refuses one operation with problem details. */
  readonly refuse: (
    contract: Pick<Contract, 'id' | 'method' | 'path'>,
    params: Record<string, string>,
    status: number,
    detail: string,
    extra?: Record<string, unknown>,
  ) => void;
  /** Answers one operation with anything at all: a broken body, a pending promise. */
  readonly raw: (
    contract: Pick<Contract, 'id' | 'method' | 'path'>,
    params: Record<string, string>,
    answer: Answer,
  ) => void;
  readonly goOffline: () => void;
  readonly goOnline: () => void;
}

/** Stands in for the network: `fetch` is answered from a table of operations, and an unknown one fails the test loudly. */
export function fakeServer(): FakeServer {
  const answers = new Map<string, Answer>();
  const requests: FakeRequest[] = [];
  let offline = false;
  const put = (contract: Pick<Contract, 'id' | 'method' | 'path'>, params: Record<string, string>, answer: Answer) => {
    answers.set(`${contract.method} ${contractUrl(contract, params)}`, answer);
  };

  vi.stubGlobal('fetch', async (input: string, init: RequestInit = {}): Promise<Response> => {
    if (offline) throw new TypeError('Failed to fetch');
    const url = new URL(input, 'http://127.0.0.1');
    const request: FakeRequest = {
      method: init.method ?? 'GET',
      path: url.pathname,
      query: url.searchParams,
      headers: new Headers(init.headers),
      body: typeof init.body === 'string' ? (JSON.parse(init.body) as unknown) : undefined,
    };
    requests.push(request);
    const answer = answers.get(`${request.method} ${request.path}`);
    if (answer === undefined) throw new Error(`nothing answers ${request.method} ${request.path}`);
    return answer(request);
  });

  return {
    requests,
    answer(contract, params, body) {
      put(contract, params, (request) => {
        // The API refuses a body or a query its contract does not know; so does the stand-in, loudly.
        contract.body?.parse(request.body);
        contract.query?.parse(Object.fromEntries(request.query));
        if (contract.response === undefined) return new Response(null, { status: contract.status });
        const value: unknown = typeof body === 'function' ? (body as (asked: FakeRequest) => unknown)(request) : body;
        return json(contract.status, contract.response.parse(value), 'application/json');
      });
    },
    refuse(contract, params, status, detail, extra = {}) {
      put(contract, params, (request) =>
        json(
          status,
          { type: 'about:blank', title: 'Refused', status, detail, instance: request.path, requestId: 'r-1', ...extra },
          'application/problem+json',
        ),
      );
    },
    raw: put,
    goOffline: () => {
      offline = true;
    },
    goOnline: () => {
      offline = false;
    },
  };
}

function json(status: number, body: unknown, type: string): Response {
  return new Response(JSON.stringify(body), { status, headers: { 'content-type': type } });
}
