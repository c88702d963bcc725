import { useMemo } from 'react';
import { Button } from '../../components/button.tsx';
import { ErrorSummary } from '../../components/error-summary.tsx';
import { SelectField } from '../../components/select-field.tsx';
import { TextAreaField } from '../../components/text-area-field.tsx';
import { TextField } from '../../components/text-field.tsx';
import { useForm } from '../../components/use-form.ts';
import { siteErrors, type SiteFields } from './site-fields.ts';
import { timeZoneOptions } from './time-zones.ts';

interface SiteFormProps {
  /** Names the form and its draft. */
  readonly name: string;
  readonly initial: SiteFields;
  /** The verb on the button. */
  readonly verb: string;
  readonly onSend: (values: SiteFields) => Promise<void>;
}

/** The name, address and time zone of a site, new or known. */
export function SiteForm({ name, initial, verb, onSend }: SiteFormProps) {
  const form = useForm<SiteFields>({
    name,
    initial,
    validate: siteErrors,
    submit: (values) =>
      onSend({ name: values.name.trim(), address: values.address.trim(), time_zone: values.time_zone }),
    keep: ['name', 'address', 'time_zone'],
  });
  const zones = useMemo(() => timeZoneOptions(initial.time_zone), [initial.time_zone]);
  return (
    <form noValidate onSubmit={form.onSubmit} className="grid max-w-xl gap-5">
      <ErrorSummary {...form.summary} />
      <TextField label="Name of the site" hint="As people there call it." autoComplete="off" {...form.field('name')} />
      <TextAreaField label="Address" optional {...form.field('address')} />
      <SelectField
        label="Time zone"
        hint="Due dates and times in the book are the days and hours of this place."
        width="medium"
        options={zones}
        {...form.field('time_zone')}
      />
      <div>
        <Button type="submit" look="primary" busy={form.busy}>
          {verb}
        </Button>
      </div>
    </form>
  );
}
