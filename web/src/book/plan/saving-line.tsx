import { lazy, Suspense, useState } from 'react';
import { Button } from '../../components/button.tsx';
import { savingWords } from '../session/saving-words.ts';
import { useBook } from '../session/use-book.ts';
import type { SurveySync } from '../sync/survey-sync.ts';

const AttentionDialog = lazy(async () => ({ default: (await import('../sync/attention-dialog.tsx')).AttentionDialog }));

const WHY = {
  offline: 'The server cannot be reached. Your changes are kept here and sent when it answers.',
  'signed-out': 'You are signed out. Your changes are kept here and sent when you have signed in again.',
  server: 'The server is not answering as it should. Your changes are kept here and sent when it does.',
} as const;

/** The quiet line that says where the changes are. When something needs a person it is a button. */
export function SavingLine({ sync }: { readonly sync: SurveySync }) {
  const saving = useBook((state) => state.saving);
  const [open, setOpen] = useState(false);
  const words = savingWords(saving);
  const needsPerson = saving.state === 'attention' || saving.state === 'clash';
  const detail = saving.onDisk
    ? saving.why === null
      ? undefined
      : WHY[saving.why]
    : 'This device does not store: unsent changes are lost when the tab is closed.';
  return (
    <div className="saving-line">
      {needsPerson ? (
        <Button
          size="small"
          className="saving-choice"
          onClick={() => {
            setOpen(true);
          }}
        >
          {words}
        </Button>
      ) : (
        <p role="status" title={detail}>
          {words}
          {detail === undefined || saving.state === 'saved' ? null : <span className="unseen">. {detail}</span>}
        </p>
      )}
      {saving.onDisk ? null : <p className="text-small text-madder">In memory only</p>}
      {saving.state === 'kept' ? (
        <Button
          size="small"
          look="quiet"
          onClick={() => {
            sync.retryNow();
          }}
        >
          Send now
        </Button>
      ) : null}
      {open ? (
        <Suspense>
          <AttentionDialog
            sync={sync}
            onClose={() => {
              setOpen(false);
            }}
          />
        </Suspense>
      ) : null}
    </div>
  );
}
