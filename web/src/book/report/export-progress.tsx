import { readExportFile, stopExport } from '@embertally/shared/contracts/exports';
import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import { useEffect, useRef } from 'react';
import { Button } from '../../components/button.tsx';
import { LoadFailed } from '../../components/load-failed.tsx';
import { Notice } from '../../components/notice.tsx';
import { call } from '../../lib/api-client.ts';
import { contractUrl } from '../../lib/contract-url.ts';
import { isUnderWay, watchExport } from './watch-export.ts';

interface ExportProgressProps {
  readonly exportId: string;
  /** Ask for another file. */
  readonly onAgain: () => void;
}

/** How far the file is, a way to stop it, and the file when it is there. */
export function ExportProgress({ exportId, onAgain }: ExportProgressProps) {
  const queries = useQueryClient();
  const watched = useQuery(watchExport(exportId));
  const stop = useMutation({
    mutationFn: () => call(stopExport, { params: { exportId } }),
    onSettled: () => queries.invalidateQueries({ queryKey: watchExport(exportId).queryKey }),
  });
  const link = useRef<HTMLAnchorElement>(null);
  const made = watched.data;
  const ready = made?.state === 'ready';
  useEffect(() => {
    if (ready) link.current?.focus();
  }, [ready]);

  if (watched.isError) {
    return <LoadFailed what="How far the PDF is" error={watched.error} onRetry={() => void watched.refetch()} />;
  }
  if (made === undefined || isUnderWay(made)) {
    const part = made?.progress ?? 0;
    return (
      <div className="grid gap-3">
        <label className="grid gap-1">
          <span>{part === 0 ? 'Waiting for its turn…' : `Making the PDF… ${Math.round(part * 100)} %`}</span>
          <progress className="report-progress" value={part} max={1} />
        </label>
        <p className="text-small text-soft">You can close this and go on working.</p>
        <div>
          <Button
            busy={stop.isPending}
            onClick={() => {
              stop.mutate();
            }}
          >
            Stop
          </Button>
        </div>
      </div>
    );
  }
  if (made.state === 'ready') {
    return (
      <div className="grid gap-3">
        <p role="status">The PDF is ready{made.bytes === null ? '' : `, ${kilobytes(made.bytes)}`}.</p>
        <div className="flex flex-wrap gap-3">
          <a
            ref={link}
            className="button"
            data-look="primary"
            href={contractUrl(readExportFile, { exportId })}
            download={made.file_name ?? true}
          >
            Save the PDF
          </a>
          <Button onClick={onAgain}>Make another</Button>
        </div>
      </div>
    );
  }
  return (
    <div className="grid gap-3">
      <Notice tone={made.state === 'failed' ? 'problem' : 'plain'} announced>
        {made.state === 'failed'
          ? (made.problem ?? 'The PDF could not be made; the survey is as it was.')
          : 'Stopped. Nothing was made.'}
      </Notice>
      <div>
        <Button onClick={onAgain}>Try again</Button>
      </div>
    </div>
  );
}

function kilobytes(bytes: number): string {
  return bytes < 1_000_000 ? `${Math.round(bytes / 1000)} kB` : `${(bytes / 1_000_000).toFixed(1)} MB`;
}
