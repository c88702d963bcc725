import type { Me } from '@embertally/shared/contracts/sessions';
import { useQuery, useQueryClient } from '@tanstack/react-query';
import { lazy, Suspense, useState, useSyncExternalStore } from 'react';
import { Link, Navigate, Outlet, useLocation, useMatches, useNavigate } from 'react-router-dom';
import { HeaderSlots } from '../components/header-slots.tsx';
import { LoadFailed } from '../components/load-failed.tsx';
import { Skeleton } from '../components/skeleton.tsx';
import { StatusRegion } from '../components/status-region.tsx';
import { currentSessionQuery } from '../features/session/api/current-session.ts';
import { PersonMenu } from '../features/session/person-menu.tsx';
import { signOut } from '../features/session/api/sign-out.ts';
import { paths } from '../lib/paths.ts';
import { sessionEnded } from '../lib/session-ended.ts';
import { UnitsContext } from '../lib/units-context.ts';
import { AppHeader } from './app-header.tsx';
import { EdgeIndex } from './edge-index.tsx';
import { RouteFocus } from './route-focus.tsx';

// Needed only by somebody whose session ended: not fetched before.
const SignInAgain = lazy(async () => ({ default: (await import('./sign-in-again.tsx')).SignInAgain }));

/** What a route may ask of the layout: the Book fills the window and brings its own index. */
export interface RouteHandle {
  readonly wholeWindow?: boolean;
  /** May be read without signing in. */
  readonly open?: boolean;
}

/** Everything behind sign-in: header, the page, the sections at its edge. Without a session it leads to sign-in. */
export function AppLayout() {
  const client = useQueryClient();
  const navigate = useNavigate();
  const location = useLocation();
  const session = useQuery(currentSessionQuery());
  const ended = useSyncExternalStore(sessionEnded.subscribe, sessionEnded.get);
  const handles = useMatches().map((match) => match.handle as RouteHandle | undefined);
  const wholeWindow = handles.some((handle) => handle?.wholeWindow === true);
  const open = handles.some((handle) => handle?.open === true);

  // A session that ends later leaves the screen standing; only one that never began leads to sign-in.
  const [known, setKnown] = useState<Me | null>(null);
  if (session.data && session.data !== known) setKnown(session.data);
  const me = session.data ?? known;

  if (session.isPending) return <Opening />;
  if (me === null && session.isError && !open) {
    return (
      <main className="mx-auto max-w-3xl p-6">
        <LoadFailed
          what="Your session"
          error={session.error}
          retrying={session.isFetching}
          onRetry={() => void session.refetch()}
        />
      </main>
    );
  }
  if (me === null && !open) return <Navigate to={paths.signIn(location.pathname + location.search)} replace />;

  const leave = async () => {
    await signOut(client);
    setKnown(null);
    await navigate(paths.signIn(), { replace: true });
  };
  return (
    <UnitsContext value={me?.person.units ?? 'SI'}>
      <StatusRegion>
        <HeaderSlots>
          <a href="#page" className="unseen skip-link">
            Skip to the page
          </a>
          <RouteFocus />
          <div className={`flex min-h-dvh flex-col ${wholeWindow ? 'h-dvh' : ''}`}>
            <AppHeader
              person={
                me === null ? (
                  <Link to={paths.signIn(location.pathname)}>Sign in</Link>
                ) : (
                  <PersonMenu me={me} onSignOut={() => void leave()} />
                )
              }
            />
            {wholeWindow ? (
              <main id="page" tabIndex={-1} className="flex min-h-0 flex-1 flex-col">
                <Outlet />
              </main>
            ) : (
              <div className="mx-auto flex w-full max-w-[90rem] flex-1 flex-col wide:flex-row wide:pb-6 wide:pl-6">
                <main id="page" tabIndex={-1} className="flex min-w-0 flex-1 flex-col px-2 pb-4 tablet:px-6 wide:p-0">
                  <Outlet />
                </main>
                {me === null ? null : <EdgeIndex />}
              </div>
            )}
          </div>
          {me !== null && (ended || session.data === null) ? (
            <Suspense>
              <SignInAgain me={me} />
            </Suspense>
          ) : null}
        </HeaderSlots>
      </StatusRegion>
    </UnitsContext>
  );
}

/** The moment before it is known who is there. */
function Opening() {
  return (
    <div className="mx-auto max-w-3xl p-6">
      <Skeleton label="Opening the book" lines={3} />
    </div>
  );
}
