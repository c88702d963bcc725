import { ContractError, OfflineError, ProblemError } from '../lib/api-errors.ts';
import { Button } from './button.tsx';

interface LoadFailedProps {
  /** What could not be read, as it stands in the sentence "… could not be read". */
  readonly what: string;
  readonly error: Error;
  readonly onRetry: () => void;
  readonly retrying?: boolean;
}

function reasonOf(error: Error): string {
  if (error instanceof OfflineError) return 'The server cannot be reached. Check the network, then try again.';
  if (error instanceof ContractError) return 'The server answered unexpectedly. Reload the page; if it stays, tell us.';
  if (error instanceof ProblemError) return error.message;
  return 'Something went wrong on this page. Reload it; if it stays, tell us.';
}

/** Something could not be read: what, why, and a way to ask again. */
export function LoadFailed({ what, error, onRetry, retrying = false }: LoadFailedProps) {
  const request = error instanceof ProblemError ? error.problem.requestId : '';
  return (
    <div role="alert" className="notice" data-tone="problem">
      <p className="text-lead font-bold">{what} could not be read</p>
      <p className="max-w-[60ch]">{reasonOf(error)}</p>
      {request === '' ? null : <p className="text-small text-soft">Request {request}</p>}
      <div className="mt-2">
        <Button busy={retrying} onClick={onRetry}>
          Try again
        </Button>
      </div>
    </div>
  );
}
