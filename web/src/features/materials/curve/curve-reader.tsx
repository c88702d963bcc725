import {
  describeCalorimeterCsv,
  type CalorimeterDescription,
} from '@embertally/shared/calorimeter/describe-calorimeter-csv';
import type { CalorimeterChoices } from '@embertally/shared/calorimeter/calorimeter-choices';
import { recallMapping } from '@embertally/shared/calorimeter/mapping-memory';
import { useId, useRef, useState } from 'react';
import { Button } from '../../../components/button.tsx';
import { CURVE, extrasOf } from '../form/extras.ts';
import type { MaterialForm } from '../form/use-material-form.ts';
import { SendingFile } from '../sending-file.tsx';
import { useEvidence } from '../use-evidence.ts';
import { CurveFile } from './curve-file.tsx';
import { mappingStore } from './mapping-store.ts';

interface Opened {
  readonly file: File;
  readonly text: string;
  readonly description: CalorimeterDescription;
  readonly choices: CalorimeterChoices;
}

/** Takes a calorimeter's file: chosen, looked at, mapped, kept with the material. */
export function CurveReader({ material }: { readonly material: MaterialForm }) {
  const { form } = material;
  const ids = useId();
  const input = useRef<HTMLInputElement>(null);
  const [opened, setOpened] = useState<Opened | null>(null);
  const [unreadable, setUnreadable] = useState<string | null>(null);
  const { sending, error, send } = useEvidence(material);
  const { curve } = extrasOf(form.values).draft;

  const open = async (file: File): Promise<void> => {
    try {
      const text = await file.text();
      const description = describeCalorimeterCsv(text);
      const kept = mappingStore.read();
      setUnreadable(null);
      setOpened({
        file,
        text,
        description,
        choices: kept === null ? description.proposed : recallMapping(description, kept),
      });
    } catch (failure) {
      reportError(failure);
      setUnreadable(`“${file.name}” could not be read on this device. Nothing was changed; choose it again.`);
    }
  };

  return (
    <div className="grid grid-cols-[minmax(0,1fr)] gap-4 pt-4">
      <p className="field-hint">
        If the material was burnt in a calorimeter: a CSV with time and heat release rate, or with oxygen, carbon
        dioxide, carbon monoxide and the flow in the duct.
      </p>
      {curve === undefined ? null : (
        <div className="flex flex-wrap items-baseline justify-between gap-x-4 border-y border-rule py-2">
          <p>
            {curve.file_name ?? 'A curve'}: {curve.points.length} points,{' '}
            {curve.per === 'piece' ? 'of one piece' : 'per m² of surface'}
          </p>
          <Button
            look="quiet"
            onClick={() => {
              form.fill({ [CURVE]: '' });
              input.current?.focus();
            }}
          >
            Take the curve off
          </Button>
        </div>
      )}
      {unreadable === null && error === null ? null : (
        <p className="field-error" role="alert">
          {unreadable ?? error}
        </p>
      )}
      {sending === null ? null : (
        <SendingFile name={sending.name} share={sending.share} onStop={() => sending.stop.abort()} />
      )}
      <div className="field">
        <label htmlFor={ids}>
          {curve === undefined && opened === null ? 'Read a curve from a file' : 'Read another file'}
        </label>
        <input
          ref={input}
          id={ids}
          type="file"
          className="file-input"
          accept=".csv,.txt,.tsv,text/csv,text/plain"
          onChange={(event) => {
            const file = event.target.files?.[0];
            event.target.value = '';
            if (file !== undefined) void open(file);
          }}
        />
      </div>
      {opened === null ? null : (
        <CurveFile
          name={opened.file.name}
          text={opened.text}
          description={opened.description}
          choices={opened.choices}
          onChoices={(choices) => {
            setOpened({ ...opened, choices });
          }}
          onDelimiter={(delimiter) => {
            const description = describeCalorimeterCsv(opened.text, delimiter);
            setOpened({ ...opened, description, choices: description.proposed });
          }}
          onKeep={(read) => {
            form.fill({ [CURVE]: JSON.stringify({ ...read, file_name: opened.file.name.slice(-255) }) });
            send(opened.file);
            setOpened(null);
            input.current?.focus();
          }}
          onLeave={() => {
            setOpened(null);
            input.current?.focus();
          }}
        />
      )}
    </div>
  );
}
