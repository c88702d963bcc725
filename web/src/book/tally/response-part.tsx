import type { RoomTally } from '@embertally/shared/tally/room-tally';
import type { TablePart } from '../panels/tables-context.ts';
import { FigureList } from './figure-list.tsx';
import { MissingReasons } from './missing-reasons.tsx';
import { TallySection } from './tally-section.tsx';

interface ResponsePartProps {
  readonly tally: RoomTally;
  readonly onGive?: ((part: TablePart) => void) | undefined;
}

/** When what protects the room would answer to the fire of the curve above. */
export function ResponsePart({ tally, onGive }: ResponsePartProps) {
  const { sprinkler, detector, heatDetector, smokeDetector } = tally.response;
  const both = heatDetector !== undefined && smokeDetector !== undefined;
  return (
    <TallySection title="When it would be noticed">
      <FigureList
        rows={[
          { path: 'response.sprinkler', label: 'Sprinkler opens after', estimate: sprinkler },
          { path: 'response.detector', label: 'Detector answers after', estimate: both ? undefined : detector },
          {
            path: 'response.smokeDetector',
            label: 'Smoke detector answers after',
            estimate: both ? smokeDetector : undefined,
          },
          {
            path: 'response.heatDetector',
            label: 'Heat detector answers after',
            estimate: both ? heatDetector : undefined,
          },
        ]}
      />
      {(sprinkler ?? detector) !== undefined && (
        <p className="mt-2 max-w-[72ch] text-small text-soft">
          The heat release curve goes on as if nothing answered: the design load already counts what is put in to fight
          a fire, and counting it twice would make the fire look small. Real heads lose heat to their pipes and answer
          later.
        </p>
      )}
      <MissingReasons missing={tally.missing.filter(({ section }) => section === 'response')} onGive={onGive} />
    </TallySection>
  );
}
