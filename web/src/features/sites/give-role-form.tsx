import { SITE_ROLES, type SiteRoleName } from '@embertally/shared/policy/policy';
import { useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { Button } from '../../components/button.tsx';
import { ErrorSummary } from '../../components/error-summary.tsx';
import { SelectField } from '../../components/select-field.tsx';
import { useStatus } from '../../components/status-region.tsx';
import { TextField } from '../../components/text-field.tsx';
import { useForm } from '../../components/use-form.ts';
import { giveSiteRole } from './api/give-site-role.ts';

const MAY: Readonly<Record<SiteRoleName, string>> = {
  manager: 'manager: keeps the book, gives roles',
  inspector: 'inspector: surveys, sets limits, issues',
  reviewer: 'reviewer: reads, remarks, decides',
  viewer: 'viewer: reads only',
};
const ROLES = SITE_ROLES.map((role) => ({ value: role, label: MAY[role] }));

interface GiveRoleFormProps {
  readonly siteId: string;
}

interface Fields {
  readonly email: string;
  readonly role: SiteRoleName;
}

/** Gives a person of any organisation a role on the site. */
export function GiveRoleForm({ siteId }: GiveRoleFormProps) {
  const client = useQueryClient();
  const announce = useStatus();
  const [id, setId] = useState(() => crypto.randomUUID());
  const form = useForm<Fields>({
    name: `give-role-${siteId}`,
    initial: { email: '', role: 'viewer' },
    keep: ['email', 'role'],
    validate: (values) => ({
      email: values.email.trim() === '' ? 'Enter the email address the person signs in with' : undefined,
    }),
    submit: async (values) => {
      await giveSiteRole(client, siteId, { id, ...values });
      announce(`${values.email.trim()} is now ${values.role} here.`);
      setId(crypto.randomUUID());
      form.reset();
    },
  });
  return (
    <form noValidate onSubmit={form.onSubmit} className="grid gap-4 pt-2">
      <ErrorSummary {...form.summary} />
      <TextField
        label="Email address"
        hint="The one the person signs in with; any organisation."
        type="email"
        autoComplete="off"
        width="medium"
        {...form.field('email')}
      />
      <SelectField
        label="Role"
        width="medium"
        options={ROLES}
        id={form.field('role').id}
        value={form.values.role}
        error={form.field('role').error}
        onChange={(role) => {
          form.set('role', role);
        }}
      />
      <div>
        <Button type="submit" busy={form.busy}>
          Give the role
        </Button>
      </div>
    </form>
  );
}
