import type { BuildingSummary } from '@embertally/shared/contracts/sites';
import { useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { Button } from '../../components/button.tsx';
import { Dialog } from '../../components/dialog.tsx';
import { ErrorSummary } from '../../components/error-summary.tsx';
import { TextField } from '../../components/text-field.tsx';
import { useForm } from '../../components/use-form.ts';
import { createBuilding } from './api/create-building.ts';

interface NewBuildingDialogProps {
  readonly siteId: string;
  readonly open: boolean;
  readonly onClose: () => void;
  readonly onMade: (building: BuildingSummary) => void;
}

/** Makes a building and opens its Book. */
export function NewBuildingDialog({ siteId, open, onClose, onMade }: NewBuildingDialogProps) {
  return (
    <Dialog
      open={open}
      onClose={onClose}
      title="New building"
      description="It starts with one storey and an empty plan. More storeys are added in the Book."
    >
      <NewBuildingForm siteId={siteId} onMade={onMade} />
    </Dialog>
  );
}

function NewBuildingForm({ siteId, onMade }: Pick<NewBuildingDialogProps, 'siteId' | 'onMade'>) {
  const client = useQueryClient();
  const [ids] = useState(() => ({
    id: crypto.randomUUID(),
    survey_id: crypto.randomUUID(),
    storey_id: crypto.randomUUID(),
  }));
  const form = useForm({
    name: `new-building-${siteId}`,
    initial: { name: '', storey_name: 'Ground floor' },
    keep: ['name', 'storey_name'],
    validate: (values) => ({
      name: values.name.trim() === '' ? 'Enter the name of the building' : undefined,
      storey_name: values.storey_name.trim() === '' ? 'Enter the name of its first storey' : undefined,
    }),
    submit: async (values) => {
      onMade(
        await createBuilding(client, siteId, {
          ...ids,
          name: values.name.trim(),
          storey_name: values.storey_name.trim(),
        }),
      );
    },
  });
  return (
    <form noValidate onSubmit={form.onSubmit} className="grid gap-5">
      <ErrorSummary {...form.summary} />
      <TextField label="Name of the building" autoComplete="off" {...form.field('name')} />
      <TextField label="Name of its first storey" autoComplete="off" width="medium" {...form.field('storey_name')} />
      <div className="flex justify-end">
        <Button type="submit" look="primary" busy={form.busy}>
          Make it and open its Book
        </Button>
      </div>
    </form>
  );
}
