import type { Missing } from '@embertally/shared/tally/room-tally';
import { Button } from '../../components/button.tsx';
import type { TablePart } from '../panels/tables-context.ts';
import { FormulaText } from '../../components/working/formula-text.tsx';
import { missingGroups } from './missing-groups.ts';
import { plainUnits } from '../../lib/plain-units.ts';
import { TallySection } from './tally-section.tsx';

interface MissingListProps {
  readonly missing: readonly Missing[];
  /** Opens the table where the input can be given; absent where nothing can be changed. */
  readonly onGive?: ((part: TablePart) => void) | undefined;
}

const GIVE: Readonly<Record<TablePart, string>> = {
  rooms: 'Go to the rooms',
  room: 'Say what is known of the room',
  openings: 'Go to the openings',
  contents: 'Go to the contents',
  limits: 'Go to the limits',
  storeys: 'Go to the storeys',
};

/** What is not computed for this room, why, and so which input would give it. */
export function MissingList({ missing, onGive }: MissingListProps) {
  const groups = missingGroups(missing);
  if (groups.length === 0) return null;
  return (
    <TallySection title="What is not here, and why">
      <dl className="text-small">
        {groups.map(({ why, part, names }) => (
          <div key={why} className="border-b border-rule py-1.5">
            <dt className="font-bold">
              <FormulaText>{plainUnits(why)}</FormulaText>
            </dt>
            <dd className="text-soft">{names.join(', ')}</dd>
            {part !== null && onGive !== undefined && (
              <dd>
                <Button
                  look="quiet"
                  className="text-small"
                  aria-label={`${GIVE[part]}: ${why}`}
                  onClick={() => {
                    onGive(part);
                  }}
                >
                  {GIVE[part]}
                </Button>
              </dd>
            )}
          </div>
        ))}
      </dl>
    </TallySection>
  );
}
