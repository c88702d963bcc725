import type { Me } from '@embertally/shared/contracts/sessions';
import { useQueryClient } from '@tanstack/react-query';
import { Button } from '../../components/button.tsx';
import { ErrorSummary } from '../../components/error-summary.tsx';
import { PasswordField } from '../../components/password-field.tsx';
import { TextField } from '../../components/text-field.tsx';
import { useForm } from '../../components/use-form.ts';
import { signIn } from './api/sign-in.ts';
import { emailError } from './email-error.ts';

interface SignInFormProps {
  readonly onSignedIn: (me: Me) => void;
  /** The address to begin with. */
  readonly email?: string;
}

export function SignInForm({ onSignedIn, email = '' }: SignInFormProps) {
  const client = useQueryClient();
  const form = useForm({
    name: 'sign-in',
    initial: { email, password: '' },
    validate: (values) => ({
      email: emailError(values.email),
      password: values.password === '' ? 'Enter your password' : undefined,
    }),
    submit: async (values) => {
      onSignedIn(await signIn(client, values));
    },
  });
  return (
    <form noValidate onSubmit={form.onSubmit} className="grid gap-5">
      <ErrorSummary {...form.summary} />
      <TextField
        label="Email address"
        type="email"
        autoComplete="username"
        autoCapitalize="none"
        spellCheck={false}
        width="medium"
        {...form.field('email')}
      />
      <PasswordField label="Password" autoComplete="current-password" {...form.field('password')} />
      <div>
        <Button type="submit" look="primary" busy={form.busy}>
          {form.busy ? 'Signing in…' : 'Sign in'}
        </Button>
      </div>
    </form>
  );
}
