import { useEffect, useState } from 'react';
import { isRouteErrorResponse, useRouteError } from 'react-router-dom';
import { Button } from '../components/button.tsx';
import { Mark } from '../components/mark.tsx';
import { PageNotLoadedError } from '../lib/page-not-loaded.ts';
import { paths } from '../lib/paths.ts';
import { reloadOnce } from '../lib/reload-once.ts';
import { usePageTitle } from '../lib/page-title.ts';

interface Told {
  readonly title: string;
  readonly text: string;
}

function tell(error: unknown): Told {
  if (error instanceof PageNotLoadedError) {
    return window.navigator.onLine
      ? {
          title: 'This page could not be loaded',
          text: 'A new version may just have been put in place. What you saved is kept. Reload the page.',
        }
      : {
          title: 'You are offline',
          text: 'This page has not been opened on this device yet. What you saved is kept. Reload when the network is back.',
        };
  }
  if (isRouteErrorResponse(error) && error.status === 404) {
    return { title: 'There is no such page', text: 'The address may be mistyped, or the page has moved.' };
  }
  return {
    title: 'Something went wrong',
    text: 'This page stopped working. What was saved is kept. Reload it; if it stops again, tell us what you did.',
  };
}

/** The last page: a screen that broke, or one whose script is gone. The latter reloads once by itself. */
export function RootErrorPage() {
  const error = useRouteError();
  const [reloading] = useState(
    () =>
      error instanceof PageNotLoadedError &&
      window.navigator.onLine &&
      reloadOnce({ storage: window.sessionStorage, reload: () => window.location.reload() }, Date.now()),
  );
  const told = tell(error);
  usePageTitle(told.title);
  useEffect(() => {
    if (!(error instanceof PageNotLoadedError) && !isRouteErrorResponse(error)) reportError(error);
  }, [error]);
  if (reloading) return <p className="p-6">Reloading the page…</p>;
  return (
    <main className="mx-auto grid max-w-3xl justify-items-start gap-4 px-6 py-16">
      <Mark size={40} />
      <h1 className="text-display">{told.title}</h1>
      <p className="max-w-[60ch]">{told.text}</p>
      <div className="flex flex-wrap gap-3">
        <Button look="primary" onClick={() => window.location.reload()}>
          Reload the page
        </Button>
        <Button onClick={() => window.location.assign(paths.today())}>Go to Today</Button>
      </div>
    </main>
  );
}
