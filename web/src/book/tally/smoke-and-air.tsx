import type { RoomTally } from '@embertally/shared/tally/room-tally';
import { formatNumber } from '@embertally/shared/units/format-number';
import type { TablePart } from '../panels/tables-context.ts';
import { FigureList } from './figure-list.tsx';
import { MissingReasons } from './missing-reasons.tsx';
import { TallySection } from './tally-section.tsx';

interface SmokeAndAirProps {
  readonly tally: RoomTally;
  readonly onGive?: ((part: TablePart) => void) | undefined;
}

/** What the air of the room can feed when everything is shut, and how little it takes to lose sight in it. */
export function SmokeAndAir({ tally, onGive }: SmokeAndAirProps) {
  const { air, load } = tally;
  const kept_MJ = load.total.value;
  const feeds_MJ = air.oxygenLimitedHeat?.value ?? null;
  return (
    <TallySection title="Smoke and air">
      <p className="mb-2 max-w-[72ch] text-small">
        As if every door and window were shut.
        {feeds_MJ !== null && kept_MJ !== null && kept_MJ > 0 && ` ${shareWords(feeds_MJ / kept_MJ)}`}
      </p>
      <FigureList
        rows={[
          {
            path: 'air.oxygenLimitedHeat',
            label: 'Heat the air can feed, down to 13 % oxygen',
            estimate: air.oxygenLimitedHeat,
          },
          { path: 'air.oxygenLimitedHeatAt15', label: 'the same down to 15 %', estimate: air.oxygenLimitedHeatAt15 },
          { path: 'air.oxygenLimitedHeatAt10', label: 'the same down to 10 %', estimate: air.oxygenLimitedHeatAt10 },
          { path: 'air.oxygenEnd', label: 'The air is used up after', estimate: air.oxygenEnd },
          {
            path: 'air.massForVisibility10m',
            label: 'Burnt until a sign is lost from sight at 10 m',
            estimate: air.massForVisibility10m,
          },
          {
            path: 'air.massForVisibility10mShining',
            label: 'the same for a sign that shines',
            estimate: air.massForVisibility10mShining,
          },
          {
            path: 'air.carbonMonoxide',
            label: 'Carbon monoxide when the oxygen ends the fire',
            estimate: air.carbonMonoxide,
          },
          {
            path: 'air.carbonMonoxideShortOfAir',
            label: 'the same for a fire short of air',
            estimate: air.carbonMonoxideShortOfAir,
          },
        ]}
      />
      <MissingReasons missing={tally.missing.filter(({ section }) => section === 'air')} onGive={onGive} />
    </TallySection>
  );
}

function shareWords(share: number): string {
  if (share >= 1) return 'The air of the room would do for everything kept in it.';
  const percent = share * 100;
  const words = percent < 1 ? 'less than 1 %' : `${formatNumber(percent, 2)} %`;
  return `The air of the room would do for ${words} of the heat kept in it; the rest waits for an opening.`;
}
