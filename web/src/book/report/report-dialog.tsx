import { createExport, type Export } from '@embertally/shared/contracts/exports';
import { useMutation } from '@tanstack/react-query';
import { useState } from 'react';
import { Button } from '../../components/button.tsx';
import { ChoiceField, type Choice } from '../../components/choice-field.tsx';
import { Dialog } from '../../components/dialog.tsx';
import { Notice } from '../../components/notice.tsx';
import { call } from '../../lib/api-client.ts';
import { useUnits } from '../../lib/units-context.ts';
import { useBook } from '../session/use-book.ts';
import { useBookSession } from '../session/use-book-session.ts';
import { ExportProgress } from './export-progress.tsx';

type Kind = Export['kind'];

/** Asks what to print, has it made away from the page, and hands it over. */
export function ReportDialog({ onClose }: { readonly onClose: () => void }) {
  const session = useBookSession();
  const units = useUnits();
  const surveyId = useBook((state) => state.survey.id);
  const unsent = useBook((state) => state.saving.unsent);
  const room = useBook((state) => (state.roomInHand === null ? undefined : state.document.rooms.get(state.roomInHand)));
  const [kind, setKind] = useState<Kind>('survey-report');
  const [exportId, setExportId] = useState<string | null>(null);
  const ask = useMutation({
    mutationFn: () => {
      const room_id = kind === 'room-tally' ? (room?.id ?? null) : null;
      return call(createExport, { params: { surveyId }, body: { id: session.newId(), kind, room_id, units } });
    },
    onSuccess: ({ id }) => {
      setExportId(id);
    },
  });
  const choices: Choice<Kind>[] = [
    {
      value: 'survey-report',
      label: 'The whole survey',
      hint: 'Plans to scale, a tally page for every room, all workings.',
    },
    ...(room === undefined
      ? []
      : [{ value: 'room-tally' as const, label: `Only ${room.name}`, hint: 'Its tally with all workings.' }]),
  ];
  return (
    <Dialog
      open
      onClose={onClose}
      title="Report"
      description="A PDF of the working survey as the server has it now, marked working survey, not issued. The cautions stand on every page."
    >
      {exportId === null ? (
        <form
          className="grid gap-4"
          onSubmit={(event) => {
            event.preventDefault();
            if (!ask.isPending) ask.mutate();
          }}
        >
          <ChoiceField legend="What to print" value={kind} choices={choices} onChange={setKind} />
          {unsent === 0 ? null : (
            <Notice tone="caution">
              {unsent === 1 ? 'One change has' : `${unsent} changes have`} not been sent yet and will not be in it.
            </Notice>
          )}
          {ask.isError ? (
            <Notice tone="problem" announced>
              {ask.error.message}
            </Notice>
          ) : null}
          <div>
            <Button type="submit" look="primary" busy={ask.isPending}>
              Make the PDF
            </Button>
          </div>
        </form>
      ) : (
        <ExportProgress
          exportId={exportId}
          onAgain={() => {
            setExportId(null);
          }}
        />
      )}
    </Dialog>
  );
}
