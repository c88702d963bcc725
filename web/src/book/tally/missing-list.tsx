import type { Missing } from '@embertally/shared/tally/room-tally';
import type { TablePart } from '../panels/tables-context.ts';
import { MissingReasons } from './missing-reasons.tsx';
import { TallySection } from './tally-section.tsx';

interface MissingListProps {
  readonly missing: readonly Missing[];
  /** Opens the table where the input can be given; absent where nothing can be changed. */
  readonly onGive?: ((part: TablePart) => void) | undefined;
}

/** What is not computed for this room, why, and so which input would give it. */
export function MissingList({ missing, onGive }: MissingListProps) {
  if (missing.length === 0) return null;
  return (
    <TallySection title="What is not here, and why">
      <MissingReasons missing={missing} onGive={onGive} />
    </TallySection>
  );
}
