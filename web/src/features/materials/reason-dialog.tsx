import { Button } from '../../components/button.tsx';
import { Dialog } from '../../components/dialog.tsx';
import { ErrorSummary } from '../../components/error-summary.tsx';
import { TextAreaField } from '../../components/text-area-field.tsx';
import { useForm } from '../../components/use-form.ts';

interface ReasonDialogProps {
  readonly open: boolean;
  /** Names the form and its draft. */
  readonly name: string;
  readonly title: string;
  readonly description: string;
  readonly hint: string;
  readonly verb: string;
  readonly onSend: (reason: string) => Promise<void>;
  readonly onClose: () => void;
}

/** A decision that others will read the reason of. */
export function ReasonDialog({ open, title, description, onClose, ...form }: ReasonDialogProps) {
  return (
    <Dialog open={open} onClose={onClose} title={title} description={description}>
      <ReasonForm {...form} />
    </Dialog>
  );
}

function ReasonForm({ name, hint, verb, onSend }: Pick<ReasonDialogProps, 'name' | 'hint' | 'verb' | 'onSend'>) {
  const form = useForm({
    name,
    initial: { reason: '' },
    keep: ['reason'],
    validate: ({ reason }) => ({
      reason:
        reason.trim() === ''
          ? 'Enter the reason'
          : reason.trim().length > 1000
            ? `The reason must be 1000 characters or fewer; it has ${reason.trim().length}`
            : undefined,
    }),
    submit: ({ reason }) => onSend(reason.trim()),
  });
  return (
    <form noValidate onSubmit={form.onSubmit} className="grid gap-5">
      <ErrorSummary {...form.summary} />
      <TextAreaField label="Reason" hint={hint} {...form.field('reason')} />
      <div className="flex justify-end">
        <Button type="submit" look="primary" busy={form.busy}>
          {verb}
        </Button>
      </div>
    </form>
  );
}
