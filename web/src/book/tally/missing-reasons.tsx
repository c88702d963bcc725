import type { Missing } from '@embertally/shared/tally/room-tally';
import { Button } from '../../components/button.tsx';
import { FormulaText } from '../../components/working/formula-text.tsx';
import { plainUnits } from '../../lib/plain-units.ts';
import type { TablePart } from '../panels/tables-context.ts';
import { missingGroups } from './missing-groups.ts';

interface MissingReasonsProps {
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

/** Each reason why something is not computed, with what is not there for it and the way to the input that would help. */
export function MissingReasons({ missing, onGive }: MissingReasonsProps) {
  const groups = missingGroups(missing);
  if (groups.length === 0) return null;
  return (
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
  );
}
