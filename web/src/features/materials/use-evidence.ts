import { useEffect, useState } from 'react';
import { useStatus } from '../../components/status-region.tsx';
import { sendFile } from '../../lib/send-file.ts';
import { EVIDENCE, extrasOf, type EvidenceFile } from './form/extras.ts';
import type { MaterialForm } from './form/use-material-form.ts';

interface Sending {
  readonly name: string;
  readonly share: number;
  readonly stop: AbortController;
}

interface Evidence {
  readonly files: readonly EvidenceFile[];
  readonly sending: Sending | null;
  /** Why the last file was not taken. */
  readonly error: string | null;
  readonly send: (file: File) => void;
  readonly takeOff: (id: string) => void;
}

/** The files of a form: sent when they are chosen, kept by their ids with what was typed. */
export function useEvidence({ form, onSendingFile }: MaterialForm): Evidence {
  const announce = useStatus();
  const [sending, setSending] = useState<Sending | null>(null);
  const [error, setError] = useState<string | null>(null);
  const stop = sending?.stop;
  useEffect(() => () => stop?.abort(), [stop]);

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

  return {
    files: extrasOf(form.values).evidence,
    sending,
    error,
    send: (file) => void send(file),
    takeOff: (id) => {
      change((files) => files.filter((one) => one.id !== id));
    },
  };
}
