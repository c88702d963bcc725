import { createContext, useCallback, useContext, useEffect, useMemo, useState, type ReactNode } from 'react';

interface Status {
  readonly id: number;
  readonly text: string;
  readonly action?: { readonly label: string; readonly run: () => void };
}

type Announce = (text: string, action?: Status['action']) => void;

const StatusContext = createContext<Announce>(() => undefined);

/** Says in one line that something was done. Stays 8 s or until dismissed; never the only record of an error. */
export function useStatus(): Announce {
  return useContext(StatusContext);
}

const STAYS_MS = 8000;

/** Holds the lines said by `useStatus` in one polite live region, which exists before anything is said in it. */
export function StatusRegion({ children }: { readonly children: ReactNode }) {
  const [statuses, setStatuses] = useState<readonly Status[]>([]);
  const announce = useCallback<Announce>((text, action) => {
    setStatuses((current) => [
      ...current.slice(-2),
      { id: (current.at(-1)?.id ?? 0) + 1, text, ...(action === undefined ? {} : { action }) },
    ]);
  }, []);
  const dismiss = useCallback((id: number) => {
    setStatuses((current) => current.filter((status) => status.id !== id));
  }, []);
  return (
    <StatusContext value={announce}>
      {children}
      <div role="status" className="status-region not-on-paper">
        {useMemo(
          () => statuses.map((status) => <StatusLine key={status.id} status={status} onDismiss={dismiss} />),
          [statuses, dismiss],
        )}
      </div>
    </StatusContext>
  );
}

function StatusLine({ status, onDismiss }: { readonly status: Status; readonly onDismiss: (id: number) => void }) {
  const { id, action } = status;
  useEffect(() => {
    const timer = setTimeout(() => {
      onDismiss(id);
    }, STAYS_MS);
    return () => {
      clearTimeout(timer);
    };
  }, [id, onDismiss]);
  return (
    <div className="status-message">
      <p>{status.text}</p>
      {action === undefined ? null : (
        <button
          type="button"
          onClick={() => {
            action.run();
            onDismiss(id);
          }}
        >
          {action.label}
        </button>
      )}
      <button
        type="button"
        onClick={() => {
          onDismiss(id);
        }}
      >
        Dismiss
      </button>
    </div>
  );
}
