import { canOnSite } from '@embertally/shared/policy/policy';
import { lazy, Suspense, useState } from 'react';
import { Button } from '../../components/button.tsx';
import { useBook } from '../session/use-book.ts';

const ReportDialog = lazy(async () => ({ default: (await import('./report-dialog.tsx')).ReportDialog }));

/** Opens the report; hidden from who may not have one. */
export function ReportButton() {
  const survey = useBook((state) => state.survey);
  const [open, setOpen] = useState(false);
  if (!canOnSite({ role: survey.my_role, ofKeeper: survey.of_keeper }, 'export.create')) return null;
  return (
    <>
      <Button
        size="small"
        onClick={() => {
          setOpen(true);
        }}
      >
        Report
      </Button>
      {open ? (
        <Suspense>
          <ReportDialog
            onClose={() => {
              setOpen(false);
            }}
          />
        </Suspense>
      ) : null}
    </>
  );
}
