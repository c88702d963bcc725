import { createSite, editSite, listSites, readSite, takeSiteRole } from '@embertally/shared/contracts/sites';
import { listCautions } from '@embertally/shared/contracts/cautions';
import { signIn } from '@embertally/shared/contracts/sessions';
import { call } from '@embertally/web/src/lib/api-client.ts';
import {
  ConflictError,
  ContractError,
  NotAllowedError,
  NotFoundError,
  NotSignedInError,
  OfflineError,
  ProblemError,
  ServerFailedError,
  StaleError,
  TooManyError,
  UnprocessableError,
} from '@embertally/web/src/lib/api-errors.ts';
import { sessionEnded } from '@embertally/web/src/lib/session-ended.ts';
import { beforeEach, describe, expect, it } from 'vitest';
import { fakeServer } from '../../support/fake-server.ts';
import { sampleSite, uuid } from '../../support/web-samples.ts';

beforeEach(() => {
  sessionEnded.set(false);
});

describe('what is sent', () => {
  it('fills the path, appends the query and asks for JSON', async () => {
    const server = fakeServer();
    server.answer(listSites, {}, { items: [], next_cursor: null });
    await call(listSites, { query: { search: 'salt & marsh', limit: 5 } });
    const [request] = server.requests;
    expect(request?.path).toBe('/api/sites');
    expect(request?.query.get('search')).toBe('salt & marsh');
    expect(request?.query.get('limit')).toBe('5');
    expect(request?.headers.get('x-embertally')).toBeNull();
  });

  it('marks every unsafe request as its own and sends the body as JSON', async () => {
    const server = fakeServer();
    server.answer(createSite, {}, sampleSite());
    await call(createSite, { body: { id: uuid(10), name: 'Store', address: '', time_zone: 'UTC' } });
    const [request] = server.requests;
    expect(request?.headers.get('x-embertally')).toBe('web');
    expect(request?.headers.get('content-type')).toBe('application/json');
    expect(request?.body).toEqual({ id: uuid(10), name: 'Store', address: '', time_zone: 'UTC' });
  });

  it('sends the version it read as a strong ETag', async () => {
    const server = fakeServer();
    server.answer(editSite, { siteId: uuid(10) }, sampleSite());
    await call(editSite, { params: { siteId: uuid(10) }, body: { name: 'New name' }, ifMatch: 3 });
    expect(server.requests[0]?.headers.get('if-match')).toBe('"v3"');
  });
});

describe('what comes back', () => {
  it('is parsed by the contract', async () => {
    const server = fakeServer();
    server.answer(readSite, { siteId: uuid(10) }, sampleSite());
    const site = await call(readSite, { params: { siteId: uuid(10) } });
    expect(site.people[0]?.name).toBe('Mara Tidewell');
  });

  it('is nothing where the contract has no body', async () => {
    const server = fakeServer();
    server.answer(takeSiteRole, { siteId: uuid(10), roleId: uuid(40) }, undefined);
    expect(await call(takeSiteRole, { params: { siteId: uuid(10), roleId: uuid(40) } })).toBeUndefined();
  });

  it('is a named error when it breaks the contract, saying which operation and field', async () => {
    const server = fakeServer();
    server.raw(listCautions, {}, () => Response.json({ items: [{ id: 1, title: 'x', text: 'y' }] }));
    const failure = await call(listCautions, {}).catch((error: unknown) => error);
    expect(failure).toBeInstanceOf(ContractError);
    expect((failure as Error).message).toContain('cautions.list');
    expect((failure as Error).message).toContain('items.0.id');
  });

  it('is a named error when it is not JSON at all', async () => {
    const server = fakeServer();
    server.raw(listCautions, {}, () => new Response('<html>', { headers: { 'content-type': 'text/html' } }));
    await expect(call(listCautions, {})).rejects.toBeInstanceOf(ContractError);
  });

  it.each([
    [401, NotSignedInError],
    [403, NotAllowedError],
    [404, NotFoundError],
    [409, ConflictError],
    [412, StaleError],
    [422, UnprocessableError],
    [428, StaleError],
    [429, TooManyError],
    [500, ServerFailedError],
    [503, ServerFailedError],
    [418, ProblemError],
  ])('of status %i is its own class with the server’s words', async (status, Class) => {
    const server = fakeServer();
    server.refuse(listCautions, {}, status, 'What happened and what to do.');
    const failure = await call(listCautions, {}).catch((error: unknown) => error);
    expect(failure).toBeInstanceOf(Class);
    expect((failure as ProblemError).message).toBe('What happened and what to do.');
    expect((failure as ProblemError).status).toBe(status);
  });

  it('keeps how long the server asked to wait', async () => {
    const server = fakeServer();
    server.raw(
      listCautions,
      {},
      () => new Response('busy', { status: 503, headers: { 'retry-after': '7', 'content-type': 'text/plain' } }),
    );
    const failure = (await call(listCautions, {}).catch((error: unknown) => error)) as ProblemError;
    expect(failure.retryAfter_s).toBe(7);
    expect(failure.message).toContain('503');
  });

  it('is “offline” when nothing was answered', async () => {
    const server = fakeServer();
    server.goOffline();
    await expect(call(listCautions, {})).rejects.toBeInstanceOf(OfflineError);
  });

  it('is the abort itself when the caller gave up', async () => {
    const server = fakeServer();
    const gaveUp = new AbortController();
    server.raw(listCautions, {}, () => {
      gaveUp.abort();
      return Promise.reject(new DOMException('aborted', 'AbortError'));
    });
    const failure = await call(listCautions, { signal: gaveUp.signal }).catch((error: unknown) => error);
    expect(failure).not.toBeInstanceOf(OfflineError);
  });
});

describe('a session that ended', () => {
  it('is noticed on anything that needs one', async () => {
    const server = fakeServer();
    server.refuse(listSites, {}, 401, 'Sign in to go on.');
    await call(listSites, {}).catch(() => undefined);
    expect(sessionEnded.get()).toBe(true);
  });

  it('is not read from a wrong password', async () => {
    const server = fakeServer();
    server.refuse(signIn, {}, 401, 'The address or the password is not right.');
    await call(signIn, { body: { email: 'a@b.example', password: 'x' } }).catch(() => undefined);
    expect(sessionEnded.get()).toBe(false);
  });
});
