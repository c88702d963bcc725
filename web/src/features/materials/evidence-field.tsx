import { useEffect, useId, useRef, useState } from 'react';
import { Button } from '../../components/button.tsx';
import { useStatus } from '../../components/status-region.tsx';
import { FILE_ENDINGS, sendFile } from '../../lib/send-file.ts';
import { EVIDENCE, extrasOf, type EvidenceFile } from './form/extras.ts';
import type { MaterialForm } from './form/use-material-form.ts';

interface Sending {
  readonly name: string;
  readonly share: number;
  readonly stop: AbortController;
}

const MOST = 10;

/** The files that show where the figures come from, sent when they are chosen. */
export function EvidenceField({ material: { form, onSendingFile } }: { readonly material: MaterialForm }) {
  const announce = useStatus();
  const ids = useId();
  const input = useRef<HTMLInputElement>(null);
  const [sending, setSending] = useState<Sending | null>(null);
  const [error, setError] = useState<string | null>(null);
  const stop = sending?.stop;
  useEffect(() => () => stop?.abort(), [stop]);
  const { evidence } = extrasOf(form.values);
  const change = (next: (files: readonly EvidenceFile[]) => readonly EvidenceFile[]) => {
    form.fill((values) => {
      const files = next(extrasOf(values).evidence);
      return { [EVIDENCE]: files.length === 0 ? '' : JSON.stringify(files) };
    });
  };

  const send = async (file: File): Promise<void> => {
    const controller = new AbortController();
    setError(null);
    onSendingFile(true);
    setSending({ name: file.name, share: 0, stop: controller });
    try {
      const stored = await sendFile(
        file,
        crypto.randomUUID(),
        (share) => {
          setSending({ name: file.name, share, stop: controller });
        },
        controller.signal,
      );
      change((files) => [...files, { id: stored.id, name: stored.name }]);
      announce(`${stored.name} was attached.`);
    } catch (failure) {
      if (!controller.signal.aborted) setError(failure instanceof Error ? failure.message : String(failure));
    } finally {
      setSending(null);
      onSendingFile(false);
    }
  };

  return (
    <div className="grid justify-items-start gap-3 pt-4">
      <p id={`${ids}-hint`} className="field-hint">
        The report, the sheet or the table itself: PDF, PNG, JPEG or CSV. Files are kept as they are and never opened by
        the server.
      </p>
      {evidence.length === 0 ? null : (
        <ul className="w-full border-t border-rule">
          {evidence.map((file) => (
            <li
              key={file.id}
              className="flex flex-wrap items-baseline justify-between gap-x-4 border-b border-rule py-2"
            >
              <span className="min-w-0 break-words">{file.name}</span>
              <Button
                look="quiet"
                aria-label={`Take ${file.name} off`}
                onClick={() => {
                  change((files) => files.filter(({ id }) => id !== file.id));
                  input.current?.focus();
                }}
              >
                Take off
              </Button>
            </li>
          ))}
        </ul>
      )}
      {error === null ? null : (
        <p id={`${ids}-error`} className="field-error" role="alert">
          {error}
        </p>
      )}
      {sending === null ? (
        <div className="field" data-invalid={error === null ? undefined : 'yes'}>
          <label htmlFor={ids}>{evidence.length === 0 ? 'Attach a file' : 'Attach another file'}</label>
          <input
            ref={input}
            id={ids}
            type="file"
            className="file-input"
            accept={FILE_ENDINGS.join(',')}
            disabled={evidence.length >= MOST}
            aria-describedby={error === null ? `${ids}-hint` : `${ids}-hint ${ids}-error`}
            onChange={(event) => {
              const file = event.target.files?.[0];
              event.target.value = '';
              if (file !== undefined) void send(file);
            }}
          />
        </div>
      ) : (
        <div className="grid w-full max-w-96 gap-2">
          <label htmlFor={`${ids}-progress`}>Sending {sending.name}</label>
          <progress id={`${ids}-progress`} max={1} value={sending.share} className="w-full" />
          <div>
            <Button
              size="small"
              onClick={() => {
                sending.stop.abort();
              }}
            >
              Stop
            </Button>
          </div>
        </div>
      )}
    </div>
  );
}
