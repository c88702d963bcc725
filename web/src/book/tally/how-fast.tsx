import type { RoomTally } from '@embertally/shared/tally/room-tally';
import { useMemo } from 'react';
import { useUnits } from '../../lib/units-context.ts';
import { ChartFigure } from '../../components/chart/chart-figure.tsx';
import { FigureList } from './figure-list.tsx';
import { fileSlug } from './file-slug.ts';
import { releaseChart } from './release-chart.ts';
import { TallySection } from './tally-section.tsx';

const GOVERNED: Readonly<Record<NonNullable<RoomTally['growth']['governedBy']>, string>> = {
  fuel: 'What burns sets the plateau: the openings could feed more.',
  openings: 'The openings set the plateau: what burns could give off more.',
  load: 'The contents are burnt before any plateau is reached.',
  closed: 'No opening feeds this room: the curve is that of the fuel, and the air of the room ends it earlier.',
};

/** How fast the heat could come out: the design fire against what the openings can feed and what flashes the room over. */
export function HowFast({ tally }: { readonly tally: RoomTally }) {
  const units = useUnits();
  const chart = useMemo(() => releaseChart(tally, units, `${fileSlug(tally.room.name)}-heat-release`), [tally, units]);
  const { growth, room } = tally;
  return (
    <TallySection title="How fast it could come out">
      {chart === null ? (
        <p className="text-soft">There is no curve yet: what is missing stands below.</p>
      ) : (
        <ChartFigure chart={chart} />
      )}
      {growth.governedBy !== undefined && <p className="my-2 max-w-[72ch] text-small">{GOVERNED[growth.governedBy]}</p>}
      <FigureList
        rows={[
          { path: 'growth.peak', label: 'Peak heat release', estimate: growth.peak },
          { path: 'room.flashover.time', label: 'Flashover after', estimate: room.flashover.time },
          { path: 'growth.openingsPlateau', label: 'The openings can feed', estimate: growth.openingsPlateau },
          { path: 'growth.fuelPlateau', label: 'What burns could give off', estimate: growth.fuelPlateau },
          { path: 'growth.alpha', label: 'Growth coefficient', estimate: growth.alpha },
          { path: 'growth.growthEnd', label: 'Growth ends after', estimate: growth.growthEnd },
          { path: 'growth.decayStart', label: 'Decay starts after', estimate: growth.decayStart },
          { path: 'growth.end', label: 'Burnt out after', estimate: growth.end },
          { path: 'growth.heatReleased', label: 'Heat released in all', estimate: growth.heatReleased },
        ]}
      />
    </TallySection>
  );
}
