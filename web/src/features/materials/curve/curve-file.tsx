import type { CalorimeterChoices, Delimiter } from '@embertally/shared/calorimeter/calorimeter-choices';
import type { CalorimeterDescription } from '@embertally/shared/calorimeter/describe-calorimeter-csv';
import { rememberMapping } from '@embertally/shared/calorimeter/mapping-memory';
import { readCalorimeterCsv } from '@embertally/shared/calorimeter/read-calorimeter-csv';
import type { CurveDraft } from '@embertally/shared/materials/drafts/curve-draft';
import { useDeferredValue, useMemo } from 'react';
import { Button } from '../../../components/button.tsx';
import { Notice } from '../../../components/notice.tsx';
import { CurveColumns } from './curve-columns.tsx';
import { CurvePreview } from './curve-preview.tsx';
import { CurveTidying } from './curve-tidying.tsx';
import { mappingStore } from './mapping-store.ts';

interface CurveFileProps {
  readonly name: string;
  readonly text: string;
  readonly description: CalorimeterDescription;
  readonly choices: CalorimeterChoices;
  readonly onChoices: (choices: CalorimeterChoices) => void;
  readonly onDelimiter: (delimiter: Delimiter) => void;
  readonly onKeep: (curve: CurveDraft) => void;
  readonly onLeave: () => void;
}

/** One file on the table: how it is read at the top, what it gives below, kept only when that looks right. */
export function CurveFile(props: CurveFileProps) {
  const { name, text, description, choices, onChoices, onDelimiter, onKeep, onLeave } = props;
  // A long file takes its time: the lists answer first, the reading follows.
  const deferred = useDeferredValue(choices);
  const reading = useMemo(() => readCalorimeterCsv(text, deferred), [text, deferred]);
  const curve = reading.ok ? reading.preview.curve : null;
  return (
    <section aria-label={`Reading ${name}`} className="grid grid-cols-[minmax(0,1fr)] gap-5 border-t border-rule pt-4">
      <h3 className="font-bold break-all">{name}</h3>
      {description.notes.length === 0 ? null : (
        <Notice>
          {description.notes.map((note) => (
            <p key={note}>{note}</p>
          ))}
        </Notice>
      )}
      <CurveColumns description={description} choices={choices} onChoices={onChoices} onDelimiter={onDelimiter} />
      <CurveTidying choices={choices} onChoices={onChoices} />
      {reading.ok ? (
        <CurvePreview name={name} preview={reading.preview} />
      ) : (
        <Notice tone="problem" title="The file cannot be read so" announced>
          <ul className="grid list-disc gap-1 pl-5">
            {reading.faults.map((fault) => (
              <li key={`${String(fault.line)} ${fault.code} ${fault.message}`}>
                {fault.line === null ? '' : `Line ${fault.line}: `}
                {fault.message}
              </li>
            ))}
          </ul>
          {reading.moreFaults > 0 ? <p>and {reading.moreFaults} more like these</p> : null}
        </Notice>
      )}
      <div className="flex flex-wrap gap-3">
        {curve === null ? null : (
          <Button
            look="primary"
            onClick={() => {
              mappingStore.keep(rememberMapping(description, choices));
              onKeep(curve);
            }}
          >
            Keep this curve
          </Button>
        )}
        <Button onClick={onLeave}>Leave the file</Button>
      </div>
    </section>
  );
}
