import { useQuery, useQueryClient } from '@tanstack/react-query';
import { useNavigate } from 'react-router-dom';
import { Button } from '../components/button.tsx';
import { EmptyState } from '../components/empty-state.tsx';
import { LoadFailed } from '../components/load-failed.tsx';
import { Page } from '../components/page.tsx';
import { Part } from '../components/part.tsx';
import { Skeleton } from '../components/skeleton.tsx';
import { currentSessionQuery } from '../features/session/api/current-session.ts';
import { signOut } from '../features/session/api/sign-out.ts';
import { MeForm } from '../features/session/me-form.tsx';
import { ThemeChoice } from '../features/session/theme-choice.tsx';
import { dateWords } from '../lib/date-words.ts';
import { paths } from '../lib/paths.ts';

export function AccountPage() {
  const client = useQueryClient();
  const navigate = useNavigate();
  const session = useQuery(currentSessionQuery());
  if (session.isPending) {
    return (
      <Page title="Account">
        <Skeleton label="Reading your account" />
      </Page>
    );
  }
  if (session.isError) {
    return (
      <Page title="Account">
        <LoadFailed
          what="Your account"
          error={session.error}
          retrying={session.isFetching}
          onRetry={() => void session.refetch()}
        />
      </Page>
    );
  }
  const me = session.data;
  if (me === null) {
    return (
      <Page title="Account">
        <EmptyState title="Nobody is signed in">Sign in to see your account.</EmptyState>
      </Page>
    );
  }
  return (
    <Page
      title="Account"
      lead={me.person.email}
      right={
        <>
          <Part title="This device">
            <div className="pt-4">
              <ThemeChoice />
            </div>
          </Part>
          <Part title="Session">
            <p className="py-4">
              If the book is not used before then, this session ends on {dateWords(me.session.expires_at, 'moment')}.
            </p>
            <Button onClick={() => void signOut(client).then(() => navigate(paths.signIn(), { replace: true }))}>
              Sign out
            </Button>
          </Part>
        </>
      }
    >
      <Part title="You">
        <div className="pt-4">
          <MeForm me={me} />
        </div>
      </Part>
      <Part title="Your organisations">
        <ul>
          {me.members.map((member) => (
            <li key={member.id} className="flex justify-between gap-4 border-b border-rule py-2.5">
              <span className="font-bold">{member.organisation_name}</span>
              <span>
                {member.role}
                {member.id === me.member_id && me.members.length > 1 ? ', acting now' : ''}
              </span>
            </li>
          ))}
        </ul>
      </Part>
    </Page>
  );
}
