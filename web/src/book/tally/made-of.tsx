import type { Entry } from '@embertally/shared/survey/survey-document';
import type { RoomTally } from '@embertally/shared/tally/room-tally';
import { type ReactNode, useMemo } from 'react';
import { ContentsLedger } from './contents-ledger.tsx';
import { Figure } from './figure.tsx';
import { FigureNotes } from './figure-notes.tsx';
import { ledgerRows } from './ledger-rows.ts';
import { MaterialBars } from './material-bars.tsx';
import { TallySection } from './tally-section.tsx';

interface MadeOfProps {
  readonly tally: RoomTally;
  readonly entries: ReadonlyMap<string, Entry>;
  readonly action?: ReactNode;
  readonly onPick?: (entryId: string) => void;
}

/** What the heat is made of: by material, then entry by entry. */
export function MadeOf({ tally, entries, action, onPick }: MadeOfProps) {
  const { load } = tally;
  const rows = useMemo(() => ledgerRows(load.byEntry, entries), [load.byEntry, entries]);
  const without = rows.filter((row) => row.heat.value === 0).length;
  return (
    <TallySection title="What it is made of" action={action}>
      {rows.length === 0 ? (
        <p className="text-soft">Nothing is recorded in this room yet. Place contents on the plan, or add them here.</p>
      ) : (
        <>
          <MaterialBars shares={load.byMaterial} />
          <ContentsLedger rows={rows} total={load.total} {...(onPick === undefined ? {} : { onPick })} />
          <p className="mt-1 text-small text-soft">
            Fixed <Figure path="load.fixed" estimate={load.fixed} />, stored{' '}
            <Figure path="load.stored" estimate={load.stored} />, passing{' '}
            <Figure path="load.passing" estimate={load.passing} />.
            {load.localPeak !== undefined && (
              <>
                {' '}
                Densest 2 m × 2 m: <Figure path="load.localPeak" estimate={load.localPeak} />.
              </>
            )}
            {without > 0 &&
              ` ${without === 1 ? 'One entry adds' : `${without} entries add`} no heat: its mass, its heat or its sealed container is why.`}
          </p>
          <FigureNotes of={[load.total, load.localPeak]} />
        </>
      )}
      {load.placeAmongUse !== undefined && (
        <p className="mt-1 text-small text-soft">
          Among rooms of the same use it stands at the{' '}
          <Figure path="load.placeAmongUse" estimate={load.placeAmongUse} /> mark, fixed entries left out.
        </p>
      )}
    </TallySection>
  );
}
