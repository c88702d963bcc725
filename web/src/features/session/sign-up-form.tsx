import { useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { Button } from '../../components/button.tsx';
import { ErrorSummary } from '../../components/error-summary.tsx';
import { PasswordField } from '../../components/password-field.tsx';
import { TextField } from '../../components/text-field.tsx';
import { useForm } from '../../components/use-form.ts';
import { NotSignedInError } from '../../lib/api-errors.ts';
import { ToldError } from '../../lib/told-error.ts';
import { signIn } from './api/sign-in.ts';
import { signUp } from './api/sign-up.ts';
import { emailError } from './email-error.ts';

/** The shortest password the server takes. */
const MIN_PASSWORD = 15;

interface SignUpFormProps {
  readonly onSignedUp: () => void;
}

export function SignUpForm({ onSignedUp }: SignUpFormProps) {
  const client = useQueryClient();
  // Made once, so that sending again after a lost answer makes one organisation, not two.
  const [id] = useState(() => crypto.randomUUID());
  const form = useForm({
    name: 'sign-up',
    keep: ['organisation_name', 'name', 'email'],
    initial: { organisation_name: '', name: '', email: '', password: '' },
    validate: (values) => ({
      organisation_name:
        values.organisation_name.trim().length < 2
          ? 'Enter the name of your organisation, two letters or more'
          : undefined,
      name: values.name.trim() === '' ? 'Enter your name' : undefined,
      email: emailError(values.email),
      password: passwordError(values.password),
    }),
    submit: async (values) => {
      await signUp({ id, ...values });
      try {
        await signIn(client, values);
      } catch (error) {
        if (!(error instanceof NotSignedInError)) throw error;
        throw new ToldError(
          'This address may already have an account. Sign in with its own password, or sign up with another address.',
          { cause: error },
        );
      }
      onSignedUp();
    },
  });
  return (
    <form noValidate onSubmit={form.onSubmit} className="grid gap-5">
      <ErrorSummary {...form.summary} />
      <TextField
        label="Your organisation"
        hint="The employer you act for; other organisations are given a role on a site later."
        autoComplete="organization"
        width="medium"
        {...form.field('organisation_name')}
      />
      <TextField
        label="Your name"
        hint="As it should stand on what you record and sign."
        autoComplete="name"
        width="medium"
        {...form.field('name')}
      />
      <TextField
        label="Email address"
        type="email"
        autoComplete="username"
        autoCapitalize="none"
        spellCheck={false}
        width="medium"
        {...form.field('email')}
      />
      <PasswordField
        label="Password"
        hint={`${MIN_PASSWORD} characters or more; a few unrelated words do well.`}
        autoComplete="new-password"
        {...form.field('password')}
      />
      <div>
        <Button type="submit" look="primary" busy={form.busy}>
          {form.busy ? 'Signing up…' : 'Sign up'}
        </Button>
      </div>
    </form>
  );
}

function passwordError(password: string): string | undefined {
  if (password === '') return 'Enter a password';
  const characters = [...password].length;
  return characters < MIN_PASSWORD
    ? `The password must be ${MIN_PASSWORD} characters or more; it has ${characters}`
    : undefined;
}
