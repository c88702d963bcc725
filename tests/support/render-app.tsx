import { createQueryClient } from '@embertally/web/src/lib/query-client.ts';
import { sessionEnded } from '@embertally/web/src/lib/session-ended.ts';
import { sessionHint } from '@embertally/web/src/lib/session-hint.ts';
import { routes } from '@embertally/web/src/routes.tsx';
import { QueryClientProvider } from '@tanstack/react-query';
import { render, type RenderResult } from '@testing-library/react';
import { createMemoryRouter, RouterProvider } from 'react-router-dom';

interface RenderedApp extends RenderResult {
  /** Where the app is now. */
  readonly path: () => string;
  readonly goTo: (path: string) => Promise<void>;
}

/** The whole client at an address, as a browser that has signed in before (or, with `signedIn: false`, never has). */
export function renderApp(path: string, options: { readonly signedIn?: boolean } = {}): RenderedApp {
  sessionHint.set(options.signedIn ?? true);
  sessionEnded.set(false);
  const router = createMemoryRouter(routes, { initialEntries: [path] });
  const result = render(
    <QueryClientProvider client={createQueryClient({ retryDelay_ms: 1 })}>
      <RouterProvider router={router} />
    </QueryClientProvider>,
  );
  return {
    ...result,
    path: () => router.state.location.pathname + router.state.location.search,
    goTo: (to) => router.navigate(to),
  };
}
