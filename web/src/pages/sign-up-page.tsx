import { useQuery } from '@tanstack/react-query';
import { Link, Navigate, useNavigate } from 'react-router-dom';
import { currentSessionQuery } from '../features/session/api/current-session.ts';
import { SignUpForm } from '../features/session/sign-up-form.tsx';
import { usePageTitle } from '../lib/page-title.ts';
import { paths } from '../lib/paths.ts';

export function SignUpPage() {
  usePageTitle('Sign up');
  const navigate = useNavigate();
  const session = useQuery(currentSessionQuery());
  if (session.data) return <Navigate to={paths.sites()} replace />;
  return (
    <div className="grid gap-6">
      <h1 tabIndex={-1} className="text-display">
        Sign up
      </h1>
      <SignUpForm onSignedUp={() => void navigate(paths.sites(), { replace: true })} />
      <p className="border-t border-rule pt-4">
        Have an account? <Link to={paths.signIn()}>Sign in</Link>
      </p>
    </div>
  );
}
