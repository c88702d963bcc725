import type { RoomTally } from '@embertally/shared/tally/room-tally';
import { useMemo } from 'react';
import { useUnits } from '../../lib/units-context.ts';
import { burnoutChart } from './burnout-chart.ts';
import { BurnoutTable } from './burnout-table.tsx';
import { ChartFigure } from '../../components/chart/chart-figure.tsx';
import { FigureList } from './figure-list.tsx';
import { fileSlug } from './file-slug.ts';
import { FlashoverTable } from './flashover-table.tsx';
import { TallySection } from './tally-section.tsx';

interface WhatTheRoomDoesProps {
  readonly tally: RoomTally;
  readonly rating_min: number | null;
}

const REGIMES: Readonly<Record<RoomTally['room']['regime'], string>> = {
  compartment: '',
  large: 'This room is too large to fill with one hot layer: flashover and the parametric curve are not covered.',
  closed: 'The openings feed too little air for a flashover, even with the glass gone: the burn-out is not covered.',
};

/** What such a fire would do to the room: hot layer, flashover, burn-out, exposure against its rating. */
export function WhatTheRoomDoes({ tally, rating_min }: WhatTheRoomDoesProps) {
  const units = useUnits();
  const { room, load, burnout } = tally;
  const chart = useMemo(() => burnoutChart(tally, units, `${fileSlug(tally.room.name)}-burn-out`), [tally, units]);
  return (
    <TallySection title="What the room does">
      <div className="grid gap-4">
        {REGIMES[room.regime] !== '' && <p className="max-w-[72ch]">{REGIMES[room.regime]}</p>}
        <div className="empty:hidden">
          <FigureList
            rows={[
              { path: 'room.hotLayer', label: 'Rise of the hot layer before flashover', estimate: room.hotLayer },
              {
                path: 'room.ventilationLimit',
                label: 'Open openings can feed, by oxygen',
                estimate: room.ventilationLimit,
              },
              {
                path: 'room.ventilationLimitAfterGlass',
                label: 'The same once the glass has gone',
                estimate: room.ventilationLimitAfterGlass,
              },
              { path: 'room.openingFactor', label: 'Opening factor', estimate: room.openingFactor },
              {
                path: 'room.openingFactorAfterGlass',
                label: 'Opening factor once the glass has gone',
                estimate: room.openingFactorAfterGlass,
              },
            ]}
          />
        </div>
        <div className="empty:hidden">
          <FlashoverTable flashover={room.flashover} />
        </div>
        {chart !== null && <ChartFigure chart={chart} />}
        <div className="empty:hidden">
          <BurnoutTable
            burnout={burnout}
            path="burnout"
            caption="If everything here burns out"
            rating_min={rating_min}
          />
        </div>
        {burnout.beforeGlass && (
          <div className="empty:hidden">
            <BurnoutTable
              burnout={burnout.beforeGlass}
              path="burnout.beforeGlass"
              caption="The same before any glass breaks: less air, a longer and often cooler fire"
              rating_min={rating_min}
            />
          </div>
        )}
        <div className="empty:hidden">
          <FigureList
            rows={[
              { path: 'load.asKept', label: 'Fire load density as kept', estimate: load.asKept },
              { path: 'load.design', label: 'Design fire load density', estimate: load.design },
              { path: 'load.combustionFactor', label: 'Combustion factor', estimate: load.combustionFactor },
              {
                path: 'burnout.thermalInertia',
                label: 'Thermal inertia of the linings',
                estimate: burnout.thermalInertia,
              },
              {
                path: 'burnout.hydrocarbon.temperature',
                label: `Liquids and plastics: hydrocarbon curve after ${burnout.hydrocarbon?.after_min ?? 0} min`,
                estimate: burnout.hydrocarbon?.temperature,
              },
              { path: 'room.floorArea', label: 'Floor area', estimate: room.floorArea },
              { path: 'room.enclosingArea', label: 'All enclosing surfaces', estimate: room.enclosingArea },
              { path: 'room.volume', label: 'Volume', estimate: room.volume },
            ]}
          />
        </div>
      </div>
    </TallySection>
  );
}
