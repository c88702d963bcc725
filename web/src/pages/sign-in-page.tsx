import { useQuery } from '@tanstack/react-query';
import { Link, Navigate, useLocation, useNavigate } from 'react-router-dom';
import { LoadFailed } from '../components/load-failed.tsx';
import { currentSessionQuery } from '../features/session/api/current-session.ts';
import { SignInForm } from '../features/session/sign-in-form.tsx';
import { usePageTitle } from '../lib/page-title.ts';
import { nextAfterSignIn, paths } from '../lib/paths.ts';

export function SignInPage() {
  usePageTitle('Sign in');
  const navigate = useNavigate();
  const next = nextAfterSignIn(useLocation().search);
  const session = useQuery(currentSessionQuery());
  if (session.data) return <Navigate to={next} replace />;
  return (
    <div className="grid gap-6">
      <h1 tabIndex={-1} className="text-display">
        Sign in
      </h1>
      {session.isError ? (
        <LoadFailed
          what="Your session"
          error={session.error}
          retrying={session.isFetching}
          onRetry={() => void session.refetch()}
        />
      ) : null}
      <SignInForm onSignedIn={() => void navigate(next, { replace: true })} />
      <div className="grid gap-1 border-t border-rule pt-4">
        <p>
          New here? <Link to={paths.signUp()}>Sign up and make an organisation</Link>
        </p>
        <p>
          What results may be used for: <Link to={paths.cautions()}>the cautions</Link>
        </p>
      </div>
    </div>
  );
}
