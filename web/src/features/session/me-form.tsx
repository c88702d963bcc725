import type { Me } from '@embertally/shared/contracts/sessions';
import { useQueryClient } from '@tanstack/react-query';
import { Button } from '../../components/button.tsx';
import { ChoiceField } from '../../components/choice-field.tsx';
import { ErrorSummary } from '../../components/error-summary.tsx';
import { useStatus } from '../../components/status-region.tsx';
import { TextField } from '../../components/text-field.tsx';
import { useForm } from '../../components/use-form.ts';
import type { UnitSystem } from '../../lib/units-context.ts';
import { editMe } from './api/edit-me.ts';

interface Fields {
  readonly name: string;
  readonly units: UnitSystem;
}

const UNITS: readonly { readonly value: UnitSystem; readonly label: string; readonly hint: string }[] = [
  { value: 'SI', label: 'SI', hint: 'm, kg, MJ/m², kW, °C' },
  { value: 'US', label: 'US customary', hint: 'ft, lb, Btu/ft², Btu/s, °F' },
];

/** The person's own name and units. What is stored is SI either way; units change only how it is read. */
export function MeForm({ me }: { readonly me: Me }) {
  const client = useQueryClient();
  const announce = useStatus();
  const form = useForm<Fields>({
    name: 'me',
    initial: { name: me.person.name, units: me.person.units },
    validate: (values) => ({ name: values.name.trim() === '' ? 'Enter your name' : undefined }),
    submit: async (values) => {
      await editMe(client, { name: values.name.trim(), units: values.units });
      announce('Your name and units are saved.');
    },
  });
  return (
    <form noValidate onSubmit={form.onSubmit} className="grid gap-5">
      <ErrorSummary {...form.summary} />
      <TextField
        label="Your name"
        hint="As it stands on what you record and sign."
        autoComplete="name"
        width="medium"
        {...form.field('name')}
      />
      <ChoiceField
        legend="Units"
        value={form.values.units}
        choices={UNITS}
        onChange={(units) => {
          form.set('units', units);
        }}
      />
      <div>
        <Button type="submit" look="primary" busy={form.busy}>
          Save
        </Button>
      </div>
    </form>
  );
}
