import type { RoomTally, SpreadTally } from '@embertally/shared/tally/room-tally';
import { useMemo, useState } from 'react';
import { Button } from '../../../components/button.tsx';
import { ChartFigure } from '../../../components/chart/chart-figure.tsx';
import { useUnits } from '../../../lib/units-context.ts';
import type { PlayedFire } from '../../spread/spread-play.ts';
import { useSpreadPlay } from '../../spread/use-spread-play.ts';
import { fileSlug } from '../file-slug.ts';
import { orderChart } from './order-chart.ts';

const SECONDS_PER_MINUTE = 60;
/** A fire this many times longer than what happens in it is first shown by its beginning. */
const LONG = 3;

interface SpreadChartProps {
  readonly tally: RoomTally;
  readonly spread: SpreadTally;
  readonly fire: PlayedFire;
}

/** The room's curve, entry by entry; its reading line moves with the fire on the plan. */
export function SpreadChart({ tally, spread, fire }: SpreadChartProps) {
  const units = useUnits();
  const [whole, setWhole] = useState(false);
  const end_s = spread.curve?.at(-1)?.[0] ?? 0;
  const long = end_s > LONG * fire.end_s;
  const until_s = long && !whole ? fire.end_s : Infinity;
  const at_s = useSpreadPlay((state) => (state.fire === fire ? state.at_s : null));
  const chart = useMemo(
    () => orderChart(tally, spread, units, `${fileSlug(tally.room.name)}-order-of-ignition`, until_s),
    [tally, spread, units, until_s],
  );
  if (chart === null) return null;
  return (
    <div>
      <ChartFigure chart={chart} playedAt={at_s === null ? null : at_s / SECONDS_PER_MINUTE} />
      {long && (
        <Button
          look="quiet"
          className="text-small"
          onClick={() => {
            setWhole(!whole);
          }}
        >
          {whole ? 'Show the beginning only' : 'Show the whole fire'}
        </Button>
      )}
    </div>
  );
}
