import { signUp } from '@embertally/shared/contracts/organisations';
import { signIn } from '@embertally/shared/contracts/sessions';
import { listSites } from '@embertally/shared/contracts/sites';
import { fireEvent, screen } from '@testing-library/react';
import { beforeEach, describe, expect, it } from 'vitest';
import { fakeServer, type FakeServer } from '../../support/fake-server.ts';
import { renderApp } from '../../support/render-app.tsx';
import { sampleMe } from '../../support/web-samples.ts';

let server: FakeServer;
beforeEach(() => {
  server = fakeServer();
  server.answer(listSites, {}, { items: [], next_cursor: null });
});

async function fill(password: string) {
  for (const [label, value] of [
    ['Your organisation', 'Harbourwell Fire Office'],
    ['Your name', 'Ines Orchard'],
    ['Email address', 'ines@harbourwell.example'],
    ['Password', password],
  ] as const) {
    fireEvent.change(await screen.findByLabelText(label), { target: { value } });
  }
  fireEvent.click(screen.getByRole('button', { name: 'Sign up' }));
}

describe('signing up', () => {
  it('makes the organisation, signs in and offers the first step', async () => {
    server.answer(signUp, {}, { accepted: true });
    server.answer(signIn, {}, sampleMe());
    const app = renderApp('/sign-up', { signedIn: false });
    await fill('seven unrelated words');
    await screen.findByText('No site yet');
    expect(app.path()).toBe('/sites');
  });

  it('counts a password in characters a person sees', async () => {
    renderApp('/sign-up', { signedIn: false });
    await fill('🔥🔥🔥🔥🔥🔥🔥🔥');
    expect(await screen.findAllByText('The password must be 15 characters or more; it has 8')).toHaveLength(2);
    expect(server.requests).toEqual([]);
  });

  it('shows the server’s reason against a password at its field', async () => {
    server.refuse(signUp, {}, 422, 'Nothing was made.', {
      errors: [{ pointer: '/password', code: 'common', message: 'This password is among the commonest' }],
    });
    renderApp('/sign-up', { signedIn: false });
    await fill('passwordpassword');
    expect(await screen.findAllByText('This password is among the commonest')).toHaveLength(2);
    expect(screen.getByLabelText<HTMLInputElement>('Password').value).toBe('passwordpassword');
  });

  it('does not tell whether an address has an account, but helps somebody who has one', async () => {
    server.answer(signUp, {}, { accepted: true });
    server.refuse(signIn, {}, 401, 'The address or the password is not right.');
    renderApp('/sign-up', { signedIn: false });
    await fill('seven unrelated words');
    expect((await screen.findByRole('alert')).textContent).toContain('may already have an account');
  });

  it('makes one organisation when it is sent again after a lost answer', async () => {
    server.goOffline();
    renderApp('/sign-up', { signedIn: false });
    await fill('seven unrelated words');
    await screen.findByRole('alert');
    server.goOnline();
    server.answer(signUp, {}, { accepted: true });
    server.answer(signIn, {}, sampleMe());
    fireEvent.click(screen.getByRole('button', { name: 'Sign up' }));
    await screen.findByText('No site yet');
    const ids = server.requests
      .filter((r) => r.path === '/api/organisations')
      .map((r) => (r.body as { id: string }).id);
    expect(new Set(ids).size).toBe(1);
  });
});
