import { listSites } from '@embertally/shared/contracts/sites';
import { readCurrentSession, signIn } from '@embertally/shared/contracts/sessions';
import { fireEvent, screen, waitFor, within } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { fakeServer } from '../../support/fake-server.ts';
import { renderApp } from '../../support/render-app.tsx';
import { sampleMe, sampleSiteSummary } from '../../support/web-samples.ts';

async function type(label: string, value: string) {
  fireEvent.change(await screen.findByLabelText(label), { target: { value } });
}

function send() {
  fireEvent.click(screen.getByRole('button', { name: 'Sign in' }));
}

describe('signing in', () => {
  it('asks the server nothing on a first visit', async () => {
    const server = fakeServer();
    renderApp('/sign-in', { signedIn: false });
    await screen.findByRole('heading', { name: 'Sign in', level: 1 });
    expect(server.requests).toEqual([]);
  });

  it('leads where the person wanted to go', async () => {
    const server = fakeServer();
    server.answer(signIn, {}, sampleMe());
    server.answer(listSites, {}, { items: [sampleSiteSummary(10, 'Saltmarsh Lane Store')], next_cursor: null });
    const app = renderApp('/sites?sort=-rooms', { signedIn: false });
    await type('Email address', '  ines@harbourwell.example ');
    await type('Password', 'seven unrelated words');
    send();
    await screen.findByRole('heading', { name: 'Sites', level: 1 });
    expect(app.path()).toBe('/sites?sort=-rooms');
    expect(server.requests[0]?.body).toMatchObject({ password: 'seven unrelated words' });
  });

  it('says everything that is missing at the fields and in a summary that takes focus, in the same words', async () => {
    fakeServer();
    renderApp('/sign-in', { signedIn: false });
    await type('Email address', 'ines');
    send();
    const summary = await screen.findByRole('alert');
    await waitFor(() => {
      expect(document.activeElement).toBe(summary);
    });
    expect(document.title).toBe('Error: Sign in – Embertally');
    const links = within(summary).getAllByRole('link');
    expect(links.map((link) => link.textContent)).toEqual([
      'Enter an email address like name@example.org',
      'Enter your password',
    ]);
    const email = screen.getByLabelText<HTMLInputElement>('Email address');
    expect(email.value).toBe('ines');
    expect(email.getAttribute('aria-invalid')).toBe('true');
    const described = (email.getAttribute('aria-describedby') ?? '').split(' ');
    expect(described.map((id) => document.getElementById(id)?.textContent)).toContain(
      'Enter an email address like name@example.org',
    );
    fireEvent.click(links[1] as HTMLElement);
    expect(document.activeElement).toBe(screen.getByLabelText('Password'));
  });

  it('keeps what was typed when the server refuses, and says what it said', async () => {
    const server = fakeServer();
    server.refuse(signIn, {}, 401, 'The address or the password is not right.');
    renderApp('/sign-in', { signedIn: false });
    await type('Email address', 'ines@harbourwell.example');
    await type('Password', 'wrong');
    send();
    expect((await screen.findByRole('alert')).textContent).toContain('The address or the password is not right.');
    expect(screen.getByLabelText<HTMLInputElement>('Password').value).toBe('wrong');
    expect(screen.queryByRole('dialog')).toBeNull();
  });

  it('says so when the server cannot be reached', async () => {
    const server = fakeServer();
    server.goOffline();
    renderApp('/sign-in', { signedIn: false });
    await type('Email address', 'ines@harbourwell.example');
    await type('Password', 'right');
    send();
    expect((await screen.findByRole('alert')).textContent).toContain('cannot be reached');
  });

  it('shows the password on request', async () => {
    fakeServer();
    renderApp('/sign-in', { signedIn: false });
    const password = await screen.findByLabelText<HTMLInputElement>('Password');
    expect(password.type).toBe('password');
    expect(password.autocomplete).toBe('current-password');
    fireEvent.click(screen.getByRole('button', { name: 'Show password' }));
    expect(password.type).toBe('text');
  });
});

describe('a session that the server no longer knows', () => {
  it('leads to sign-in when the book is opened', async () => {
    const server = fakeServer();
    server.refuse(readCurrentSession, {}, 401, 'Sign in to go on.');
    const app = renderApp('/sites');
    await screen.findByRole('heading', { name: 'Sign in', level: 1 });
    expect(app.path()).toBe('/sign-in?next=%2Fsites');
  });

  it('is signed in again over the open screen, which keeps what was typed', async () => {
    const server = fakeServer();
    server.answer(readCurrentSession, {}, sampleMe());
    renderApp('/sites/new');
    fireEvent.change(await screen.findByLabelText('Name of the site'), { target: { value: 'Typed before' } });
    server.raw({ id: 'sites.create', method: 'POST', path: '/api/sites' }, {}, () =>
      Response.json(
        { type: 'about:blank', title: 'x', status: 401, detail: 'Sign in to go on.', instance: '/', requestId: 'r' },
        { status: 401, headers: { 'content-type': 'application/problem+json' } },
      ),
    );
    fireEvent.click(screen.getByRole('button', { name: 'Make the site' }));
    const dialog = await screen.findByRole('dialog', { name: 'Your session has ended' });
    expect(within(dialog).getByLabelText<HTMLInputElement>('Email address').value).toBe('ines@harbourwell.example');
    server.answer(signIn, {}, sampleMe());
    fireEvent.change(within(dialog).getByLabelText('Password'), { target: { value: 'seven unrelated words' } });
    fireEvent.click(within(dialog).getByRole('button', { name: 'Sign in' }));
    await waitFor(() => {
      expect(screen.queryByRole('dialog')).toBeNull();
    });
    expect(screen.getByLabelText<HTMLInputElement>('Name of the site').value).toBe('Typed before');
  });
});
