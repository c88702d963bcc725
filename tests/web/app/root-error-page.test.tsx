import { RootErrorPage } from '@embertally/web/src/app/root-error-page.tsx';
import { loadPage } from '@embertally/web/src/lib/load-page.ts';
import { render, screen } from '@testing-library/react';
import { createMemoryRouter, RouterProvider } from 'react-router-dom';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { consoleMessages } from '../../support/console-messages.ts';

/** What the page does to the window is watched at the window's own door. */
let reported: unknown[];
beforeEach(() => {
  reported = [];
  vi.stubGlobal('reportError', (error: unknown) => reported.push(error));
  // The router tells the console about every error a page throws.
  consoleMessages.expect(/./);
});
afterEach(() => {
  vi.restoreAllMocks();
});

function open(lazy: () => Promise<{ Component: React.ComponentType }>) {
  render(
    <RouterProvider
      router={createMemoryRouter([{ path: '/', lazy, errorElement: <RootErrorPage />, HydrateFallback: () => null }])}
    />,
  );
}

const gone = loadPage(
  () => Promise.reject<{ Page: () => null }>(new TypeError('Failed to fetch dynamically imported module')),
  (module) => module.Page,
);

describe('a page whose script is gone', () => {
  it('has just been reloaded for: says what is kept and offers the way on', async () => {
    window.sessionStorage.setItem('embertally.reloaded-at', String(Date.now()));
    open(gone);
    await screen.findByRole('heading', { name: 'This page could not be loaded' });
    expect(screen.getByText(/What you saved is kept/)).toBeTruthy();
    expect(screen.getByRole('button', { name: 'Reload the page' })).toBeTruthy();
    expect(reported).toEqual([]);
  });

  it('is not reloaded without a network', async () => {
    vi.spyOn(window.navigator, 'onLine', 'get').mockReturnValue(false);
    open(gone);
    await screen.findByRole('heading', { name: 'You are offline' });
    expect(window.sessionStorage.getItem('embertally.reloaded-at')).toBeNull();
  });
});

describe('a page that breaks', () => {
  it('is reported, and the person told what is kept', async () => {
    const fault = new Error('broken');
    open(() =>
      Promise.resolve({
        Component: () => {
          throw fault;
        },
      }),
    );
    await screen.findByRole('heading', { name: 'Something went wrong' });
    expect(reported).toContain(fault);
    expect(document.title).toBe('Something went wrong – Embertally');
  });
});
