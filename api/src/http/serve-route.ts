import { canInOrganisation, canOnSite } from '@embertally/shared/policy/policy';
import type { Contract } from '@embertally/shared/contracts/contract';
import type { Request, RequestHandler, Response } from 'express';
import type { z } from 'zod/mini';
import type { Actor, SiteAccess, Trail } from '../actor.ts';
import type { Sessions, SignedIn } from '../auth/sessions.ts';
import { Fault, type InputFault } from '../fault.ts';
import type { AccessService } from '../services/access-service.ts';
import type { Answer, Call, Route } from './define-route.ts';
import { NO_VERSION, ifMatchVersion } from './etags.ts';
import { inputFaults } from './input-faults.ts';
import { readJsonBody } from './json-body.ts';
import { checkOrigin } from './origin-check.ts';
import { requestIdOf } from './request-id.ts';
import type { RequestRate } from './request-rate.ts';
import { textFaults } from './text-faults.ts';

export interface Gate {
  readonly sessions: Sessions;
  readonly access: AccessService;
  readonly rate: RequestRate;
  readonly baseUrl: URL;
  /** Answers are parsed by their contract in tests and development; in production the client does it. */
  readonly checkAnswers: boolean;
}

/** The order every request goes through; it is nowhere else. */
export function serveRoute({ contract, handle }: Route, gate: Gate): RequestHandler {
  return async (request, response) => {
    const trail: Trail = { requestId: requestIdOf(response), ip: request.ip ?? 'unknown' };
    const signedIn = await findSession(request, contract, gate);
    checkOrigin(request, gate.baseUrl);
    if (contract.costly === true) gate.rate.take(signedIn?.actor.memberId ?? trail.ip);
    const body = contract.body === undefined ? undefined : await readJsonBody(request, response, contract.maxBodyBytes);
    const input = parseInput(contract, request, body);
    const access = await authorise(contract, input.params, signedIn?.actor ?? null, trail, gate);
    const version = contract.ifMatch === true ? ifMatchVersion(request) : NO_VERSION;
    const call = { ...input, actor: signedIn?.actor ?? null, access, version, trail, signedIn, request };
    // Policy decides which of these can be null; the types of `Call` say the same.
    const answer = await handle(call as Call<Contract>);
    if (gate.checkAnswers) checkAnswer(contract, answer);
    await present(contract, answer, request, response);
  };
}

async function findSession(request: Request, contract: Contract, gate: Gate): Promise<SignedIn | null> {
  const token = gate.sessions.readCookie(request.headers.cookie);
  if (contract.policy.kind === 'public') return null;
  const signedIn = token === null ? null : await gate.sessions.find(token);
  if (signedIn === null) {
    throw new Fault(
      'not-signed-in',
      'not-signed-in',
      'You are not signed in, or your session has ended. Sign in and try again.',
    );
  }
  return signedIn;
}

interface Input {
  readonly params: unknown;
  readonly query: unknown;
  readonly body: unknown;
}

function parseInput(contract: Contract, request: Request, body: unknown): Input {
  // An address whose id is no id names nothing.
  const params = contract.params?.safeParse(request.params);
  if (params?.success === false) throw Fault.notFound();
  const faults: InputFault[] = [];
  const read = (root: '' | '/query', schema: z.ZodMiniType | undefined, raw: unknown): unknown => {
    if (schema === undefined) return undefined;
    const unreadable = textFaults(raw, root);
    if (unreadable.length > 0) {
      faults.push(...unreadable);
      return undefined;
    }
    const parsed = schema.safeParse(raw, { reportInput: true });
    if (!parsed.success) faults.push(...inputFaults(root, parsed.error.issues));
    return parsed.data;
  };
  const query = read('/query', contract.query, request.query);
  const parsedBody = read('', contract.body, body);
  if (faults.length > 0) throw Fault.invalid(faults);
  return { params: params?.data, query, body: parsedBody };
}

async function authorise(
  contract: Contract,
  params: unknown,
  actor: Actor | null,
  trail: Trail,
  gate: Gate,
): Promise<SiteAccess | null> {
  const { policy } = contract;
  if (policy.kind === 'public' || policy.kind === 'signed-in') return null;
  if (actor === null) throw new Fault('not-signed-in', 'not-signed-in', 'You are not signed in.');
  if (policy.kind === 'organisation') {
    if (!canInOrganisation(actor.organisationRole, policy.action)) {
      await gate.access.refusedInOrganisation(actor, policy.action, trail);
      throw new Fault(
        'forbidden',
        'role-too-small',
        'Your role in the organisation does not allow this; nothing was changed.',
      );
    }
    return null;
  }
  const id = (params as Readonly<Record<string, string>>)[policy.param];
  const access = id === undefined ? null : await gate.access.find(actor, policy.of, id);
  if (access === null) throw Fault.notFound();
  if (!canOnSite(access, policy.action)) {
    await gate.access.refusedOnSite(actor, access, policy.action, trail);
    throw new Fault(
      'forbidden',
      'role-too-small',
      `As ${access.role} of this site you cannot do this; nothing was changed. A manager of the site can give you another role.`,
    );
  }
  return access;
}

function checkAnswer(contract: Contract, answer: Answer<unknown>): void {
  if (contract.response === undefined) return;
  if (answer.kind !== 'json' && answer.kind !== 'text') return;
  const body: unknown = answer.kind === 'json' ? JSON.parse(JSON.stringify(answer.body)) : JSON.parse(answer.text);
  const parsed = contract.response.safeParse(body);
  if (!parsed.success) {
    throw new Error(`The answer of ${contract.id} breaks its contract: ${JSON.stringify(parsed.error.issues)}`);
  }
}

async function present(
  contract: Contract,
  answer: Answer<unknown>,
  request: Request,
  response: Response,
): Promise<void> {
  if (answer.cookies !== undefined) for (const cookie of answer.cookies) response.append('Set-Cookie', cookie);
  if (answer.headers !== undefined) response.set(answer.headers);
  if (answer.etag !== undefined) response.set('ETag', answer.etag);
  switch (answer.kind) {
    case 'json':
      response.status(contract.status).type('application/json').send(JSON.stringify(answer.body));
      return;
    case 'text':
      response.status(contract.status).type('application/json').send(answer.text);
      return;
    case 'nothing':
      response.status(contract.status).end();
      return;
    case 'not-modified':
      response.status(304).end();
      return;
    case 'stream':
      response.status(contract.status);
      await answer.write(request, response);
  }
}
