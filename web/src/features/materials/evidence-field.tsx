import { useId, useRef } from 'react';
import { Button } from '../../components/button.tsx';
import { FILE_ENDINGS } from '../../lib/send-file.ts';
import type { MaterialForm } from './form/use-material-form.ts';
import { SendingFile } from './sending-file.tsx';
import { useEvidence } from './use-evidence.ts';

const MOST = 10;

/** The files that show where the figures come from, sent when they are chosen. */
export function EvidenceField({ material }: { readonly material: MaterialForm }) {
  const { files, sending, error, send, takeOff } = useEvidence(material);
  const ids = useId();
  const input = useRef<HTMLInputElement>(null);
  return (
    <div className="grid justify-items-start gap-3 pt-4">
      <p id={`${ids}-hint`} className="field-hint">
        The report, the sheet or the table itself: PDF, PNG, JPEG or CSV. Files are kept as they are and never opened by
        the server.
      </p>
      {files.length === 0 ? null : (
        <ul className="w-full border-t border-rule">
          {files.map((file) => (
            <li
              key={file.id}
              className="flex flex-wrap items-baseline justify-between gap-x-4 border-b border-rule py-2"
            >
              <span className="min-w-0 break-words">{file.name}</span>
              <Button
                look="quiet"
                aria-label={`Take off ${file.name}`}
                onClick={() => {
                  takeOff(file.id);
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
          <label htmlFor={ids}>{files.length === 0 ? 'Attach a file' : 'Attach another file'}</label>
          <input
            ref={input}
            id={ids}
            type="file"
            className="file-input"
            accept={FILE_ENDINGS.join(',')}
            disabled={files.length >= MOST}
            aria-describedby={error === null ? `${ids}-hint` : `${ids}-hint ${ids}-error`}
            onChange={(event) => {
              const file = event.target.files?.[0];
              event.target.value = '';
              if (file !== undefined) send(file);
            }}
          />
        </div>
      ) : (
        <SendingFile name={sending.name} share={sending.share} onStop={() => sending.stop.abort()} />
      )}
    </div>
  );
}
