import type { Me } from '@embertally/shared/contracts/sessions';
import { useQueryClient } from '@tanstack/react-query';
import { Dialog } from '../components/dialog.tsx';
import { SignInForm } from '../features/session/sign-in-form.tsx';
import { paths } from '../lib/paths.ts';

/** The session ended while a screen was open: sign in over it, so that what was typed is still there afterwards. */
export function SignInAgain({ me }: { readonly me: Me }) {
  const client = useQueryClient();
  return (
    <Dialog
      open
      onClose={() => undefined}
      dismissable={false}
      title="Your session has ended"
      description="Sign in to go on. What you typed on this page is kept."
    >
      <SignInForm
        email={me.person.email}
        onSignedIn={(now) => {
          // Somebody else's screen must not stay open under another name.
          if (now.person.id === me.person.id) void client.invalidateQueries();
          else window.location.assign(paths.today());
        }}
      />
    </Dialog>
  );
}
